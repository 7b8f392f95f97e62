import { firstRefusal, mustBe, type Outcome } from './outcome';
import { HEIGHT_IN, LENGTH_IN, POSITIVE_LENGTH_IN } from './ranges';

export const twoHoleRotationInfo = {
  id: 'two-hole-rotation',
  version: 1,
  formula: 'θ = atan((d₁ − d₂)/L); at the valve: outlet reach × sin θ',
  source: 'common practice',
  range: 'L above 0, offsets ±10,000 in',
} as const;

/**
 * How far the head is turned, from the offsets of a straightedge through two bolt holes to the substructure, measured
 * a length apart. Positive when the first offset is the larger: with the first end at the left hand of who faces the
 * substructure, the head is then turned counter-clockwise seen from above. Also the miss at the valve, in inches, with
 * the same sign.
 */
export const twoHoleRotation = (measured: {
  firstOffsetIn: number;
  secondOffsetIn: number;
  betweenIn: number;
  outletReachIn: number;
}): Outcome<{ rotationDeg: number; atValveIn: number }> => {
  const { firstOffsetIn, secondOffsetIn, betweenIn, outletReachIn } = measured;
  const refused = firstRefusal(
    mustBe('firstOffsetIn', firstOffsetIn, HEIGHT_IN),
    mustBe('secondOffsetIn', secondOffsetIn, HEIGHT_IN),
    mustBe('betweenIn', betweenIn, POSITIVE_LENGTH_IN),
    mustBe('outletReachIn', outletReachIn, LENGTH_IN),
  );
  if (refused) return refused;
  const turn = Math.atan((firstOffsetIn - secondOffsetIn) / betweenIn);
  return { ok: true, rotationDeg: (turn * 180) / Math.PI, atValveIn: outletReachIn * Math.sin(turn) };
};
