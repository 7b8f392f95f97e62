import { NO_NUMBER } from './print-decimal';

/** The finest mark of the tape that is printed. */
export type TapeDenominator = 2 | 4 | 8 | 16 | 32 | 64;

interface TapeReading {
  readonly negative: boolean;
  readonly whole: number;
  /** `3/8`, or empty when the reading falls on a full inch. */
  readonly fraction: string;
}

const reduce = (numerator: number, denominator: number): string => {
  let [top, bottom] = [numerator, denominator];
  while (top % 2 === 0) [top, bottom] = [top / 2, bottom / 2];
  return `${top}/${bottom}`;
};

/** The nearest mark of the tape, halves away from zero. */
const readTape = (valueIn: number, denominator: TapeDenominator): TapeReading => {
  const marks = Math.round(Math.abs(valueIn) * denominator);
  const rest = marks % denominator;
  return {
    negative: valueIn < 0 && marks > 0,
    whole: (marks - rest) / denominator,
    fraction: rest === 0 ? '' : reduce(rest, denominator),
  };
};

const join = (whole: number, fraction: string, joint: string): string => {
  if (fraction === '') return String(whole);
  return whole === 0 ? fraction : `${whole}${joint}${fraction}`;
};

/** Past this a double no longer holds sixteenths; nothing on a rig is that long. */
const LONGEST_IN = 1e9;
const printable = (valueIn: number): boolean => Math.abs(valueIn) <= LONGEST_IN;

/** Inches as the tape reads them: `14 3/8`, `-2 1/16`, `7/64`. Rounds to the nearest mark. */
export const printInches = (valueIn: number, denominator: TapeDenominator = 16): string => {
  if (!printable(valueIn)) return NO_NUMBER;
  const { negative, whole, fraction } = readTape(valueIn, denominator);
  return `${negative ? '-' : ''}${join(whole, fraction, ' ')}`;
};

/** Feet, inches and fraction: `6' 3-5/16"`; below a foot only the inches: `3/8"`. */
export const printFeetInches = (valueIn: number, denominator: TapeDenominator = 16): string => {
  if (!printable(valueIn)) return NO_NUMBER;
  const { negative, whole, fraction } = readTape(valueIn, denominator);
  const feet = Math.floor(whole / 12);
  const rest = `${join(whole % 12, fraction, '-')}"`;
  return `${negative ? '-' : ''}${feet === 0 ? rest : `${feet}' ${rest}`}`;
};
