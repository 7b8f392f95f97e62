import { electrodeExposureInfo } from '../calculations/electrode-exposure';
import { filletPlanInfo } from '../calculations/fillet-plan';
import { heatInputInfo } from '../calculations/heat-input';
import { travelSpeedInfo } from '../calculations/travel-speed';
import { visualLimits } from '../calculations/visual-limits';
import { answer, computed } from './computing';
import type { PointContext } from './context';
import type { ActDefinition, GroupDefinition, PointDefinition } from './definition';
import { doneBefore } from './done-before';
import { quantity, welders } from './fields';
import { judgeLook, lookGroups } from './imperfections';
import { byProcedure, commonPractice, judgeFact, judgeRange, standard } from './judging';
import { computeOrientation, judgeOrientation, orientationGroups } from './orientation';
import { judgeBeforePass, judgePassTemperatures, passTemperatureGroup } from './pass-temperatures';
import { judgePlugsOut } from './plug-in-port';
import { judgeWelders } from './qualified-welders';
import { rodFactsOf } from './rod-facts';
import { judgeRods, rodGroup } from './rods';
import { judgeUsable } from './unusable';
import type { Computed, Verdict } from './verdict';
import { beadsSoFar, planLegIn, weldMetal } from './weld-metal';
import { act, read } from './order';

/** The first pass of the first go starts with the tacks, and they may pull the head. */
const startsWithTacks = ({ point }: PointContext): boolean => point.place.round === 0 && point.place.pass === 1;

/** Nothing more comes over it on its side: the leg is measured now. */
const isLastOfItsSide = ({ state, point, pass }: PointContext): boolean => {
  const { round, pass: number } = point.place;
  if (round > 0) return number === state.rounds.find((one) => one.round === round)?.passes;
  const { passes } = state.plan.procedure;
  return !passes.slice(number ?? 0).some((later) => later.weld === pass?.weld);
};

const groups = (context: PointContext): GroupDefinition[] => {
  const leg = context.pass ? planLegIn(context, context.pass.weld) : undefined;
  return [
    passTemperatureGroup(context),
    ...(startsWithTacks(context) ? orientationGroups(context, 'tacked') : []),
    { key: 'welders', fields: [welders('welders')] },
    rodGroup(context),
    ...lookGroups(context, 'pass'),
    {
      key: 'size',
      fields: [
        quantity('undercut', 'in', { likely: { min: 0, max: 0.125 } }),
        ...(isLastOfItsSide(context)
          ? [quantity('fillet-leg', 'in', leg === undefined ? {} : { likely: { min: leg / 2, max: leg * 2 } })]
          : []),
      ],
    },
  ];
};

const acts = (context: PointContext): ActDefinition[] =>
  [...(startsWithTacks(context) ? ['tacks'] : []), 'pass'].map((key) => ({
    key,
    flame: true,
    required: !doneBefore(context, key),
  }));

/** The root is not laid over a head that nobody has tacked and looked at again. */
const judgeTacked = (context: PointContext): Verdict[] => {
  if (!startsWithTacks(context)) return [];
  const tacked = context.point.acts.some((run) => run.act === 'tacks' && run.ended) || doneBefore(context, 'tacks');
  return judgeFact(context, {
    limit: 'tacked-first',
    kind: 'stop',
    about: [],
    source: commonPractice,
    holds: tacked,
  }).filter((verdict) => verdict.outcome === 'outside');
};

const judgeUndercut = (context: PointContext): Verdict[] => {
  const undercutIn = context.number('undercut');
  if (undercutIn === undefined) return [];
  const thicknessIn = Number(context.state.plan.casing.wallIn);
  const limits = answer(visualLimits({ undercutIn, thicknessIn, crackPresent: false }));
  return [
    ...judgeRange(context, {
      limit: 'undercut',
      kind: 'hold',
      about: ['undercut'],
      measured: limits && undercutIn,
      max: limits?.undercutLimitIn,
      unit: 'in',
      source: standard('AWS D1.1'),
    }),
    ...judgeUsable(context, 'undercut-usable', ['undercut'], limits !== undefined),
  ];
};

const judgeLeg = (context: PointContext): Verdict[] => {
  const leg = context.pass ? planLegIn(context, context.pass.weld) : undefined;
  if (leg === undefined || !isLastOfItsSide(context)) return [];
  return judgeRange(context, {
    limit: 'fillet-leg',
    kind: 'hold',
    about: ['fillet-leg'],
    measured: context.number('fillet-leg'),
    min: leg,
    unit: 'in',
    source: byProcedure(context),
  });
};

const most = (values: (number | undefined)[]): number | undefined => {
  const known = values.filter((value) => value !== undefined);
  return known.length === 0 ? undefined : Math.max(...known);
};

const least = (values: (number | undefined)[]): number | undefined => {
  const known = values.filter((value) => value !== undefined);
  return known.length === 0 ? undefined : Math.min(...known);
};

/** No formula: the passes whose arc has been lit and put out. */
const beadsInfo = {
  id: 'beads',
  version: 1,
  formula: 'passes laid',
  source: 'definition',
  range: 'one round',
} as const;

/** The whole pass in single values: the slowest, the hottest and the longest exposed rods; each row has its verdicts. */
const compute = (context: PointContext): Computed[] => {
  const rods = rodFactsOf(context);
  const metal = weldMetal(context);
  return [
    ...computed('travel-speed', least(rods.map((row) => row.speedInPerMin)), 'inPerMin', travelSpeedInfo),
    ...computed('heat-input', most(rods.map((row) => row.heatInputKjPerIn)), 'kJPerIn', heatInputInfo),
    ...computed('exposure', most(rods.map((row) => row.exposureMin)), 'min', electrodeExposureInfo),
    ...computed('beads', beadsSoFar(context), 'count', beadsInfo),
    ...computed('weld-metal', metal?.laidLb, 'lb', filletPlanInfo),
    ...computed('weld-metal-plan', metal?.planLb, 'lb', filletPlanInfo),
    ...(startsWithTacks(context) ? computeOrientation(context, 'tacked') : []),
  ];
};

/** Point 9.n: one pass, struck on metal that is hot enough, laid as the procedure says, cleaned and looked over. */
export const passInspected: PointDefinition = {
  kind: 'pass-inspected',
  version: 1,
  order: [act('tacks'), read(/^tacked\b/), read(/^temps\b/), act('pass')],
  groups,
  shots: () => ['pass-side-a', 'pass-side-b'].map((key) => ({ key, required: true })),
  acts,
  statements: [],
  cautions: () => ['electric-shock', 'eyes-and-fumes', 'procedure-governs'],
  compute,
  judge: (context) => [
    ...judgePassTemperatures(context),
    ...(startsWithTacks(context) ? judgeOrientation(context, 'tacked') : []),
    ...judgeWelders(context),
    ...judgeRods(context),
    ...judgeLook(context, 'pass'),
    ...judgeUndercut(context),
    ...judgeLeg(context),
  ],
  beforeAct: (context, act, at) => [
    ...judgePlugsOut(context),
    ...(act === 'pass' ? [...judgeTacked(context), ...judgeBeforePass(context, at), ...judgeWelders(context)] : []),
  ],
};
