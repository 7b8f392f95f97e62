import { readingAgreement } from '../calculations/reading-agreement';
import type { Unit } from '../units/units';
import type { PointContext } from './context';
import type { FieldDefinition } from './definition';
import { quantity } from './fields';
import { bySetting, judgeRange } from './judging';
import type { Verdict } from './verdict';

const hands = ['first', 'second', 'third'] as const;

/** A length that two people measure apart from each other; a third may settle it. */
export const twoPersonFields = (base: string, unit: Unit, likely?: { min: number; max: number }): FieldDefinition[] => [
  quantity(`${base}.first`, unit, { likely }),
  quantity(`${base}.second`, unit, { likely, confirms: `${base}.first` }),
  quantity(`${base}.third`, unit, { likely, required: false }),
];

export interface TwoPersons {
  /** what counts, in inches; undefined until two of them agree */
  agreedIn: number | undefined;
  /** between the two that count, else between first and second */
  differenceIn: number | undefined;
  /** the readings that are there */
  fields: string[];
  readingsIn: number[];
  /** the readings that count */
  counted: string[];
}

/** What two people measured, in inches, held together within the job's tolerance for two tapes. */
export const twoPersons = (context: PointContext, base: string): TwoPersons => {
  const read = hands.flatMap((hand) => {
    const value = context.number(`${base}.${hand}`);
    return value === undefined ? [] : [{ field: `${base}.${hand}`, value }];
  });
  const [fields, readingsIn] = [read.map((one) => one.field), read.map((one) => one.value)];
  const bothFirst = fields[0] === `${base}.first` && fields[1] === `${base}.second`;
  const found = bothFirst ? readingAgreement({ readingsIn, toleranceIn: context.setting('tapesAgreeIn') }) : undefined;
  if (!found?.ok) return { agreedIn: undefined, differenceIn: undefined, fields, readingsIn, counted: [] };
  return {
    agreedIn: found.valueIn ?? undefined,
    differenceIn: found.differenceIn,
    fields,
    readingsIn,
    counted: found.counted?.flatMap((place) => fields[place] ?? []) ?? [],
  };
};

/** First and second within the job's tolerance of each other, or settled by a third: a hold. */
export const judgeAgreement = (context: PointContext, base: string): Verdict[] => {
  const measured = twoPersons(context, base);
  return judgeRange(context, {
    limit: `${base}.agree`,
    kind: 'hold',
    about: measured.fields,
    measured: measured.differenceIn,
    max: context.setting('tapesAgreeIn'),
    unit: 'in',
    source: bySetting(context, 'tapesAgreeIn'),
  });
};

/**
 * The length to hold against a limit: what was agreed on, else the reading that lies farthest from `expectedIn`, so
 * that a disagreement never makes a limit easier to keep.
 */
export const agreedOrFarthest = (measured: TwoPersons, expectedIn: number): number | undefined =>
  measured.differenceIn === undefined
    ? undefined
    : (measured.agreedIn ??
      [...measured.readingsIn].sort((a, b) => Math.abs(b - expectedIn) - Math.abs(a - expectedIn))[0]);
