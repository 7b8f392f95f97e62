import { LIMITS } from './limits-data';
import { firstRefusal, mustBe, type Outcome } from './outcome';

export const visualLimitsInfo = {
  id: 'visual-limits',
  version: 1,
  formula: 'undercut ≤ 1/32 in (t < 1 in), ≤ 1/16 in (t ≥ 1 in); no crack',
  source: 'AWS D1.1 (1 in and thicker: from memory)',
  range: 'depth 0 to 1 in, thickness above 0 to 12 in',
} as const;

const THICK_IN = 1;

/** Verdict on a cleaned pass: a crack is a stop, undercut over the limit for the thickness a hold. Inches. */
export const visualLimits = (pass: {
  undercutIn: number;
  thicknessIn: number;
  crackPresent: boolean;
}): Outcome<{ verdict: 'pass' | 'hold' | 'stop'; undercutLimitIn: number }> => {
  const refused = firstRefusal(
    mustBe('undercutIn', pass.undercutIn, { atLeast: 0, atMost: 1 }),
    mustBe('thicknessIn', pass.thicknessIn, { above: 0, atMost: 12 }),
  );
  if (refused) return refused;
  const limit = pass.thicknessIn < THICK_IN ? LIMITS.undercutThin : LIMITS.undercutThick;
  const verdict = pass.crackPresent ? 'stop' : pass.undercutIn > limit.value ? 'hold' : 'pass';
  return { ok: true, verdict, undercutLimitIn: limit.value };
};
