import { convertDifference, convertIfAlike, type UnitLike } from './convert';
import { fromDecimal } from './decimal';
import { printDecimal } from './print-decimal';
import { printInches } from './print-inches';
import { symbolOf, UNITS, type Unit } from './units';

/** What a person reads in. What was typed is kept as typed; this only decides how it is shown. */
export type UnitSystem = 'imperial' | 'metric';

/** A quantity for reading: the number, and the unit to set beside it in the muted ink. */
export interface PrintedQuantity {
  readonly value: string;
  readonly unit: string;
}

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

/** Decimals that carry what a tape, a gauge or a meter can tell; all other units get two. */
const places: Partial<Record<Unit, number>> = {
  in: 3,
  mm: 1,
  m: 3,
  psi: 0,
  kPa: 0,
  bar: 1,
  degF: 0,
  degC: 0,
  kJPerIn: 1,
  inPerMin: 1,
  mmPerMin: 0,
};

/** The unit in which a person reads, and types, what is kept in `unit`. */
export const unitFor = (unit: Unit, system: UnitSystem): Unit =>
  (system === 'metric' ? metric[unit] : imperial[unit]) ?? unit;

export const isUnit = (code: string): code is Unit => Object.hasOwn(UNITS, code);

/**
 * A kept quantity (decimal string and unit code) the reader's way. A value in its own unit loses nothing but noise:
 * inches stand as fractions when they fall on a sixty-fourth, else as decimals. A converted one is rounded to what the
 * instrument can tell. An unknown unit or number is shown as it stands.
 * @param difference the value is a distance between two points, which matters for temperatures (30 °F apart is 16.7 °C)
 */
export const quantityParts = (
  quantity: string,
  unit: string,
  system: UnitSystem,
  difference?: true,
): PrintedQuantity => {
  const number = fromDecimal(quantity);
  if (!isUnit(unit) || number === null) return { value: quantity, unit: isUnit(unit) ? symbolOf(unit) : unit };
  const shown = unitFor(unit, system);
  const converted = shown !== unit;
  const turned = difference
    ? convertDifference(number, unit, shown as UnitLike<Unit>)
    : (convertIfAlike(number, unit, shown) ?? number);
  const value = converted ? turned : number;
  return { value: numberIn(value, shown, converted), unit: symbolOf(shown) };
};

/** The same in one piece: `14 3/8 in`, `310 °F`, `0.15°`. */
export const printQuantity = (quantity: string, unit: string, system: UnitSystem, difference?: true): string =>
  joined(quantityParts(quantity, unit, system, difference));

/** Number and symbol as they are written in a sentence: degrees of arc stand close, all others apart. */
export const joined = ({ value, unit }: PrintedQuantity): string =>
  unit === '' ? value : unit === '°' ? `${value}°` : `${value}\u00a0${unit}`;

const onTheTape = (inches: number): boolean => Number.isInteger(inches * 64);

const numberIn = (value: number, unit: Unit, converted: boolean): string => {
  if (unit === 'in' && onTheTape(value)) return printInches(value, 64);
  return printDecimal(value, converted ? (places[unit] ?? 2) : Math.max(places[unit] ?? 2, 3));
};
