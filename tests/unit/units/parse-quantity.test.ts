import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { Fraction } from 'fraction.js';
import { describe, expect, it } from 'vitest';
import entryWords from '../../../shared/locales/en/entry';
import { convert, parseQuantity, printFeetInches, printInches, type Unit } from '../../../shared/units';

const read = (text: string, unit: Unit = 'in') => {
  const parsed = parseQuantity(text, unit);
  return parsed.ok ? `${parsed.exact} ${parsed.unit}` : parsed.reason;
};

describe('a quantity is read as the tape says it', () => {
  it.each([
    ['14 3/8', '14.375 in'],
    ['14-3/8', '14.375 in'],
    ['14.375', '14.375 in'],
    ['14,375', '14.375 in'],
    ['14,5 mm', '14.5 mm'],
    ['0,365 m', '0.365 m'],
    ['1,365 m', '1.365 m'],
    ["1'-2 3/8", '14.375 in'],
    ['-5\' 3"', '-63 in'],
    ["5' 11 15/16", '71.9375 in'],
    ['+1 1/2', '1.5 in'],
    ['3/8', '0.375 in'],
    ['-2 1/16', '-2.0625 in'],
    ['−2 1/16', '-2.0625 in'],
    [' 14⅜″ ', '14.375 in'],
    ["1' 2 3/8", '14.375 in'],
    [`1'11-15/16"`, '23.9375 in'],
    [`6' 3-5/16"`, '75.3125 in'],
    ['6′ 3 5⁄16″', '75.3125 in'],
    ['6\'-3 5/16"', '75.3125 in'],
    ['6 ft 3 in', '75 in'],
    ["6'", '6 ft'],
    ['365 mm', '365 mm'],
    ['36.5cm', '36.5 cm'],
    ['2 m', '2 m'],
    ['.5', '0.5 in'],
    ['0', '0 in'],
    ['-0', '0 in'],
    ['7/64', '0.109375 in'],
  ])('%s', (text, expected) => expect(read(text)).toBe(expected));

  it.each<[string, Unit, string]>([
    ['250 °F', 'degF', '250 degF'],
    ['250F', 'degC', '250 degF'],
    ['121 °C', 'degF', '121 degC'],
    ['-40c', 'degF', '-40 degC'],
    ['1000 psi', 'psi', '1000 psi'],
    ['69 bar', 'psi', '69 bar'],
    ['6900 kPa', 'psi', '6900 kPa'],
    ['6.9 MPa', 'psi', '6.9 MPa'],
    ['20.9 %', 'pct', '20.9 pct'],
    ['10ppm', 'ppm', '10 ppm'],
    ['24 V', 'V', '24 V'],
    ['120A', 'A', '120 A'],
    ['12.5 min', 's', '12.5 min'],
    ['2 h', 'min', '2 h'],
    ['90 s', 'min', '90 s'],
    ['15 minutes', 'min', '15 min'],
    ['2 hours', 'min', '2 h'],
    ['14,375 in', 'mm', '14.375 in'],
  ])('%s where %s is expected', (text, unit, expected) => expect(read(text, unit)).toBe(expected));

  it('lands 6 ft 3-5/16 in on 1912.9375 mm (NIST SP 811: 25.4 mm to the inch)', () => {
    const parsed = parseQuantity(`6' 3-5/16"`, 'mm');
    expect(parsed).toMatchObject({ ok: true, value: 75.3125, unit: 'in' });
    expect(convert(75.3125, 'in', 'mm')).toBeCloseTo(1912.9375, 10);
  });
});

