import { firstRefusal, mustBe, refuse, type Outcome } from './outcome';
import { HEIGHT_IN, LENGTH_IN } from './ranges';

export const readingAgreementInfo = {
  id: 'reading-agreement',
  version: 1,
  formula: 'two readings agree when |a − b| ≤ tolerance; a third settles it with whichever is nearer',
  source: 'common practice',
  range: 'two or three readings',
} as const;

/** Sixteenths are exact, metric readings turned into inches are not: a hair of slack, far below any tape. */
const SLACK_IN = 1e-9;

export interface Agreement {
  agreed: boolean;
  /** Mean of the two readings that count; null while none agree. */
  valueIn: number | null;
  /** Places of the two that count, in the order they were given. */
  counted: readonly [number, number] | null;
  /** Distance between the first two, or between the two that count. */
  differenceIn: number;
}

/**
 * Whether a first and a second reading agree, in inches. Only when they do not may a third settle it: the pair within
 * tolerance counts, the nearer pair when there are two; a third exactly between both settles nothing.
 */
export const readingAgreement = (measured: {
  readingsIn: readonly number[];
  toleranceIn: number;
}): Outcome<Agreement> => {
  const { readingsIn, toleranceIn } = measured;
  const [first, second, third] = readingsIn;
  if (first === undefined || second === undefined) return refuse('too-few-readings', 'readingsIn', { atLeast: 2 });
  const refused = firstRefusal(
    mustBe('toleranceIn', toleranceIn, LENGTH_IN),
    ...readingsIn.slice(0, 3).map((reading) => mustBe('readingsIn', reading, HEIGHT_IN)),
  );
  if (refused) return refused;
  const counts = (a: number, b: number, places: readonly [number, number]): Outcome<Agreement> => ({
    ok: true,
    agreed: true,
    valueIn: (a + b) / 2,
    counted: places,
    differenceIn: Math.abs(a - b),
  });
  const within = toleranceIn + SLACK_IN;
  if (Math.abs(first - second) <= within) return counts(first, second, [0, 1]);
  const open = {
    ok: true,
    agreed: false,
    valueIn: null,
    counted: null,
    differenceIn: Math.abs(first - second),
  } as const;
  if (third === undefined) return open;
  const [toFirst, toSecond] = [Math.abs(third - first), Math.abs(third - second)];
  if (Math.min(toFirst, toSecond) > within || Math.abs(toFirst - toSecond) <= SLACK_IN) return open;
  return toFirst < toSecond ? counts(first, third, [0, 2]) : counts(second, third, [1, 2]);
};
