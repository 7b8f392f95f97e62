import { z } from 'zod';
import { decimal } from './decimal';

/** What a job is held to beside its settings: from where its height is measured, how high, and how it is tested. */
export const termsOfJob = {
  datum: z.enum(['face', 'outlet', 'base']),
  targetHeightIn: decimal,
  standOffIn: decimal,
  test: z.strictObject({
    medium: z.enum(['hydraulic-oil', 'nitrogen']),
    pressurePsi: z.int().min(1).max(20_000),
    holdMin: z.int().min(1).max(1440),
    allowedDropPsi: z.int().min(0).max(5000),
  }),
};
