/** Why a calculation has no answer: a code for whoever called it; what a person is told is a limit's own sentence. */
export type RefusalReason =
  | 'not-a-number'
  | 'below-range'
  | 'above-range'
  | 'too-few-readings'
  | 'wall-too-thick'
  | 'bore-not-smaller'
  | 'reading-at-or-below-ambient'
  | 'readings-at-one-time'
  | 'not-cooling'
  | 'target-never-reached'
  | 'no-fit-for-ambient'
  | 'no-limit-given'
  | 'flange-not-in-table'
  | 'casing-not-in-table'
  | 'grade-unknown'
  | 'electrode-class-unknown'
  | 'site-limit-looser'
  | 'date-not-understood'
  | 'edition-unknown'
  | 'gas-denser-than-equation'
  | 'casing-outside-stakes';

/** What a number must be: `above` and `below` exclude the value itself. */
export interface Range {
  readonly above?: number;
  readonly atLeast?: number;
  readonly atMost?: number;
  readonly below?: number;
}

/** No answer, and why: which input, and the range it must lie in where there is one. */
export interface Refusal {
  readonly ok: false;
  readonly reason: RefusalReason;
  readonly input: string | null;
  readonly range: Range | null;
}

export type Outcome<Result extends object> = ({ readonly ok: true } & Readonly<Result>) | Refusal;

/** What stands beside every result on record. */
export interface CalculationInfo {
  readonly id: string;
  readonly version: number;
  readonly formula: string;
  readonly source: string;
  readonly range: string;
}

export const refuse = (reason: RefusalReason, input: string | null = null, range: Range | null = null): Refusal => ({
  ok: false,
  reason,
  input,
  range,
});

/** Refuses what is no finite number or lies outside the range; null when the number is fit to use. */
export const mustBe = (input: string, value: number, range: Range): Refusal | null => {
  if (typeof value !== 'number' || !Number.isFinite(value)) return refuse('not-a-number', input, range);
  const { above = -Infinity, atLeast = -Infinity, atMost = Infinity, below = Infinity } = range;
  if (value <= above || value < atLeast) return refuse('below-range', input, range);
  if (value >= below || value > atMost) return refuse('above-range', input, range);
  return null;
};

/** The first refusal that checking a list one by one meets, or null; for lists as long as a recorder's. */
export const firstRefusalIn = <Item>(items: readonly Item[], check: (item: Item) => Refusal | null): Refusal | null => {
  for (const item of items) {
    const refused = check(item);
    if (refused) return refused;
  }
  return null;
};

/** The first refusal of a list of checks, or null. */
export const firstRefusal = (...checks: readonly (Refusal | null)[]): Refusal | null =>
  checks.find((check) => check !== null) ?? null;
