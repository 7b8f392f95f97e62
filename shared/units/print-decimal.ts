import { toDecimal } from './decimal';

/** Shown where a number is missing or is no number. */
export const NO_NUMBER = '–';

/** A number for reading, without float noise: 0.1 + 0.2 prints as `0.3`. Rounds half away from zero. */
export const printDecimal = (value: number, places = 3): string =>
  Number.isFinite(value) ? toDecimal(value, places) : NO_NUMBER;

/** The same with a fixed number of decimals, so that a column lines up: `2.50`. */
export const printFixed = (value: number, places: number): string => {
  const text = printDecimal(value, places);
  if (text === NO_NUMBER || places <= 0) return text;
  const [whole = '0', part = ''] = text.split('.');
  return `${whole}.${part.padEnd(places, '0')}`;
};
