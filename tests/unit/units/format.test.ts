import { describe, expect, it } from 'vitest';
import { printQuantity, quantityParts, unitFor } from '../../../shared/units/format';

describe('printing a kept quantity for its reader', () => {
  it('sets inches as the tape has them, and as decimals where it has no mark', () => {
    expect(printQuantity('14.375', 'in', 'imperial')).toBe('14 3/8\u00a0in');
    expect(printQuantity('-2.0625', 'in', 'imperial')).toBe('-2 1/16\u00a0in');
    expect(printQuantity('14.37', 'in', 'imperial')).toBe('14.37\u00a0in');
  });

  it('turns into the other system what its reader does not think in', () => {
    expect(printQuantity('14.375', 'in', 'metric')).toBe('365.1\u00a0mm');
    expect(printQuantity('310', 'degF', 'metric')).toBe('154\u00a0°C');
    expect(printQuantity('1500', 'psi', 'metric')).toBe('10342\u00a0kPa');
    expect(printQuantity('365', 'mm', 'imperial')).toBe('14.37\u00a0in');
  });

  it('keeps a difference of temperatures a difference', () => {
    expect(printQuantity('30', 'degF', 'metric', true)).toBe('17\u00a0°C');
    expect(printQuantity('30', 'degF', 'metric')).toBe('-1\u00a0°C');
  });

  it('sets degrees of arc close and counts bare', () => {
    expect(printQuantity('0.15', 'deg', 'imperial')).toBe('0.15°');
    expect(printQuantity('4', 'count', 'metric')).toBe('4');
  });

  it('shows what it does not know as it stands', () => {
    expect(quantityParts('seven', 'in', 'metric')).toEqual({ value: 'seven', unit: 'in' });
    expect(quantityParts('7', 'furlong', 'metric')).toEqual({ value: '7', unit: 'furlong' });
  });

  it('names the unit that a bare number is typed in', () => {
    expect(unitFor('in', 'metric')).toBe('mm');
    expect(unitFor('in', 'imperial')).toBe('in');
    expect(unitFor('ppm', 'metric')).toBe('ppm');
  });
});
