import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { unit as mathUnit } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { convert, convertDifference, convertIfAlike } from '../../shared/units';

describe('units convert by their exact definitions (NIST SP 811)', () => {
  it('takes an inch for 25.4 mm', () => {
    expect(convert(1, 'in', 'mm')).toBe(25.4);
    expect(convert(25.4, 'mm', 'in')).toBe(1);
    expect(convert(23.9375, 'in', 'mm')).toBeCloseTo(608.0125, 10);
    expect(convert(1, 'ft', 'in')).toBeCloseTo(12, 14);
  });

  it('takes a psi for 6894.757293168361 Pa (reference: decimal.js)', () => {
    const exact = new Decimal('4.4482216152605').div(new Decimal('0.0254').pow(2));
    expect(convert(1, 'psi', 'kPa') * 1000).toBeCloseTo(exact.toNumber(), 9);
    expect(exact.toNumber()).toBeCloseTo(6894.757293168361, 9);
  });

  it('keeps a temperature apart from a difference of temperatures', () => {
    expect(convert(250, 'degF', 'degC')).toBeCloseTo(121.1111111111, 9);
    expect(convertDifference(30, 'degF', 'K')).toBeCloseTo(16.6666666667, 9);
    expect(convertDifference(30, 'degF', 'degC')).toBeCloseTo(16.6666666667, 9);
    expect(convert(-40, 'degF', 'degC')).toBe(-40);
    expect(convert(0, 'degC', 'K')).toBe(273.15);
  });

  it('turns kJ/in into kJ/mm by 25.4', () =>
    expect(convert(17.28, 'kJPerIn', 'kJPerMm')).toBeCloseTo(17.28 / 25.4, 14));

  it('refuses to turn one kind into another', () => expect(convertIfAlike(1, 'in', 'psi')).toBeNull());

  it.each([
    ['in', 'mm', 'inch', 'mm'],
    ['ft', 'm', 'ft', 'm'],
    ['psi', 'kPa', 'psi', 'kPa'],
    ['bar', 'psi', 'bar', 'psi'],
    ['MPa', 'bar', 'MPa', 'bar'],
    ['degF', 'degC', 'degF', 'degC'],
    ['degC', 'K', 'degC', 'K'],
    ['lb', 'kg', 'lbm', 'kg'],
    ['in3', 'L', 'cuin', 'L'],
    ['h', 's', 'hour', 's'],
  ] as const)('agrees with mathjs from %s to %s', (from, to, theirFrom, theirTo) => {
    fc.assert(
      fc.property(fc.double({ min: -5000, max: 5000, noNaN: true }), (value) => {
        const theirs = mathUnit(value, theirFrom).toNumber(theirTo);
        expect(convertIfAlike(value, from, to)).toBeCloseTo(theirs, -Math.log10(Math.max(1, Math.abs(theirs)) * 1e-7));
      }),
    );
  });
});
