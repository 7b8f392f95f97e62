import { greatest } from './extremes';
import { firstRefusalIn, mustBe, refuse, type Outcome } from './outcome';
import { LENGTH_IN } from './ranges';

export const fitUpGapInfo = {
  id: 'fit-up-gap',
  version: 1,
  formula: 'largest gap when it is over 1/16 in, else nothing',
  source: 'common practice',
  range: 'gaps 0 to 100,000 in',
} as const;

/** Up to this gap, in inches, the fillet keeps its planned leg. Common practice. */
export const GAP_LEFT_ALONE_IN = 1 / 16;

/** What the fit-up gap adds to the fillet's leg, in inches: the whole of the largest gap once it is over 1/16 in. */
export const fitUpGap = (gapsIn: readonly number[]): Outcome<{ largestIn: number; addToLegIn: number }> => {
  if (gapsIn.length === 0) return refuse('too-few-readings', 'gapsIn', { atLeast: 1 });
  const refused = firstRefusalIn(gapsIn, (gap) => mustBe('gapsIn', gap, LENGTH_IN));
  if (refused) return refused;
  const largestIn = greatest(gapsIn);
  return { ok: true, largestIn, addToLegIn: largestIn > GAP_LEFT_ALONE_IN + 1e-9 ? largestIn : 0 };
};
