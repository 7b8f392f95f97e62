import { addMonths as theirs, addYears, formatISO } from 'date-fns';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { qualificationContinuity, retention } from '../../shared/calculations';
import { answer, reason } from './answer';

const lastDay = (lastUsed: string) => answer(qualificationContinuity({ lastUsed, onDay: '2026-01-01' })).lastDay;
const day = (date: Date) => formatISO(date, { representation: 'date' });
const anyDay = fc.date({ min: new Date(2000, 0, 1), max: new Date(2060, 0, 1), noInvalidDate: true });

describe('a welder’s qualification (ASME IX QW-322; end of month is a convention)', () => {
  it.each([
    ['2026-01-15', '2026-07-15'],
    ['2026-08-31', '2027-02-28'],
    ['2027-08-31', '2028-02-29'],
    ['2026-12-31', '2027-06-30'],
  ])('last used %s is in force through %s', (used, through) => expect(lastDay(used)).toBe(through));

  it('is in force on its last day and not the day after', () => {
    const on = (onDay: string) => answer(qualificationContinuity({ lastUsed: '2026-01-15', onDay })).inForce;
    expect([on('2026-07-15'), on('2026-07-16')]).toEqual([true, false]);
  });

  it('agrees with date-fns', () => {
    fc.assert(
      fc.property(anyDay, (date) => {
        expect(lastDay(day(date))).toBe(day(theirs(date, 6)));
      }),
    );
  });

  it.each(['', '2026-02-30', '2026-13-01', '15 Jan', '2026-1-5'])('does not take "%s" for a date', (lastUsed) =>
    expect(reason(qualificationContinuity({ lastUsed, onDay: '2026-01-01' }))).toBe('date-not-understood'),
  );
});

describe('how long a packet is kept', () => {
  const through = (sealedOn: string, ...ruleIds: string[]) => answer(retention({ sealedOn, ruleIds })).keepThrough;
  it.each([
    ['texas-cprc-16.009', '2036-03-05'],
    ['api-q1-9', '2031-03-05'],
    ['api-q1-10', '2036-03-05'],
  ])('by %s through %s', (rule, date) => expect(through('2026-03-05', rule)).toBe(date));
  it('takes the longest that applies', () => expect(through('2026-03-05', 'api-q1-9', 'api-q1-10')).toBe('2036-03-05'));
  it('ends a leap day on 28 February', () => expect(through('2028-02-29', 'api-q1-10')).toBe('2038-02-28'));
  it('agrees with date-fns', () => {
    fc.assert(
      fc.property(anyDay, (date) => {
        expect(through(day(date), 'api-q1-10')).toBe(day(addYears(date, 10)));
      }),
    );
  });
  it('does not know other editions', () =>
    expect(reason(retention({ sealedOn: '2026-03-05', ruleIds: ['api-q1-8'] }))).toBe('edition-unknown'));
});
