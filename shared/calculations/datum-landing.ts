import { firstRefusal, mustBe, type Outcome } from './outcome';
import { HEIGHT_IN, LENGTH_IN } from './ranges';

export const datumLandingInfo = {
  id: 'datum-landing',
  version: 1,
  formula: 'datum = cut + stand-off + takeoff; miss = datum − target',
  source: 'common practice',
  range: 'heights ±10,000 in',
} as const;

/** Where the datum ends up above ground when the casing is cut at a height, and how far from target, in inches. */
export const datumLanding = (cut: {
  cutElevationIn: number;
  takeoffIn: number;
  standOffIn: number;
  targetHeightIn: number;
}): Outcome<{ datumHeightIn: number; missIn: number }> => {
  const { cutElevationIn, takeoffIn, standOffIn, targetHeightIn } = cut;
  const refused = firstRefusal(
    mustBe('cutElevationIn', cutElevationIn, HEIGHT_IN),
    mustBe('takeoffIn', takeoffIn, HEIGHT_IN),
    mustBe('standOffIn', standOffIn, LENGTH_IN),
    mustBe('targetHeightIn', targetHeightIn, HEIGHT_IN),
  );
  if (refused) return refused;
  const datumHeightIn = cutElevationIn + standOffIn + takeoffIn;
  return { ok: true, datumHeightIn, missIn: datumHeightIn - targetHeightIn };
};
