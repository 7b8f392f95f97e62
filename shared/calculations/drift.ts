import { firstRefusal, mustBe, refuse, type Outcome } from './outcome';
import { DIAMETER_IN } from './ranges';

export const driftInfo = {
  id: 'drift',
  version: 1,
  formula: 'drift = inside diameter − deduction by size',
  source: 'API 5CT',
  range: 'casing OD 4.5 in and over',
} as const;

/** Deduction from the inside diameter by casing size, inches. API 5CT. */
export const DRIFT_DEDUCTIONS = [
  { belowOdIn: 9.625, deductionIn: 1 / 8 },
  { belowOdIn: 16, deductionIn: 5 / 32 },
  { belowOdIn: Infinity, deductionIn: 3 / 16 },
] as const;

/** Diameter of the mandrel that must pass through the casing, in inches. */
export const drift = (casing: {
  odIn: number;
  wallIn: number;
}): Outcome<{ insideDiameterIn: number; deductionIn: number; driftIn: number }> => {
  const { odIn, wallIn } = casing;
  const refused = firstRefusal(
    mustBe('odIn', odIn, { atLeast: 4.5, atMost: 200 }),
    mustBe('wallIn', wallIn, DIAMETER_IN),
  );
  if (refused) return refused;
  const insideDiameterIn = odIn - 2 * wallIn;
  const deductionIn = DRIFT_DEDUCTIONS.find((row) => odIn < row.belowOdIn)?.deductionIn ?? 3 / 16;
  if (insideDiameterIn <= deductionIn) return refuse('wall-too-thick', 'wallIn', { above: 0, below: odIn / 2 });
  return { ok: true, insideDiameterIn, deductionIn, driftIn: insideDiameterIn - deductionIn };
};
