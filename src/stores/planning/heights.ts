import { cutMark, takeoff } from '../../../shared/calculations';
import type { JobPlan } from '../../../shared/job/plan';
import { toDecimal } from '../../../shared/units/decimal';

/** Where the head will stand, in inches: takeoff by the drawing, and above ground the cut and the head's base. */
export interface PlannedHeights {
  readonly takeoffIn: string;
  readonly cutElevationIn: string | null;
  readonly baseElevationIn: string | null;
}

/** Works out the heights of a plan; null where the drawing's own numbers are out of range. */
export function readHeights(
  { head, terms }: Pick<JobPlan, 'head' | 'terms'>,
  heightIsKnown: boolean,
): PlannedHeights | null {
  const found = takeoff({
    datum: terms.datum,
    faceToShoulderIn: Number(head.faceToShoulderIn),
    faceToOutletIn: Number(head.faceToOutletIn),
    socketDepthIn: Number(head.socketDepthIn),
  });
  if (!found.ok) return null;
  const targetHeightIn = Number(terms.targetHeightIn);
  const cut = cutMark({
    targetHeightIn,
    takeoffIn: found.takeoffIn,
    standOffIn: Number(terms.standOffIn),
    stringHeightIn: 0,
  });
  const known = heightIsKnown && cut.ok;
  return {
    takeoffIn: toDecimal(found.takeoffIn),
    cutElevationIn: known ? toDecimal(cut.cutElevationIn) : null,
    baseElevationIn: known ? toDecimal(targetHeightIn - found.takeoffIn - Number(head.socketDepthIn)) : null,
  };
}
