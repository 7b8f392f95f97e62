import { firstRefusal, mustBe, type Outcome } from './outcome';
import { DIAMETER_IN } from './ranges';

export const odToleranceInfo = {
  id: 'od-tolerance',
  version: 1,
  formula: 'OD ≥ 4-1/2 in: nominal +1 % / −0.5 %',
  source: 'API 5CT',
  range: 'nominal OD 4.5 in and over',
} as const;

/** Share of the nominal OD that a pipe body may be over and under. API 5CT, OD 4-1/2 in and over. */
export const OD_TOLERANCE = { over: 0.01, under: 0.005, smallestOdIn: 4.5, source: 'API 5CT' } as const;

/** Largest and smallest outside diameter the pipe body may have, in inches, and where measured ones stand. */
export const odTolerance = (casing: {
  nominalOdIn: number;
  measuredOdIn: number;
}): Outcome<{ largestIn: number; smallestIn: number; verdict: 'within' | 'over' | 'under'; deviationPct: number }> => {
  const { nominalOdIn, measuredOdIn } = casing;
  const refused = firstRefusal(
    mustBe('nominalOdIn', nominalOdIn, { atLeast: OD_TOLERANCE.smallestOdIn, atMost: 200 }),
    mustBe('measuredOdIn', measuredOdIn, DIAMETER_IN),
  );
  if (refused) return refused;
  const largestIn = nominalOdIn * (1 + OD_TOLERANCE.over);
  const smallestIn = nominalOdIn * (1 - OD_TOLERANCE.under);
  const slack = 1e-9;
  const verdict = measuredOdIn > largestIn + slack ? 'over' : measuredOdIn < smallestIn - slack ? 'under' : 'within';
  return { ok: true, largestIn, smallestIn, verdict, deviationPct: (measuredOdIn / nominalOdIn - 1) * 100 };
};
