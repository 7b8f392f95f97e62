import { z } from 'zod';

/** A number as it travels and is hashed: its decimal digits, never a float. */
export const decimal = z.string().regex(/^-?\d{1,9}(\.\d{1,9})?$/);
