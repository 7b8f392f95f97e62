import { z } from 'zod';
import { settingNames } from '../job/plan';
import { roles } from '../permissions/roles';
import { commandSchema } from './commands';
import { defineRoute } from './contract';
import { decimal } from './decimal';
import { termsOfJob } from './terms';
import { uuid } from './uuid';

/** A job's id as it stands in addresses. */
export const jobAddress = z.strictObject({ id: uuid });

const pointStatus = z.enum(['shut', 'open', 'presented', 'released']);

/** A job in a list: where it stands and whose turn it is. */
export const jobSummarySchema = z.strictObject({
  id: z.uuid(),
  operator: z.string(),
  rig: z.string(),
  well: z.string(),
  /** IANA zone of the site */
  zone: z.string(),
  /** size, weight and grade as the table prints them */
  casing: z.string(),
  head: z.string(),
  status: z.enum(['planned', 'running', 'sealed', 'called-off']),
  /** the hold point that is open or presented; null when all are released and when the job has ended */
  current: z.strictObject({ point: z.string(), status: pointStatus }).nullable(),
  /** every hold point that counts, in order */
  strip: z.array(z.strictObject({ id: z.string(), status: pointStatus })),
  waitsFor: z.enum(roles).nullable(),
  hot: z.boolean(),
  stopped: z.boolean(),
  concessions: z.int(),
  reopenings: z.int(),
  plannedAt: z.iso.datetime(),
  movedAt: z.iso.datetime(),
  endedAt: z.iso.datetime().nullable(),
  /** number of the last event */
  seq: z.int(),
});
export type JobSummary = z.infer<typeof jobSummarySchema>;

/** One link of the chain. Its body's canonical JSON is what was hashed. */
export const wireEventSchema = z.strictObject({
  seq: z.int().positive(),
  commandId: z.uuid(),
  type: z.string(),
  schema: z.int().positive(),
  body: z.record(z.string(), z.unknown()),
  prevHash: z.string(),
  hash: z.string(),
});
export type WireEvent = z.infer<typeof wireEventSchema>;

/** Events after a number, and where the chain ends now. */
export const eventsSchema = z.strictObject({
  events: z.array(wireEventSchema),
  head: z.strictObject({ seq: z.int(), hash: z.string() }),
});
export type JobEvents = z.infer<typeof eventsSchema>;
export const eventsQuery = z.strictObject({ after: z.coerce.number().int().min(0).max(1_000_000).default(0) });

/** Where a list goes on: as `next` gave it, never put together by hand. */
export const pageAfter = z
  .string()
  .regex(/^[0-9a-z]{1,9}\.[0-9a-f-]{36}$/)
  .optional();

const short = z.string().trim().min(1).max(200);

/** A row of the casing table by its three names, or one of the coordinator's own. */
const casingChoice = z.union([
  z.strictObject({ odIn: decimal, weightLbFt: decimal, grade: short }),
  z.strictObject({
    odIn: decimal,
    weightLbFt: decimal,
    wallIn: decimal,
    grade: short,
    collapsePsi: z.int().positive().max(100_000),
    internalYieldPsi: z.int().positive().max(100_000),
    source: short,
  }),
]);

/** What a coordinator asks for. Head, procedure, instruments and people are named; the server fills them from its tables. */
export const planningSchema = z.strictObject({
  commandId: uuid,
  clock: commandSchema.options[0].shape.clock,
  operatorId: uuid,
  rigId: uuid,
  well: short,
  zone: z.string().min(1).max(64),
  casing: casingChoice,
  headId: uuid,
  procedureId: uuid,
  instrumentIds: z.array(uuid).max(40),
  people: z
    .array(z.strictObject({ accountId: uuid, role: z.enum(roles) }))
    .min(1)
    .max(40),
  terms: z.strictObject({
    ...termsOfJob,
    /** settings that the operator's programme replaces; the others are common practice */
    ownSettings: z.partialRecord(z.enum(settingNames), decimal),
  }),
  proposedDirection: short.nullable(),
  rateCardId: z.null(),
});
export type Planning = z.infer<typeof planningSchema>;

/** Secrets of a signature. They are kept nowhere and are in no hash. */
const signing = z.strictObject({ pin: z.string().min(1).max(64), password: z.string().min(1).max(1000).optional() });

export const listJobs = defineRoute({
  method: 'get',
  path: '/api/jobs',
  permission: 'job.list',
  query: z.strictObject({ after: pageAfter }),
  response: z.strictObject({ jobs: z.array(jobSummarySchema), next: z.string().nullable() }),
  summary: 'Planned and running jobs that the reader is on, newest movement first',
});

export const planJob = defineRoute({
  method: 'post',
  path: '/api/jobs',
  permission: 'job.plan',
  request: planningSchema,
  response: z.strictObject({ id: z.uuid(), seq: z.int(), replayed: z.boolean() }),
  status: 201,
  summary: 'Plan a job; sent again it answers with the same job',
});

export const readJob = defineRoute({
  method: 'get',
  path: '/api/jobs/{id}',
  permission: 'job.read',
  params: jobAddress,
  response: z.strictObject({ job: jobSummarySchema, roles: z.array(z.enum(roles)) }),
  summary: 'Where a job stands, and the roles that the reader has on it',
});

export const readJobEvents = defineRoute({
  method: 'get',
  path: '/api/jobs/{id}/events',
  permission: 'job.read',
  params: jobAddress,
  query: eventsQuery,
  response: eventsSchema,
  summary: "A job's events after a number",
});

export const sendCommand = defineRoute({
  method: 'post',
  path: '/api/jobs/{id}/commands',
  permission: 'signed-in',
  params: jobAddress,
  request: z.strictObject({ command: commandSchema, signing: signing.optional() }),
  response: z.strictObject({ events: z.array(wireEventSchema), seq: z.int(), replayed: z.boolean() }),
  summary: "Give a command; a signature's secrets travel beside it",
});

export const jobRoutes = [listJobs, planJob, readJob, readJobEvents, sendCommand];
