import { firstRefusal, mustBe, type Outcome } from './outcome';
import { DIAMETER_IN } from './ranges';

export const outOfRoundnessInfo = {
  id: 'out-of-roundness',
  version: 1,
  formula: 'largest − smallest of two diameters; percent = 100·difference/nominal',
  source: 'common practice',
  range: 'diameters 0 to 200 in',
} as const;

/** How far from round the casing is, from two diameters at right angles, in inches and percent of nominal. */
export const outOfRoundness = (casing: {
  firstOdIn: number;
  secondOdIn: number;
  nominalOdIn: number;
}): Outcome<{ differenceIn: number; ovalityPct: number; meanOdIn: number }> => {
  const { firstOdIn, secondOdIn, nominalOdIn } = casing;
  const refused = firstRefusal(
    mustBe('firstOdIn', firstOdIn, DIAMETER_IN),
    mustBe('secondOdIn', secondOdIn, DIAMETER_IN),
    mustBe('nominalOdIn', nominalOdIn, { atLeast: 0.1, atMost: 200 }),
  );
  if (refused) return refused;
  const differenceIn = Math.abs(firstOdIn - secondOdIn);
  return {
    ok: true,
    differenceIn,
    ovalityPct: (100 * differenceIn) / nominalOdIn,
    meanOdIn: (firstOdIn + secondOdIn) / 2,
  };
};
