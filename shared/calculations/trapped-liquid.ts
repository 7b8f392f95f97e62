import { BULK_MODULUS_PSI } from './oil-compression';
import { firstRefusal, mustBe, type Outcome } from './outcome';

export const trappedLiquidInfo = {
  id: 'trapped-liquid',
  version: 1,
  formula: 'ΔP = B·α·ΔT',
  source: 'definitions of bulk modulus and thermal expansion; rigid container',
  range: 'α 0 to 0.002 per °F, ΔT ±500 °F',
} as const;

/** Pressure rise of a liquid that is shut in and warmed by a difference in °F, psi; negative when it cools. */
export const trappedLiquid = (liquid: {
  bulkModulusPsi: number;
  expansionPerF: number;
  differenceF: number;
}): Outcome<{ risePsi: number; risePsiPerF: number }> => {
  const { bulkModulusPsi, expansionPerF, differenceF } = liquid;
  const refused = firstRefusal(
    mustBe('bulkModulusPsi', bulkModulusPsi, BULK_MODULUS_PSI),
    mustBe('expansionPerF', expansionPerF, { above: 0, atMost: 0.002 }),
    mustBe('differenceF', differenceF, { atLeast: -500, atMost: 500 }),
  );
  if (refused) return refused;
  const risePsiPerF = bulkModulusPsi * expansionPerF;
  return { ok: true, risePsi: risePsiPerF * differenceF, risePsiPerF };
};
