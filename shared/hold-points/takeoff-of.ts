import { cutMark } from '../calculations/cut-mark';
import { datumLanding } from '../calculations/datum-landing';
import { lowestRoughCut } from '../calculations/lowest-rough-cut';
import { stringHeight } from '../calculations/string-height';
import { takeoff } from '../calculations/takeoff';
import { weldRoom } from '../calculations/weld-room';
import type { JobPlan } from '../job/plan';
import type { PointContext } from './context';
import { twoPersons } from './two-persons';

/** Where everything stands, worked out from the plan and from what was measured so far. Lengths in inches. */
export interface Takeoff {
  /** datum down to the landing shoulder; negative where the datum is the head's base */
  takeoffIn: number;
  /** the drawing's until both tapes agree on the head; from then on theirs, for that head will be set */
  by: 'drawing' | 'tape';
  /** above ground */
  cutElevationIn: number;
  shoulderElevationIn: number;
  baseElevationIn: number;
  /** above ground where it passes the casing; undefined until it is measured at both stakes */
  stringHeightIn: number | undefined;
  /** from the string, positive down */
  markIn: number | undefined;
  /** the lowest height above ground that may be cut before the final cut: the plan's cut plus the allowance */
  lowestCutIn: number;
  /** the same from the string, positive up */
  lowestCutFromStringIn: number | undefined;
}

/** The length of the head that is measured by tape: face to shoulder, or the socket where the base is the datum. */
export const measuredOnHead = (plan: JobPlan): { base: 'takeoff' | 'socket'; drawingIn: number } =>
  plan.terms.datum === 'base'
    ? { base: 'socket', drawingIn: Number(plan.head.socketDepthIn) }
    : { base: 'takeoff', drawingIn: Number(plan.head.faceToShoulderIn) };

/** The newest height takeoff, from whichever point it is asked. */
const takeoffPoint = (context: PointContext): PointContext | undefined =>
  context.point.place.kind === 'height-takeoff' ? context : context.other('height-takeoff');

const takeoffWith = (plan: JobPlan, measuredIn: number | undefined): number | undefined => {
  const { base, drawingIn } = measuredOnHead(plan);
  const length = measuredIn ?? drawingIn;
  const found = takeoff({
    datum: plan.terms.datum,
    faceToShoulderIn: base === 'takeoff' ? length : Number(plan.head.faceToShoulderIn),
    faceToOutletIn: Number(plan.head.faceToOutletIn),
    socketDepthIn: base === 'socket' ? length : Number(plan.head.socketDepthIn),
  });
  return found.ok ? found.takeoffIn : undefined;
};

/**
 * The string's height above ground at the casing in inches, by the readings of this point: between the stakes where
 * their distance is known, else half way. Undefined while a stake is missing or the casing is not between them.
 */
export const stringHeightOf = (context: PointContext): number | undefined => {
  const [a, b] = [context.number('string.a'), context.number('string.b')];
  if (a === undefined || b === undefined) return undefined;
  const first = takeoffPoint(context);
  const apart = context.number('string.apart') ?? first?.number('string.apart');
  const fromA = context.number('string.from-a') ?? first?.number('string.from-a');
  const between = apart === undefined || fromA === undefined ? { apart: 2, fromA: 1 } : { apart, fromA };
  const found = stringHeight({
    heightAtStakeAIn: a,
    heightAtStakeBIn: b,
    stakeAToStakeBIn: between.apart,
    stakeAToCasingIn: between.fromA,
  });
  return found.ok ? found.stringHeightIn : undefined;
};

/**
 * Takeoff, cut elevation, mark and the lowest permitted rough cut of a job, asked from any of its points: the drawing,
 * the limits and the screens all use this one. The string is this point's own where it was read again, else the one
 * of the height takeoff. The lowest rough cut goes by the drawing alone, so that it is known before anything is read.
 * Undefined only when the plan's own numbers are out of any range.
 */
export const takeoffOf = (context: PointContext): Takeoff | undefined => {
  const { plan } = context.state;
  const { terms, head } = plan;
  const first = takeoffPoint(context);
  const measuredIn = first && twoPersons(first, measuredOnHead(plan).base).agreedIn;
  const [byPlan, takeoffIn] = [takeoffWith(plan, undefined), takeoffWith(plan, measuredIn)];
  if (byPlan === undefined || takeoffIn === undefined) return undefined;
  const stringHeightIn = stringHeightOf(context) ?? (first && stringHeightOf(first));
  const frame = {
    targetHeightIn: Number(terms.targetHeightIn),
    standOffIn: Number(terms.standOffIn),
    stringHeightIn: stringHeightIn ?? 0,
  };
  const [planned, cut] = [cutMark({ ...frame, takeoffIn: byPlan }), cutMark({ ...frame, takeoffIn })];
  if (!planned.ok || !cut.ok) return undefined;
  const lowest = lowestRoughCut({
    cutElevationIn: planned.cutElevationIn,
    allowanceIn: context.setting('stubAboveMarkIn'),
    stringHeightIn: frame.stringHeightIn,
  });
  const base = weldRoom({
    cutElevationIn: cut.cutElevationIn,
    standOffIn: frame.standOffIn,
    socketDepthIn: terms.datum === 'base' ? -takeoffIn : Number(head.socketDepthIn),
    obstructionElevationIn: 0,
  });
  if (!lowest.ok || !base.ok) return undefined;
  const known = stringHeightIn !== undefined;
  return {
    takeoffIn,
    by: measuredIn === undefined ? 'drawing' : 'tape',
    cutElevationIn: cut.cutElevationIn,
    shoulderElevationIn: cut.cutElevationIn + frame.standOffIn,
    baseElevationIn: base.baseElevationIn,
    stringHeightIn,
    // `0 -` keeps a mark on the string from becoming minus zero.
    markIn: known ? 0 - cut.markFromStringIn : undefined,
    lowestCutIn: lowest.elevationIn,
    lowestCutFromStringIn: known ? lowest.fromStringIn : undefined,
  };
};

/** Where the datum comes to stand above ground, in inches, when the casing ends at a height above ground. */
export const landsAt = (context: PointContext, cutElevationIn: number | undefined): number | undefined => {
  const found = takeoffOf(context);
  if (!found || cutElevationIn === undefined) return undefined;
  const landed = datumLanding({
    cutElevationIn,
    takeoffIn: found.takeoffIn,
    standOffIn: Number(context.state.plan.terms.standOffIn),
    targetHeightIn: Number(context.state.plan.terms.targetHeightIn),
  });
  return landed.ok ? landed.datumHeightIn : undefined;
};
