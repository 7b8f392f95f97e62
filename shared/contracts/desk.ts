import { z } from 'zod';
import { roles } from '../permissions/roles';
import { defineRoute } from './contract';
import { jobSummarySchema } from './jobs';

/** A presented hold point that waits for its owner. */
export const deskEntrySchema = z.strictObject({
  jobId: z.uuid(),
  operator: z.string(),
  rig: z.string(),
  well: z.string(),
  zone: z.string(),
  point: z.string(),
  ownerRole: z.enum(roles),
  presentedAt: z.iso.datetime(),
  presentedBy: z.string(),
  /** every hold point that counts, in order */
  strip: jobSummarySchema.shape.strip,
  /** the joint is under heat */
  hot: z.boolean(),
  stopped: z.boolean(),
  /** readings outside a limit, and those of them that nobody has conceded yet */
  outside: z.int(),
  unconceded: z.int(),
  /** `release`: the reader owns the point; `concede`: the owner waits for the reader's concession */
  turn: z.enum(['release', 'concede']),
});
export type DeskEntry = z.infer<typeof deskEntrySchema>;

export const readDesk = defineRoute({
  method: 'get',
  path: '/api/desk',
  permission: 'desk.read',
  response: z.strictObject({ entries: z.array(deskEntrySchema) }),
  summary: "What waits for the reader's signature over all jobs: hot joints first, then the oldest",
});

export const deskRoutes = [readDesk];
