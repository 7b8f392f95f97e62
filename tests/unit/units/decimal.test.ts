import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fromDecimal, isDecimal, roundTo, toDecimal } from '../../../shared/units';

describe('numbers travel as canonical decimal strings', () => {
  it.each([
    [14.375, '14.375'],
    [0.1 + 0.2, '0.3'],
    [1e21, '1000000000000000000000'],
    [1e-7, '0'],
    [5e-7, '0.000001'],
    [-5e-7, '-0.000001'],
    [-1e-9, '0'],
    [-0, '0'],
    [100, '100'],
  ])('%d', (value, text) => expect(toDecimal(value)).toBe(text));

  it('rounds half away from zero by how the number reads', () => {
    expect(toDecimal(1.005, 2)).toBe('1.01');
    expect(toDecimal(-1.005, 2)).toBe('-1.01');
    expect(roundTo(2.5, 0)).toBe(3);
  });

  it('writes what is no number as text that is no decimal', () => {
    for (const value of [NaN, Infinity, -Infinity]) expect(isDecimal(toDecimal(value))).toBe(false);
  });

  it.each(['1e3', '01', '1.', '1.0', '.5', '-0', '', ' 1', 'NaN', '0x10'])('does not take %s back', (text) =>
    expect(fromDecimal(text)).toBeNull(),
  );

  it('agrees with decimal.js and comes back as itself', () => {
    fc.assert(
      fc.property(
        fc.double({ noNaN: true, min: -1e12, max: 1e12 }),
        fc.integer({ min: 0, max: 6 }),
        (value, places) => {
          const text = toDecimal(value, places);
          expect(isDecimal(text)).toBe(true);
          const expected = new Decimal(value).toDecimalPlaces(places, Decimal.ROUND_HALF_UP);
          expect(new Decimal(text).equals(expected)).toBe(true);
          expect(toDecimal(fromDecimal(text) ?? NaN, places)).toBe(text);
        },
      ),
    );
  });
});
