import { Decimal } from 'decimal.js';
import { Fraction } from 'fraction.js';
import { describe, expect, it } from 'vitest';
import { convert, parseQuantity, printFeetInches, printInches } from '../../shared/units';

const read = (text: string) => {
  const parsed = parseQuantity(text, 'in');
  return parsed.ok ? `${parsed.exact} ${parsed.unit}` : parsed.reason;
};

describe('feet, inches and sixteenths (NIST SP 811: an inch is 25.4 mm)', () => {
  it.each([
    [`6' 3-5/16"`, '75.3125 in'],
    [`1'11-15/16"`, '23.9375 in'],
    ['14 3/8', '14.375 in'],
    ['14-3/8', '14.375 in'],
    ['14.375', '14.375 in'],
    ['365 mm', '365 mm'],
    ['-2 1/16', '-2.0625 in'],
  ])('%s', (text, exact) => expect(read(text)).toBe(exact));

  it.each(['3/0', `5'14"`, '12,5,3'])('%s is refused', (text) => expect(parseQuantity(text, 'in').ok).toBe(false));

  it('75.3125 in is 1912.9375 mm (reference: decimal.js)', () => {
    expect(new Decimal('75.3125').times('25.4').toString()).toBe('1912.9375');
    expect(convert(75.3125, 'in', 'mm')).toBeCloseTo(1912.9375, 10);
  });

  it('keeps every sixty-fourth of a foot exact and prints it back (reference: fraction.js)', () => {
    for (let marks = 0; marks < 12 * 64; marks += 1) {
      const fraction = new Fraction(marks, 64);
      for (const text of [printInches(marks / 64, 64), printFeetInches(marks / 64, 64)])
        expect(new Fraction(read(text).replace(' in', '')).equals(fraction)).toBe(true);
    }
  });
});
