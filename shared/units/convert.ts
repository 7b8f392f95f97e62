import { dimensionOf, UNITS, type Dimension, type Unit } from './units';

/** Units that share a dimension with `U`; the compiler refuses psi for inches. */
export type UnitLike<U extends Unit> = {
  [K in Unit]: (typeof UNITS)[K]['dimension'] extends (typeof UNITS)[U]['dimension'] ? K : never;
}[Unit];

const toCelsius = (value: number, from: Unit): number => {
  if (from === 'degF') return ((value - 32) * 5) / 9;
  return from === 'K' ? value - 273.15 : value;
};

const fromCelsius = (celsius: number, to: Unit): number => {
  if (to === 'degF') return (celsius * 9) / 5 + 32;
  return to === 'K' ? celsius + 273.15 : celsius;
};

/** A factor below one is kept as a division, so that 25.4 mm comes back as exactly 1 in. */
const scaled = (value: number, from: Unit, to: Unit): number => {
  const [size, other] = [UNITS[from].size, UNITS[to].size];
  return from === to ? value : (value * size) / other;
};

/**
 * A point on a scale from one unit into another of the same dimension (250 °F is 121.1 °C).
 * For the distance between two temperatures use `convertDifference`. Source: NIST SP 811.
 */
export const convert = <U extends Unit>(value: number, from: U, to: UnitLike<U>): number => {
  if ((from as Unit) === to) return value;
  const dimension: Dimension = dimensionOf(from);
  return dimension === 'temperature' ? fromCelsius(toCelsius(value, from), to) : scaled(value, from, to);
};

/** A difference between two points: 30 °F of difference is 16.7 K, with no offset. Source: NIST SP 811. */
export const convertDifference = <U extends Unit>(value: number, from: U, to: UnitLike<U>): number =>
  scaled(value, from, to);

/** Like `convert` for units known only at run time; null when they measure different things. */
export const convertIfAlike = (value: number, from: Unit, to: Unit): number | null =>
  dimensionOf(from) === dimensionOf(to) ? convert(value, from, to as UnitLike<Unit>) : null;