describe('what cannot be meant is refused with its own reason', () => {
  it.each<[string, Unit, string]>([
    ['', 'in', 'quantity-empty'],
    ['   ', 'in', 'quantity-empty'],
    ['3/0', 'in', 'quantity-zero-denominator'],
    [`5'14"`, 'in', 'quantity-inches-reach-a-foot'],
    ["5'12", 'in', 'quantity-inches-reach-a-foot'],
    ['12,5,3', 'in', 'quantity-many-commas'],
    ['1,250.5', 'psi', 'quantity-many-commas'],
    ['1,250', 'psi', 'quantity-comma-ambiguous'],
    // twelve hundred and fifty millimetres must not become one and a quarter
    ['1,250 mm', 'in', 'quantity-comma-ambiguous'],
    ['1,250', 'mm', 'quantity-comma-ambiguous'],
    ['1,250 ft', 'in', 'quantity-comma-ambiguous'],
    ['1 64/64', 'in', 'quantity-fraction-not-proper'],
    ["5' 12", 'in', 'quantity-inches-reach-a-foot'],
    ['NaN', 'in', 'quantity-not-finite'],
    ['Infinity', 'in', 'quantity-not-finite'],
    ['-∞', 'in', 'quantity-not-finite'],
    ['1e3', 'in', 'quantity-exponent'],
    ['1E-3 mm', 'in', 'quantity-exponent'],
    ['143/8', 'in', 'quantity-fraction-not-proper'],
    ['14 1/3', 'in', 'quantity-fraction-not-on-tape'],
    ['14 3/8 mm', 'in', 'quantity-fraction-needs-inches'],
    ['14 3/8', 'mm', 'quantity-fraction-needs-inches'],
    ['14.5 3/8', 'in', 'quantity-fraction-with-decimal'],
    [`5.5' 3"`, 'in', 'quantity-feet-not-whole'],
    ['14 cubits', 'in', 'quantity-unit-unknown'],
    ['14 psi', 'in', 'quantity-unit-of-another-kind'],
    ['0.12345678', 'in', 'quantity-too-many-digits'],
    ['12345678901', 'in', 'quantity-too-many-digits'],
    ['about a foot', 'in', 'quantity-not-understood'],
    ['14 4', 'in', 'quantity-not-understood'],
    ['--3', 'in', 'quantity-not-understood'],
    ['1/2/3', 'in', 'quantity-not-understood'],
    ['constructor', 'in', 'quantity-not-understood'],
    ['14 constructor', 'in', 'quantity-unit-unknown'],
  ])('"%s" in %s', (text, unit, reason) => {
    expect(read(text, unit)).toBe(reason);
    expect(entryWords).toHaveProperty(reason);
  });

  it('never throws, whatever is typed', () => {
    const keys = fc.string({ unit: fc.constantFrom(...`0123456789 .,-+'"/eftinmps°⅜`), maxLength: 70 });
    fc.assert(
      fc.property(fc.oneof(fc.string(), keys), (text) => {
        const parsed = parseQuantity(text, 'in');
        if (parsed.ok) {
          expect(Number.isFinite(parsed.value)).toBe(true);
          expect(String(Number(parsed.exact))).toBe(String(parsed.value));
        } else expect(entryWords).toHaveProperty(parsed.reason);
      }),
      { numRuns: 2000 },
    );
  });
});

describe('what is printed reads back as itself', () => {
  const sixtyFourths = fc.integer({ min: -64 * 2000, max: 64 * 2000 });

  it('for every sixty-fourth, as inches and as feet and inches', () => {
    fc.assert(
      fc.property(sixtyFourths, (marks) => {
        const value = marks / 64;
        for (const text of [printInches(value, 64), printFeetInches(value, 64)]) {
          const parsed = parseQuantity(text, 'in');
          expect(parsed).toMatchObject({ ok: true, unit: 'in' });
          if (parsed.ok) expect(parsed.value).toBe(value === 0 ? 0 : value);
        }
      }),
    );
  });

  it('keeps fractions exact (references: fraction.js, decimal.js)', () => {
    fc.assert(
      fc.property(fc.nat(5000), fc.constantFrom(2, 4, 8, 16, 32, 64), fc.nat(63), (whole, denominator, seed) => {
        const numerator = seed % denominator;
        const parsed = parseQuantity(`${whole} ${numerator}/${denominator}`, 'in');
        expect(parsed.ok).toBe(true);
        if (!parsed.ok) return;
        const fraction = new Fraction(whole).add(numerator, denominator);
        expect(new Fraction(parsed.exact).equals(fraction)).toBe(true);
        expect(new Decimal(parsed.exact).equals(new Decimal(numerator).div(denominator).plus(whole))).toBe(true);
        expect(parsed.value).toBe(fraction.valueOf());
      }),
    );
  });
});
