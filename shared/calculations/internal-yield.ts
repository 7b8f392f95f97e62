import { refuseCasingBody, type CasingBody } from './casing-body';
import type { Outcome } from './outcome';

export const internalYieldInfo = {
  id: 'internal-yield',
  version: 1,
  formula: 'P = 0.875·2·Y·t/D, to the nearest 10 psi',
  source: 'API TR 5C3 (Bulletin 5C3, ISO 10400), Barlow with 12.5 % wall tolerance',
  range: 'D/t above 2',
} as const;

/** Inside pressure at which the casing's wall yields, psi to the nearest 10. */
export const internalYield = (casing: CasingBody): Outcome<{ internalYieldPsi: number; unroundedPsi: number }> => {
  const refused = refuseCasingBody(casing);
  if (refused) return refused;
  const { odIn, wallIn, yieldPsi } = casing;
  const unroundedPsi = (0.875 * 2 * yieldPsi * wallIn) / odIn;
  return { ok: true, internalYieldPsi: Math.round(unroundedPsi / 10) * 10, unroundedPsi };
};
