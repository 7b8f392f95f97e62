import { printQuantity } from '../../shared/units/format';

/** A list's casing as the tape reads it: `9.625 in 40 lb/ft J55` is said as `9 5/8 in 40 lb/ft J55`. */
export const casingWords = (casing: string): string =>
  casing.replace(/^(\d+(?:\.\d+)?) in /, (_whole, size: string) => `${printQuantity(size, 'in', 'imperial')} `);
