import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { printQuantity, quantityParts, unitFor } from '../../../shared/units/format';
import { toDecimal } from '../../../shared/units/decimal';
import { UNITS, type Unit } from '../../../shared/units/units';

const imperial = (quantity: string, unit: string, difference?: true) =>
  printQuantity(quantity, unit, 'imperial', difference).replaceAll('\u00a0', ' ');
const metric = (quantity: string, unit: string, difference?: true) =>
  printQuantity(quantity, unit, 'metric', difference).replaceAll('\u00a0', ' ');

describe('inches', () => {
  it.each([
    ['14.375', '14 3⁄8 in'],
    ['-2.0625', '-2 1⁄16 in'],
    ['8.109375', '8 7⁄64 in'],
    ['0.0625', '1⁄16 in'],
    ['0.03125', '1⁄32 in'],
    ['0.015625', '1⁄64 in'],
    ['0', '0 in'],
  ])('%s stands as the tape has it: %s', (quantity, text) => expect(imperial(quantity, 'in')).toBe(text));

  it('keeps whole and fraction on one line', () => {
    expect(quantityParts('14.375', 'in', 'imperial').value).toBe('14\u00a03⁄8');
  });

  it.each([
    ['32.242188', '32 1⁄4 in'],
    ['32.2421875', '32 1⁄4 in'],
    ['32.246094', '32 1⁄4 in'],
    ['-0.351563', '-23⁄64 in'],
    ['14.370079', '14 3⁄8 in'],
    ['27.999999', '28 in'],
  ])('%s was worked out and goes to the nearest mark: %s', (quantity, text) =>
    expect(imperial(quantity, 'in')).toBe(text),
  );

  it.each([
    ['14.37', '14.37 in'],
    ['9.721', '9.721 in'],
    ['9.6355', '9.636 in'],
    ['0.05', '0.05 in'],
  ])('%s was read off a caliper and stays a decimal: %s', (quantity, text) =>
    expect(imperial(quantity, 'in')).toBe(text),
  );

  it('tell a small difference by as many figures as it takes', () => {
    expect(imperial('0.004688', 'in', true)).toBe('0.005 in');
    expect(imperial('0.007813', 'in', true)).toBe('0.008 in');
    expect(imperial('0.0003', 'in', true)).toBe('0.0003 in');
    expect(metric('0.001', 'in', true)).toBe('0.03 mm');
  });
});

describe('every other unit', () => {
  it.each([
    ['1500', 'psi', '1500 psi'],
    ['1499.62', 'psi', '1500 psi'],
    ['1499.5', 'psi', '1499.5 psi'],
    ['310', 'degF', '310 °F'],
    ['310.4', 'degF', '310.4 °F'],
    ['310.44', 'degF', '310 °F'],
    ['32.512345', 'kJPerIn', '32.5 kJ/in'],
    ['5.26', 'inPerMin', '5.3 in/min'],
    ['118', 'A', '118 A'],
    ['118.25', 'A', '118.25 A'],
    ['118.333333', 'A', '118 A'],
    ['23.5', 'V', '23.5 V'],
    ['0.149999', 'deg', '0.15°'],
    ['37.5', 'deg', '37.5°'],
    ['20.9', 'pct', '20.9 %'],
    ['0.103896', 'pct', '0.1 %'],
    ['10', 'ppm', '10 ppm'],
    ['41.503421', 'in3', '41.5 in³'],
    ['1240.503421', 'in3', '1241 in³'],
    ['0.680123', 'lb', '0.68 lb'],
    ['23.456789', 'ft', '23.5 ft'],
    ['4', 'count', '4'],
    ['0.012346', 'count', '0.0123'],
  ])('%s %s reads %s', (quantity, unit, text) => expect(imperial(quantity, unit)).toBe(text));

  it.each([
    ['0', '0 min'],
    ['6.5', '6.5 min'],
    ['61.283333', '61 min'],
    ['120', '120 min'],
    ['120.7', '2 h 1 min'],
    ['180', '3 h'],
    ['222.4', '3 h 42 min'],
    ['-222.4', '-3 h 42 min'],
  ])('%s minutes read %s', (quantity, text) => expect(imperial(quantity, 'min')).toBe(text));

  it.each([
    ['0.31', 'psi', '0.3 psi'],
    ['0.04', 'degF', '0.04 °F'],
    ['0.003', 'deg', '0.003°'],
    ['0.283333', 'min', '0.3 min'],
    ['0.0004', 'pct', '0.0004 %'],
  ])('a limit missed by %s %s is not missed by nothing: %s', (quantity, unit, text) =>
    expect(imperial(quantity, unit, true)).toBe(text),
  );

  it('is turned into the other system where its reader does not think in it', () => {
    expect(metric('14.375', 'in')).toBe('365.1 mm');
    expect(metric('14.370079', 'in')).toBe('365 mm');
    expect(metric('310', 'degF')).toBe('154 °C');
    expect(metric('1500', 'psi')).toBe('10342 kPa');
    expect(imperial('365.125', 'mm')).toBe('14 3⁄8 in');
  });

  it('keeps a difference of temperatures a difference', () => {
    expect(metric('30', 'degF', true)).toBe('17 °C');
    expect(metric('30', 'degF')).toBe('-1 °C');
  });

  it('shows what it does not know as it stands', () => {
    expect(quantityParts('seven', 'in', 'metric')).toEqual({ value: 'seven', unit: 'in' });
    expect(quantityParts('7', 'furlong', 'metric')).toEqual({ value: '7', unit: 'furlong' });
    expect(quantityParts('', 'psi', 'metric')).toEqual({ value: '', unit: 'psi' });
  });

  it('never shows what arithmetic leaves behind', () => {
    expect(imperial(String(0.1 + 0.2), 'deg')).toBe('0.3°');
    expect(imperial(String(2.9999999999999996), 'in')).toBe('3 in');
    expect(imperial('1e-9', 'psi')).toBe('0 psi');
    const units = fc.constantFrom(...(Object.keys(UNITS) as Unit[]));
    const numbers = fc.double({ min: -1e5, max: 1e5, noNaN: true });
    fc.assert(
      fc.property(numbers, units, fc.constantFrom('imperial', 'metric'), (number, unit, system) => {
        for (const quantity of [toDecimal(number), String(number)]) {
          const { value } = quantityParts(quantity, unit, system);
          expect(value, `${quantity} ${unit}`).toMatch(/^-?[\d⁄h\u00a0]+(\.\d{1,6})?$/);
          if (Math.abs(number) >= 1) expect(value, `${quantity} ${unit}`).not.toMatch(/\.\d{5,}/);
        }
      }),
    );
  });
});

describe('a bare number', () => {
  it('is typed in the unit that its reader reads in', () => {
    expect(unitFor('in', 'metric')).toBe('mm');
    expect(unitFor('in', 'imperial')).toBe('in');
    expect(unitFor('ppm', 'metric')).toBe('ppm');
  });
});
