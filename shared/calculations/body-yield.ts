import { firstRefusal, mustBe, refuse, type Outcome } from './outcome';
import { DIAMETER_IN, YIELD_PSI } from './ranges';

export const bodyYieldInfo = {
  id: 'body-yield',
  version: 1,
  formula: 'P = 0.7854·(D² − d²)·Y, to the nearest 1000 lb',
  source: 'API TR 5C3 (Bulletin 5C3, ISO 10400)',
  range: 'D/t above 2',
} as const;

/** Axial load at which the pipe body yields, pounds-force to the nearest thousand. */
export const bodyYield = (casing: {
  odIn: number;
  wallIn: number;
  yieldPsi: number;
}): Outcome<{ bodyYieldLbf: number; unroundedLbf: number }> => {
  const { odIn, wallIn, yieldPsi } = casing;
  const refused = firstRefusal(
    mustBe('odIn', odIn, DIAMETER_IN),
    mustBe('wallIn', wallIn, { atLeast: 0.01, atMost: 10 }),
    mustBe('yieldPsi', yieldPsi, YIELD_PSI),
  );
  if (refused) return refused;
  if (2 * wallIn >= odIn) return refuse('wall-too-thick', 'wallIn', { atLeast: 0.01, below: odIn / 2 });
  const unroundedLbf = 0.7854 * (odIn ** 2 - (odIn - 2 * wallIn) ** 2) * yieldPsi;
  return { ok: true, bodyYieldLbf: Math.round(unroundedLbf / 1000) * 1000, unroundedLbf };
};
