import { firstRefusal, mustBe, type Outcome } from './outcome';
import { LENGTH_IN } from './ranges';

/** The feature of the head whose height the job sets. */
export type Datum = 'face' | 'outlet' | 'base';

export const takeoffInfo = {
  id: 'takeoff',
  version: 1,
  formula: 'face: face to shoulder; outlet: face to shoulder − face to centreline; base: −socket depth',
  source: 'common practice',
  range: 'lengths 0 to 100,000 in',
} as const;

/**
 * How far the landing shoulder lies below the datum, in inches, positive down. From the head's base it is negative:
 * the shoulder stands above the base by the socket's depth. Common practice.
 */
export const takeoff = (head: {
  datum: Datum;
  faceToShoulderIn: number;
  faceToOutletIn: number;
  socketDepthIn: number;
}): Outcome<{ takeoffIn: number }> => {
  const { datum, faceToShoulderIn, faceToOutletIn, socketDepthIn } = head;
  if (datum === 'base') {
    const refused = mustBe('socketDepthIn', socketDepthIn, LENGTH_IN);
    return refused ?? { ok: true, takeoffIn: 0 - socketDepthIn };
  }
  const refused = firstRefusal(
    mustBe('faceToShoulderIn', faceToShoulderIn, LENGTH_IN),
    datum === 'outlet' ? mustBe('faceToOutletIn', faceToOutletIn, LENGTH_IN) : null,
  );
  if (refused) return refused;
  return { ok: true, takeoffIn: datum === 'outlet' ? faceToShoulderIn - faceToOutletIn : faceToShoulderIn };
};
