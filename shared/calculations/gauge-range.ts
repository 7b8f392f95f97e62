import { firstRefusal, mustBe, type Outcome } from './outcome';
import { POSITIVE_PRESSURE_PSI } from './ranges';

export const gaugeRangeInfo = {
  id: 'gauge-range',
  version: 1,
  formula: 'target within low to high percent of full scale',
  source: 'common practice 25–75 %; Texas RRC form H-5 30–70 %; a setting of the job',
  range: '0 ≤ low < high ≤ 100 %',
} as const;

/** Scales in bar are not exact in psi: a hair of slack, far below any gauge's resolution. */
const SLACK_PSI = 1e-6;

/** Whether a gauge reads a target in the good part of its scale, psi and percent, and what that part spans. */
export const gaugeRange = (gauge: {
  targetPsi: number;
  fullScalePsi: number;
  lowPct: number;
  highPct: number;
}): Outcome<{ sharePct: number; lowPsi: number; highPsi: number; verdict: 'within' | 'below' | 'above' }> => {
  const { targetPsi, fullScalePsi, lowPct, highPct } = gauge;
  const refused = firstRefusal(
    mustBe('targetPsi', targetPsi, POSITIVE_PRESSURE_PSI),
    mustBe('fullScalePsi', fullScalePsi, { atLeast: 1, atMost: 100_000 }),
    mustBe('highPct', highPct, { above: 0, atMost: 100 }),
    mustBe('lowPct', lowPct, { atLeast: 0, below: highPct }),
  );
  if (refused) return refused;
  const [lowPsi, highPsi] = [(fullScalePsi * lowPct) / 100, (fullScalePsi * highPct) / 100];
  const verdict = targetPsi < lowPsi - SLACK_PSI ? 'below' : targetPsi > highPsi + SLACK_PSI ? 'above' : 'within';
  return { ok: true, sharePct: (100 * targetPsi) / fullScalePsi, lowPsi, highPsi, verdict };
};
