import { firstRefusal, mustBe, refuse, type Outcome } from './outcome';
import { DIAMETER_IN, YIELD_PSI } from './ranges';

export const internalYieldInfo = {
  id: 'internal-yield',
  version: 1,
  formula: 'P = 0.875·2·Y·t/D, to the nearest 10 psi',
  source: 'API TR 5C3 (Bulletin 5C3, ISO 10400), Barlow with 12.5 % wall tolerance',
  range: 'D/t above 2',
} as const;

/** Inside pressure at which the casing's wall yields, psi to the nearest 10. */
export const internalYield = (casing: {
  odIn: number;
  wallIn: number;
  yieldPsi: number;
}): Outcome<{ internalYieldPsi: number; unroundedPsi: number }> => {
  const { odIn, wallIn, yieldPsi } = casing;
  const refused = firstRefusal(
    mustBe('odIn', odIn, DIAMETER_IN),
    mustBe('wallIn', wallIn, { atLeast: 0.01, atMost: 10 }),
    mustBe('yieldPsi', yieldPsi, YIELD_PSI),
  );
  if (refused) return refused;
  if (2 * wallIn >= odIn) return refuse('wall-too-thick', 'wallIn', { atLeast: 0.01, below: odIn / 2 });
  const unroundedPsi = (0.875 * 2 * yieldPsi * wallIn) / odIn;
  return { ok: true, internalYieldPsi: Math.round(unroundedPsi / 10) * 10, unroundedPsi };
};
