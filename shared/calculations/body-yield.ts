import { refuseCasingBody, type CasingBody } from './casing-body';
import type { Outcome } from './outcome';

export const bodyYieldInfo = {
  id: 'body-yield',
  version: 1,
  formula: 'P = 0.7854·(D² − d²)·Y, to the nearest 1000 lb',
  source: 'API TR 5C3 (Bulletin 5C3, ISO 10400)',
  range: 'D/t above 2',
} as const;

/** Axial load at which the pipe body yields, pounds-force to the nearest thousand. */
export const bodyYield = (casing: CasingBody): Outcome<{ bodyYieldLbf: number; unroundedLbf: number }> => {
  const refused = refuseCasingBody(casing);
  if (refused) return refused;
  const { odIn, wallIn, yieldPsi } = casing;
  const unroundedLbf = 0.7854 * (odIn ** 2 - (odIn - 2 * wallIn) ** 2) * yieldPsi;
  return { ok: true, bodyYieldLbf: Math.round(unroundedLbf / 1000) * 1000, unroundedLbf };
};
