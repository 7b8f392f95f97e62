import { firstRefusal, mustBe, type Outcome } from './outcome';
import { HEIGHT_IN, LENGTH_IN } from './ranges';

export const lowestRoughCutInfo = {
  id: 'lowest-rough-cut',
  version: 1,
  formula: 'lowest = cut elevation + allowance; from the string: lowest − string height',
  source: 'common practice',
  range: 'heights ±10,000 in, allowance 0 to 100,000 in',
} as const;

/** The lowest height that may be cut before the final cut: the plan's cut plus the allowance, in inches. */
export const lowestRoughCut = (plan: {
  cutElevationIn: number;
  allowanceIn: number;
  stringHeightIn: number;
}): Outcome<{ elevationIn: number; fromStringIn: number }> => {
  const { cutElevationIn, allowanceIn, stringHeightIn } = plan;
  const refused = firstRefusal(
    mustBe('cutElevationIn', cutElevationIn, HEIGHT_IN),
    mustBe('allowanceIn', allowanceIn, LENGTH_IN),
    mustBe('stringHeightIn', stringHeightIn, HEIGHT_IN),
  );
  if (refused) return refused;
  const elevationIn = cutElevationIn + allowanceIn;
  return { ok: true, elevationIn, fromStringIn: elevationIn - stringHeightIn };
};
