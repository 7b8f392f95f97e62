import { datumLandingInfo } from '../calculations/datum-landing';
import { flangeTilt, flangeTiltInfo } from '../calculations/flange-tilt';
import { twoHoleRotation, twoHoleRotationInfo } from '../calculations/two-hole-rotation';
import { answer, computed } from './computing';
import type { PointContext } from './context';
import type { GroupDefinition } from './definition';
import { quantity, words } from './fields';
import { namedInstrument } from './instruments';
import { bySetting, judgeRange } from './judging';
import { judgeUsable } from './unusable';
import type { Computed, Verdict } from './verdict';

/** When the head's position is measured: as set over the seal, after the tacks, as built and cold. */
export type OrientationPrefix = 'set' | 'tacked' | 'as-built';

const twoHoleFields = (prefix: OrientationPrefix): string[] => [
  `${prefix}.offset.a`,
  `${prefix}.offset.b`,
  `${prefix}.length`,
];
const levelFields = (prefix: OrientationPrefix): string[] => [`${prefix}.level.x`, `${prefix}.level.y`];

/**
 * Two-hole, level and datum height, the same three wherever the head's position is measured. Level x runs along 12 to 6
 * o'clock and is positive when 12 is high, level y along 3 to 9 and positive when 3 is high.
 */
export const orientationGroups = (context: PointContext, prefix: OrientationPrefix): GroupDefinition[] => {
  const { head, terms } = context.state.plan;
  const [a, b] = [context.number(`${prefix}.offset.a`), context.number(`${prefix}.offset.b`)];
  const near = (other: number | undefined) =>
    other === undefined ? { min: 2, max: 240 } : { min: other - 2, max: other + 2 };
  const target = Number(terms.targetHeightIn);
  return [
    {
      key: `${prefix}-two-hole`,
      fields: [
        words(`${prefix}.holes`),
        quantity(`${prefix}.offset.a`, 'in', { likely: near(b) }),
        quantity(`${prefix}.offset.b`, 'in', { likely: near(a) }),
        quantity(`${prefix}.length`, 'in', { likely: { min: Number(head.boltCircleIn) / 4, max: 144 } }),
      ],
      picture: 'plan-view',
    },
    {
      key: `${prefix}-level`,
      fields: [
        ...levelFields(prefix).map((field) => quantity(field, 'deg', { likely: { min: -2, max: 2 } })),
        ...namedInstrument(context, `${prefix}.instrument`, 'level'),
      ],
    },
    {
      key: `${prefix}-height`,
      fields: [quantity(`${prefix}.height`, 'in', { likely: { min: target - 2, max: target + 2 } })],
    },
  ];
};

/** Rotation error by the two holes, in degrees and as the miss at the valve in inches. */
export const rotationOf = (context: PointContext, prefix: OrientationPrefix) => {
  const [a, b, length] = twoHoleFields(prefix).map((field) => context.number(field));
  if (a === undefined || b === undefined || length === undefined) return undefined;
  return answer(
    twoHoleRotation({
      firstOffsetIn: a,
      secondOffsetIn: b,
      betweenIn: length,
      outletReachIn: Number(context.state.plan.head.outletReachIn),
    }),
  );
};

/** The flange's true tilt in degrees and where it is low. */
export const tiltOf = (context: PointContext, prefix: OrientationPrefix) => {
  const [x, y] = levelFields(prefix).map((field) => context.number(field));
  if (x === undefined || y === undefined) return undefined;
  return answer(flangeTilt({ twelveHighDeg: x, threeHighDeg: y }));
};

const rotationError = (context: PointContext, prefix: OrientationPrefix): number | undefined => {
  const found = rotationOf(context, prefix);
  return found && Math.abs(found.rotationDeg);
};

/** Rotation, tilt and datum height against the job's limits; each outside is a hold. */
export const judgeOrientation = (context: PointContext, prefix: OrientationPrefix): Verdict[] => {
  const target = Number(context.state.plan.terms.targetHeightIn);
  const within = context.setting('datumWithinIn');
  const [rotation, tilt] = [rotationError(context, prefix), tiltOf(context, prefix)?.tiltDeg];
  return [
    ...judgeRange(context, {
      limit: `${prefix}.rotation`,
      kind: 'hold',
      about: twoHoleFields(prefix),
      measured: rotation,
      max: context.setting('rotationDeg'),
      unit: 'deg',
      source: bySetting(context, 'rotationDeg'),
      says: 'rotation',
    }),
    ...judgeUsable(context, `${prefix}.two-hole-usable`, twoHoleFields(prefix), rotation !== undefined),
    ...judgeRange(context, {
      limit: `${prefix}.tilt`,
      kind: 'hold',
      about: levelFields(prefix),
      measured: tilt,
      max: context.setting('tiltDeg'),
      unit: 'deg',
      source: bySetting(context, 'tiltDeg'),
      says: 'tilt',
    }),
    ...judgeUsable(context, `${prefix}.level-usable`, levelFields(prefix), tilt !== undefined),
    ...judgeRange(context, {
      limit: `${prefix}.datum-height`,
      kind: 'hold',
      about: [`${prefix}.height`],
      measured: context.number(`${prefix}.height`),
      min: target - within,
      max: target + within,
      unit: 'in',
      source: bySetting(context, 'datumWithinIn'),
      says: 'datum-height',
    }),
  ];
};

/** Rotation with its sign, the miss at the valve, tilt and its low side, and how far the datum stands off its target. */
export const computeOrientation = (context: PointContext, prefix: OrientationPrefix): Computed[] => {
  const [rotation, tilt] = [rotationOf(context, prefix), tiltOf(context, prefix)];
  const height = context.number(`${prefix}.height`);
  const miss = height === undefined ? undefined : height - Number(context.state.plan.terms.targetHeightIn);
  return [
    ...computed(`${prefix}.rotation`, rotation?.rotationDeg, 'deg', twoHoleRotationInfo),
    ...computed(`${prefix}.at-valve`, rotation?.atValveIn, 'in', twoHoleRotationInfo),
    ...computed(`${prefix}.tilt`, tilt?.tiltDeg, 'deg', flangeTiltInfo),
    ...computed(`${prefix}.low-side`, tilt?.lowSide?.clockwiseDeg, 'deg', flangeTiltInfo),
    ...computed(`${prefix}.datum-miss`, miss, 'in', datumLandingInfo),
  ];
};
