import { describe, expect, it } from 'vitest';
import { printDecimal, printFeetInches, printFixed, printInches } from '../../../shared/units';

describe('lengths are printed as the tape reads', () => {
  it.each<[number, 16 | 32 | 64, string]>([
    [14.375, 16, '14 3/8'],
    [-2.0625, 16, '-2 1/16'],
    [7 / 64, 64, '7/64'],
    [11.99, 16, '12'],
    [0, 16, '0'],
    [-0.001, 16, '0'],
    [0.03125, 16, '1/16'],
    [-0.03125, 16, '-1/16'],
    [5 / 32, 32, '5/32'],
    [NaN, 16, '–'],
    [Infinity, 16, '–'],
    [1e12, 16, '–'],
  ])('%d to the nearest 1/%d in', (value, denominator, text) => expect(printInches(value, denominator)).toBe(text));

  it.each([
    [75.3125, `6' 3-5/16"`],
    [23.9375, `1' 11-15/16"`],
    [11.99, `1' 0"`],
    [12.375, `1' 3/8"`],
    [0.375, `3/8"`],
    [-75.3125, `-6' 3-5/16"`],
    [0, `0"`],
  ])('%d in as feet and inches', (value, text) => expect(printFeetInches(value)).toBe(text));

  it('prints decimals without float noise', () => {
    expect(printDecimal(0.1 + 0.2)).toBe('0.3');
    expect(printDecimal(1912.9375, 1)).toBe('1912.9');
    expect(printFixed(2.5, 2)).toBe('2.50');
    expect(printFixed(-0.001, 2)).toBe('0.00');
    expect(printDecimal(NaN)).toBe('–');
  });
});
