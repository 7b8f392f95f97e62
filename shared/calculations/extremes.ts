/** The smallest of many numbers; a recorder's file is too long to hand to Math.min at once. Infinity for none. */
export const least = (numbers: readonly number[]): number =>
  numbers.reduce((low, each) => Math.min(low, each), Infinity);

/** The largest of many numbers; minus infinity for none. */
export const greatest = (numbers: readonly number[]): number =>
  numbers.reduce((high, each) => Math.max(high, each), -Infinity);
