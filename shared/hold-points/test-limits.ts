import { gaugeRange } from '../calculations/gauge-range';
import { answer } from './computing';
import type { PointContext } from './context';
import { judgeHold } from './hold-of-test';
import { byDrawing, bySetting, commonPractice, judgeCheck, judgeFact, judgeRange, standard } from './judging';
import { portsOf } from './ports';
import { pressureLimitsOf } from './pressure-limits';
import { judgeUsable } from './unusable';
import type { Verdict } from './verdict';

const targetOf = (context: PointContext): number => context.state.plan.terms.test.pressurePsi;
const isNitrogen = (context: PointContext): boolean => context.state.plan.terms.test.medium === 'nitrogen';

/** Full scale of the gauge in psi: the instrument's own where it is known, else as read off its face. */
export const gaugeFullScalePsi = (context: PointContext): number | undefined =>
  context.instrument(context.value('gauge'))?.fullScalePsi ?? context.number('full-scale');

/** The highest pressure that was read anywhere, with the field that says so: a peak in the hold counts too. */
const highestRead = (context: PointContext): { psi: number; field: string } | undefined =>
  ['highest', ...context.rows('hold-readings').map((row) => `hold-readings.${row}.pressure`)]
    .flatMap((field) => {
      const psi = context.number(field);
      return psi === undefined ? [] : [{ psi, field }];
    })
    .reduce<{ psi: number; field: string } | undefined>(
      (most, one) => (most && most.psi >= one.psi ? most : one),
      undefined,
    );

/** What may never be pumped to: nobody can concede it. */
const judgeTarget = (context: PointContext): Verdict[] => {
  const { flangePsi, collapsePsi } = pressureLimitsOf(context.state.plan);
  const frame = { kind: 'stop' as const, about: ['highest'], measured: targetOf(context), unit: 'psi' as const };
  return [
    ...judgeRange(context, { ...frame, limit: 'target-over-flange', max: flangePsi, source: standard('API 6A') }),
    ...judgeRange(context, {
      ...frame,
      limit: 'target-over-collapse',
      max: collapsePsi,
      source: standard('API TR 5C3'),
    }),
  ];
};

/** Target or highest pressure, whichever is more, over the share of collapse or the seal's rating. */
const judgeOver = (context: PointContext): Verdict[] => {
  const { collapseSharePsi, sealPsi } = pressureLimitsOf(context.state.plan);
  const highest = highestRead(context);
  const frame = {
    kind: 'hold' as const,
    about: [highest?.field ?? 'highest'],
    measured: Math.max(targetOf(context), highest?.psi ?? 0),
    unit: 'psi' as const,
  };
  return [
    ...judgeRange(context, {
      ...frame,
      limit: 'over-collapse-share',
      max: collapseSharePsi,
      source: bySetting(context, 'collapseSharePct'),
    }),
    ...(sealPsi === null
      ? []
      : judgeRange(context, { ...frame, limit: 'over-seal', max: sealPsi, source: byDrawing(context) })),
  ];
};

/** Some pressure that was read is at or over the casing's collapse. */
export const reachedCollapse = (context: PointContext): boolean =>
  (highestRead(context)?.psi ?? 0) >= pressureLimitsOf(context.state.plan).collapsePsi;

/** The casing may have gone in: nothing else counts until a gauge has been run through the bore. */
const judgeReachedCollapse = (context: PointContext): Verdict[] => {
  const { collapsePsi } = pressureLimitsOf(context.state.plan);
  const highest = highestRead(context);
  if (reachedCollapse(context) && context.value('bore-gauged') === 'yes') {
    return judgeCheck(context, 'bore-gauged', 'stop', standard('API TR 5C3'));
  }
  return judgeRange(context, {
    limit: 'highest-collapse',
    kind: 'stop',
    about: [highest?.field ?? 'highest', 'bore-gauged'],
    measured: highest?.psi,
    max: collapsePsi,
    exclusiveMax: true,
    unit: 'psi',
    source: standard('API TR 5C3'),
  });
};

const judgeLeak = (context: PointContext): Verdict[] => {
  const leak = context.value('leak');
  return judgeFact(context, {
    limit: 'leak',
    kind: 'stop',
    about: ['leak'],
    source: commonPractice,
    says: leak === undefined || leak === 'none' ? 'leak' : `leak-${leak}`,
    holds: leak === undefined ? undefined : leak === 'none',
  });
};

