import { firstRefusal, mustBe, type Outcome } from './outcome';

export const filletUndersizeInfo = {
  id: 'fillet-undersize',
  version: 2,
  formula: 'leg under 1/4 in: 1/16 in; under 5/16 in: 3/32 in; from 5/16 in: 1/8 in; on at most 10 % of the length',
  source: 'AWS D1.1 visual acceptance (from memory)',
  range: 'leg above 0 to 3 in',
} as const;

/**
 * How much a fillet may run under its size by that size, inches, on at most a tenth of its length. From memory: the
 * sizes named are 3/16, 1/4 and 5/16 in; a size between two of them gets the smaller allowance.
 */
export const UNDERSIZE_ALLOWANCES = [
  { belowLegIn: 1 / 4, underIn: 1 / 16 },
  { belowLegIn: 5 / 16, underIn: 3 / 32 },
  { belowLegIn: Infinity, underIn: 1 / 8 },
] as const;
export const UNDERSIZE_LENGTH_SHARE_PCT = 10;

/** Legs typed in millimetres are not exact in inches: a hair of slack, far below any gauge. */
const SLACK_IN = 1e-9;

/** Whether a measured fillet leg is full, tolerable as a short undersize, or too small, in inches. */
export const filletUndersize = (weld: {
  planLegIn: number;
  measuredLegIn: number;
  undersizeSharePct: number;
}): Outcome<{ allowedUnderIn: number; shortIn: number; verdict: 'full' | 'tolerable' | 'too-small' }> => {
  const { planLegIn, measuredLegIn, undersizeSharePct } = weld;
  const refused = firstRefusal(
    mustBe('planLegIn', planLegIn, { above: 0, atMost: 3 }),
    mustBe('measuredLegIn', measuredLegIn, { atLeast: 0, atMost: 6 }),
    mustBe('undersizeSharePct', undersizeSharePct, { atLeast: 0, atMost: 100 }),
  );
  if (refused) return refused;
  const allowedUnderIn = UNDERSIZE_ALLOWANCES.find((row) => planLegIn < row.belowLegIn - SLACK_IN)?.underIn ?? 0;
  const shortIn = Math.max(0, planLegIn - measuredLegIn);
  if (shortIn <= SLACK_IN) return { ok: true, allowedUnderIn, shortIn, verdict: 'full' };
  const tolerable = shortIn <= allowedUnderIn + SLACK_IN && undersizeSharePct <= UNDERSIZE_LENGTH_SHARE_PCT;
  return { ok: true, allowedUnderIn, shortIn, verdict: tolerable ? 'tolerable' : 'too-small' };
};
