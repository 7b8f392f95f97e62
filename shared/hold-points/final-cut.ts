import { cutMarkInfo } from '../calculations/cut-mark';
import { cutPlaneInfo } from '../calculations/cut-plane';
import { datumLandingInfo } from '../calculations/datum-landing';
import { leftToCutInfo } from '../calculations/left-to-cut';
import { toDecimal } from '../units/decimal';
import { computed } from './computing';
import { contextOf, type PointContext } from './context';
import { cutFields, finishedCut } from './cut-readings';
import type { PointDefinition } from './definition';
import { doneBefore } from './done-before';
import { byQuarter, check, quantity } from './fields';
import { judgeFluidBelowWeld } from './fluid-in-casing';
import { bySetting, commonPractice, judgeCheck, judgeFact, judgeRange } from './judging';
import { restingOn } from './resting-on';
import { judgeStringHeight, stringAgainGroup } from './string-line';
import { leftToCutIn } from './stub';
import { stringHeightOf, takeoffOf } from './takeoff-of';
import { judgeUsable } from './unusable';
import type { Verdict } from './verdict';
import { act, read, shot } from './order';

/** High can be cut again, low can't be put back: two limits, two answers. */
const judgeHeight = (context: PointContext): Verdict[] => {
  const cut = finishedCut(context);
  if (!cut) return [];
  const size = { quantity: toDecimal(Math.abs(cut.missIn)), unit: 'in', difference: true as const };
  const frame = { kind: 'hold' as const, about: cutFields, measured: cut.missIn, unit: 'in' as const };
  const [high, low] = [context.setting('cutHighIn'), context.setting('cutLowIn')];
  return [
    ...judgeRange(context, {
      ...frame,
      limit: 'cut-high',
      max: high,
      source: bySetting(context, 'cutHighIn'),
      params: { size },
    }),
    ...judgeRange(context, {
      ...frame,
      limit: 'cut-low',
      min: 0 - low,
      source: bySetting(context, 'cutLowIn'),
      params: { size, allowed: { quantity: toDecimal(low), unit: 'in', difference: true } },
    }),
  ];
};

const judgeCut = (context: PointContext): Verdict[] =>
  restingOn(
    context,
    ['string.a', 'string.b'],
    [
      ...judgeHeight(context),
      ...judgeRange(context, {
        limit: 'cut-spread',
        kind: 'hold',
        about: cutFields,
        measured: finishedCut(context)?.plane.spreadIn,
        max: context.setting('cutSpreadIn'),
        unit: 'in',
        source: bySetting(context, 'cutSpreadIn'),
      }),
      ...judgeUsable(context, 'cut-usable', [...cutFields, 'string.a', 'string.b'], finishedCut(context) !== undefined),
    ],
  );

/** A string that has moved since the mark was set does not spoil the cut, but somebody should know why. */
const judgeStringMoved = (context: PointContext): Verdict[] => {
  const first = context.other('height-takeoff');
  const [before, now] = [first && stringHeightOf(first), stringHeightOf(context)];
  if (before === undefined || now === undefined) return [];
  return judgeRange(context, {
    limit: 'string-moved',
    kind: 'advice',
    about: ['string.a', 'string.b'],
    measured: Math.abs(now - before),
    max: context.setting('tapesAgreeIn'),
    unit: 'in',
    source: bySetting(context, 'tapesAgreeIn'),
  });
};

/** The newest full measurement of the cut, also one from before the point was reopened. */
const lastMeasured = (context: PointContext): PointContext =>
  [context.point, ...[...context.point.superseded].reverse()]
    .map((evidence) => contextOf(context.state, { ...context.point, readings: evidence.readings }))
    .find((one) => finishedCut(one) !== undefined) ?? context;

/** The torch stays cold when the stub ends below the mark already, and when a cut came out low. */
const judgeBeforeCut = (context: PointContext): Verdict[] => {
  const first = context.other('height-takeoff');
  const left = first && leftToCutIn(first);
  const cutLow = judgeHeight(lastMeasured(context)).find((verdict) => verdict.limit === 'cut-low');
  const frame = { kind: 'stop' as const, source: commonPractice };
  return [
    ...judgeFact(context, {
      ...frame,
      limit: 'stub-stands-above-mark',
      about: [],
      holds: left !== undefined && left >= 0,
    }),
    ...judgeFact(context, {
      ...frame,
      limit: 'no-second-cut',
      about: cutFields,
      holds: cutLow === undefined ? undefined : cutLow.outcome === 'within',
    }),
  ].filter((verdict) => verdict.outcome === 'outside');
};

/** Point 3: the casing is cut on the mark, and measured before anything is set on it. */
export const finalCut: PointDefinition = {
  kind: 'final-cut',
  version: 1,
  order: [read(/^(fluid|string)\b/), shot('wraparound-on-mark'), act('final-cut')],
  groups: (context) => {
    const mark = takeoffOf(context)?.markIn;
    return [
      {
        key: 'fluid',
        fields: [quantity('fluid.below-weld', 'in', { likely: { min: 12, max: 600 } }), check('fluid.no-water')],
      },
      stringAgainGroup(),
      {
        key: 'cut',
        fields: byQuarter('cut', 'in', { likely: mark === undefined ? undefined : { min: mark - 1, max: mark + 1 } }),
        picture: 'clock',
      },
      { key: 'visual', fields: [check('visual')] },
    ];
  },
  shots: () => ['wraparound-on-mark', 'finished-cut'].map((key) => ({ key, required: true })),
  acts: (context) => [{ key: 'final-cut', flame: true, required: !doneBefore(context, 'final-cut') }],
  statements: [],
  cautions: () => ['no-way-back', 'torch'],
  compute: (context) => {
    const cut = finishedCut(context);
    const found = takeoffOf(context);
    return [
      ...computed('cut-elevation', found?.cutElevationIn, 'in', cutMarkInfo),
      ...computed('mark', found?.markIn, 'in', cutMarkInfo),
      ...computed('mean', cut?.meanIn, 'in', cutPlaneInfo),
      ...computed('spread', cut?.plane.spreadIn, 'in', cutPlaneInfo),
      ...computed('tilt', cut?.plane.tiltDeg, 'deg', cutPlaneInfo),
      ...computed('low-side', cut?.plane.lowSide?.clockwiseDeg, 'deg', cutPlaneInfo),
      ...computed('lands-mean', cut?.landsByMeanIn, 'in', datumLandingInfo),
      ...computed('lands-high', cut?.landsByHighIn, 'in', datumLandingInfo),
      ...computed('allowance-used', cut?.allowanceUsedIn, 'in', leftToCutInfo),
    ];
  },
  judge: (context) => [
    ...judgeFluidBelowWeld(context),
    ...judgeCheck(context, 'fluid.no-water', 'hold'),
    ...judgeStringHeight(context),
    ...judgeStringMoved(context),
    ...judgeCut(context),
    ...judgeCheck(context, 'visual', 'hold', commonPractice, 'cut-visual'),
  ],
  beforeAct: (context) => judgeBeforeCut(context),
};