const judgeGauge = (context: PointContext, fullScalePsi: number | undefined): Verdict[] => {
  if (fullScalePsi === undefined) return [];
  const good = answer(
    gaugeRange({
      targetPsi: targetOf(context),
      fullScalePsi,
      lowPct: context.setting('gaugeLowPct'),
      highPct: context.setting('gaugeHighPct'),
    }),
  );
  const frame = { limit: 'gauge-range', kind: 'hold' as const, about: ['gauge', 'full-scale'] };
  const source = bySetting(context, 'gaugeLowPct');
  if (!good) return judgeFact(context, { ...frame, source, says: 'gauge-range-unknown', holds: false });
  return judgeRange(context, {
    ...frame,
    measured: targetOf(context),
    min: good.lowPsi,
    max: good.highPsi,
    unit: 'psi',
    source,
    params: { scale: { quantity: String(fullScalePsi), unit: 'psi' } },
  });
};

/** A plug that is not back is still in somebody's keeping; one that was lost is replaced like for like. */
const judgeCustody = (context: PointContext): Verdict[] =>
  portsOf(context.state.plan).flatMap((port) => {
    const field = `plug.${port}.back`;
    const back = context.value(field);
    return judgeFact(context, {
      limit: field,
      kind: back === 'replaced' ? 'hold' : 'stop',
      about: [field],
      source: commonPractice,
      says: back === 'replaced' ? 'plug-replaced' : 'plug-back',
      params: { port },
      holds: back === undefined ? undefined : back === 'same',
    });
  });

/** Nobody near nitrogen under pressure; with oil it is good advice. */
const judgeExclusion = (context: PointContext): Verdict[] =>
  isNitrogen(context)
    ? judgeCheck(context, 'exclusion', 'stop', standard('ASME PCC-2 article 501'), 'exclusion-nitrogen')
    : judgeCheck(context, 'exclusion', 'advice', commonPractice, 'exclusion-oil');

/** Stored energy and stand-off are worked out from the volume: less than nothing works out to no distance at all. */
const judgeVolume = (context: PointContext): Verdict[] =>
  judgeUsable(context, 'volume-usable', ['volume'], (context.number('volume') ?? 0) > 0);

/** Everything about the test, in the order of its weight. */
export const judgeTest = (context: PointContext, fullScalePsi: number | undefined): Verdict[] => [
  ...judgeTarget(context),
  ...judgeOver(context),
  ...judgeReachedCollapse(context),
  ...judgeHold(context),
  ...judgeLeak(context),
  ...judgeGauge(context, fullScalePsi),
  ...judgeVolume(context),
  ...judgeCustody(context),
  ...judgeExclusion(context),
  ...judgeCheck(context, 'port-probed', 'stop'),
  ...judgeCheck(context, 'fitting-in', 'stop'),
  ...judgeCheck(context, 'bled-to-zero', 'stop'),
];

const mustBeDone = (context: PointContext, field: string, says = field): Verdict[] =>
  judgeFact(context, {
    limit: field,
    kind: 'stop',
    about: [field],
    source: commonPractice,
    says,
    holds: context.value(field) === 'yes',
  });

/** How far everybody stands off follows from the volume: without one nobody knows where the distance ends. */
const judgeDistanceKnown = (context: PointContext): Verdict[] =>
  judgeFact(context, {
    limit: 'volume-before-nitrogen',
    kind: 'stop',
    about: ['volume'],
    source: standard('ASME PCC-2 article 501'),
    holds: (context.number('volume') ?? 0) > 0,
  });

/** Before anybody picks up a pump: a pressure that the metal bears, the port clear, the fitting in, nobody near. */
export const judgeBeforeTest = (context: PointContext): Verdict[] => [
  ...judgeTarget(context),
  ...mustBeDone(context, 'port-probed'),
  ...mustBeDone(context, 'fitting-in'),
  ...(isNitrogen(context)
    ? [...judgeDistanceKnown(context), ...mustBeDone(context, 'exclusion', 'exclusion-nitrogen')]
    : []),
];
