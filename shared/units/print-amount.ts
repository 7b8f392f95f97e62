import { toDecimal } from './decimal';
import { printInches } from './print-inches';
import { symbolOf, type Unit } from './units';

/** A quantity for reading: the number, and the unit to set beside it in the muted ink. */
export interface PrintedQuantity {
  readonly value: string;
  readonly unit: string;
}

/** Decimals of a unit: as a person types them off an instrument, and of a value that was worked out. */
interface Places {
  readonly typed: number;
  readonly worked: number;
}

const places: Partial<Record<Unit, Places>> = {
  ft: { typed: 2, worked: 1 },
  mm: { typed: 1, worked: 1 },
  cm: { typed: 2, worked: 1 },
  m: { typed: 3, worked: 2 },
  psi: { typed: 1, worked: 0 },
  kPa: { typed: 1, worked: 0 },
  bar: { typed: 1, worked: 1 },
  MPa: { typed: 2, worked: 2 },
  degF: { typed: 1, worked: 0 },
  degC: { typed: 1, worked: 0 },
  K: { typed: 1, worked: 0 },
  ppm: { typed: 1, worked: 0 },
  V: { typed: 2, worked: 0 },
  A: { typed: 2, worked: 0 },
  s: { typed: 1, worked: 0 },
  min: { typed: 1, worked: 0 },
  h: { typed: 2, worked: 1 },
  inPerMin: { typed: 1, worked: 1 },
  mmPerMin: { typed: 0, worked: 0 },
  kJPerIn: { typed: 1, worked: 1 },
  kJPerMm: { typed: 2, worked: 2 },
  count: { typed: 4, worked: 4 },
};

/** Percent, degrees of arc and whatever is not listed. */
const others: Places = { typed: 2, worked: 2 };

/** What comes in any size, from a thimble to a tank: three figures tell enough. */
const threeFigures: ReadonlySet<Unit> = new Set<Unit>(['L', 'gal', 'in3', 'lb', 'kg', 'J', 'kJ', 'ftLbf']);

/** What is known of a number beside its digits. */
export interface Origin {
  /** it was kept in another unit: none of its decimals was read by anybody */
  readonly converted?: boolean;
  /** it tells by how much two values differ, or a limit is missed */
  readonly difference?: boolean;
}

/** Decimals below which a number is only what arithmetic leaves behind; a difference may be as small as it is kept. */
const finest = ({ difference }: Origin): number => (difference ? 6 : 4);

const decimalsOf = (decimal: string): number => decimal.split('.')[1]?.length ?? 0;

const workedPlaces = (size: number, unit: Unit): number =>
  threeFigures.has(unit)
    ? Math.min(Math.max(2 - Math.floor(Math.log10(Math.max(size, 0.001))), 0), 4)
    : (places[unit] ?? others).worked;

/** Rounded, but never to nothing: a limit that is missed by a little is still missed by something. */
const rounded = (value: number, decimals: number, origin: Origin): string => {
  let text = toDecimal(value, decimals);
  for (let more = decimals + 1; Number(text) === 0 && more <= finest(origin); more++) text = toDecimal(value, more);
  return text;
};

const printNumber = (decimal: string, unit: Unit, origin: Origin): string => {
  const value = Number(decimal);
  const { typed } = places[unit] ?? others;
  const asTyped =
    !origin.converted && decimalsOf(decimal) <= typed && !(threeFigures.has(unit) && decimalsOf(decimal) > 2);
  return asTyped ? decimal : rounded(value, workedPlaces(Math.abs(value), unit), origin);
};

/** Below this, in inches, a sixty-fourth is too coarse to tell by how much something is off. */
const tooSmallForTheTape = 1 / 32;

/** A caliper's number and the mean of two of them have no more decimals; a length that was worked out has. */
const caliperDecimals = 4;

/**
 * A tape's reading set for the eye: held together by a space that does not break, and with the slash of fractions, of
 * which the font makes a true fraction. An ordinary slash between digits (a well's name, a permit) stays a slash.
 */
const setAsFraction = (reading: string): string => reading.replace(' ', '\u00a0').replace('/', '\u2044');

/** Inches as fractions wherever a tape has a mark and for lengths worked out; a caliper's thousandths stay decimals. */
const printLength = (decimal: string, origin: Origin): string => {
  const value = Number(decimal);
  const onTheTape = Math.abs(value * 64 - Math.round(value * 64)) < 64e-6;
  const asDecimal = decimalsOf(decimal) <= caliperDecimals || Math.abs(value) < tooSmallForTheTape;
  return !onTheTape && asDecimal ? rounded(value, 3, origin) : setAsFraction(printInches(value, 64));
};

/** Past this many minutes nobody counts in minutes. */
const longMinutes = 120;

const printMinutes = (decimal: string, origin: Origin): PrintedQuantity => {
  const minutes = Math.round(Math.abs(Number(decimal)));
  if (minutes <= longMinutes) return { value: printNumber(decimal, 'min', origin), unit: symbolOf('min') };
  const sign = Number(decimal) < 0 ? '-' : '';
  const [hours, rest] = [Math.floor(minutes / 60), minutes % 60];
  if (rest === 0) return { value: `${sign}${hours}`, unit: symbolOf('h') };
  return { value: `${sign}${hours}\u00a0h\u00a0${rest}`, unit: symbolOf('min') };
};

/** A number in the unit that it is read in. `decimal` is a canonical decimal string. */
export const printAmount = (decimal: string, unit: Unit, origin: Origin = {}): PrintedQuantity => {
  if (unit === 'min') return printMinutes(decimal, origin);
  const value = unit === 'in' ? printLength(decimal, origin) : printNumber(decimal, unit, origin);
  return { value, unit: symbolOf(unit) };
};
