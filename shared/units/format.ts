import { convertDifference, convertIfAlike, type UnitLike } from './convert';
import { toDecimal } from './decimal';
import { printAmount, type PrintedQuantity } from './print-amount';
import { symbolOf, UNITS, type Unit } from './units';

/** What a person reads in. What was typed is kept as typed; this only decides how it is shown. */
export type UnitSystem = 'imperial' | 'metric';

const metric: Partial<Record<Unit, Unit>> = {
  in: 'mm',
  ft: 'm',
  psi: 'kPa',
  degF: 'degC',
  gal: 'L',
  in3: 'L',
  lb: 'kg',
  inPerMin: 'mmPerMin',
  kJPerIn: 'kJPerMm',
  ftLbf: 'J',
};

const imperial: Partial<Record<Unit, Unit>> = {
  mm: 'in',
  cm: 'in',
  m: 'ft',
  kPa: 'psi',
  bar: 'psi',
  MPa: 'psi',
  degC: 'degF',
  L: 'gal',
  kg: 'lb',
  mmPerMin: 'inPerMin',
  kJPerMm: 'kJPerIn',
};

/** The unit in which a person reads, and types, what is kept in `unit`. */
export const unitFor = (unit: Unit, system: UnitSystem): Unit =>
  (system === 'metric' ? metric[unit] : imperial[unit]) ?? unit;

export const isUnit = (code: string): code is Unit => Object.hasOwn(UNITS, code);

/** A decimal string, or how a language writes a very small or very large number. */
const numeric = /^-?\d+(\.\d+)?(e[+-]?\d+)?$/i;

/**
 * A kept quantity (decimal string and unit code) the reader's way, as exactly as its instrument can tell: what was
 * typed keeps its decimals, what was worked out is rounded, inches stand as the tape has them. An unknown unit or
 * number is shown as it stands.
 * @param difference the value is a distance between two points, which matters for temperatures (30 °F apart is 16.7 °C)
 */
export const quantityParts = (
  quantity: string,
  unit: string,
  system: UnitSystem,
  difference?: true,
): PrintedQuantity => {
  if (!isUnit(unit)) return { value: quantity, unit };
  if (!numeric.test(quantity)) return { value: quantity, unit: symbolOf(unit) };
  const shown = unitFor(unit, system);
  const number = Number(quantity);
  if (shown === unit) return printAmount(toDecimal(number), shown, { difference });
  const turned = difference
    ? convertDifference(number, unit, shown as UnitLike<Unit>)
    : (convertIfAlike(number, unit, shown) ?? number);
  // a converted number has decimals that nobody read
  return printAmount(toDecimal(turned), shown, { converted: true, difference });
};

/** The same in one piece: `14 3/8 in`, `310 °F`, `0.15°`. */
export const printQuantity = (quantity: string, unit: string, system: UnitSystem, difference?: true): string =>
  joined(quantityParts(quantity, unit, system, difference));

/** Number and symbol as they are written in a sentence: degrees of arc stand close, all others apart. */
export const joined = ({ value, unit }: PrintedQuantity): string =>
  unit === '' ? value : unit === '°' ? `${value}°` : `${value}\u00a0${unit}`;
