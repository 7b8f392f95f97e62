import { readingAgreement } from '../calculations/reading-agreement';
import { samePerson } from '../job/actor';
import type { Unit } from '../units/units';
import type { Reading } from '../job/state';
import { answer } from './computing';
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

interface OneHand {
  field: string;
  value: number;
  reading: Reading;
}

/** The agreement of these readings, and the ones of them that count. */
const agreementOf = (read: OneHand[], toleranceIn: number) => {
  const found = answer(readingAgreement({ readingsIn: read.map((one) => one.value), toleranceIn }));
  return found && { ...found, by: found.counted?.flatMap((place) => read[place] ?? []) ?? [] };
};

/** What two people measured, in inches, held together within the job's tolerance for two tapes. */
export const twoPersons = (context: PointContext, base: string): TwoPersons => {
  const read = hands.flatMap((hand): OneHand[] => {
    const field = `${base}.${hand}`;
    const [value, reading] = [context.number(field), context.read(field)];
    return value === undefined || reading === undefined ? [] : [{ field, value, reading }];
  });
  const [fields, readingsIn] = [read.map((one) => one.field), read.map((one) => one.value)];
  const none = { agreedIn: undefined, differenceIn: undefined, fields, readingsIn, counted: [] };
  const [first, second, third] = read;
  if (first?.field !== `${base}.first` || second?.field !== `${base}.second`) return none;
  // Two readings of one hand prove nothing together: a third by one of the two settles it only with the other's.
  const same = [first, second].find((one) => third && samePerson(one.reading.measuredBy, third.reading.measuredBy));
  const toleranceIn = context.setting('tapesAgreeIn');
  const plain = agreementOf([first, second], toleranceIn);
  const apart = third && same ? [same === first ? second : first, third] : read;
  const settled = plain?.agreed ? plain : agreementOf(apart, toleranceIn);
  if (!plain || !settled) return none;
  const found = settled.agreed ? settled : plain;
  return {
    agreedIn: found.valueIn ?? undefined,
    differenceIn: found.differenceIn,
    fields,
    readingsIn,
    counted: found.by.map((one) => one.field),
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
