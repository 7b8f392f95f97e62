import { z } from 'zod';
import { roles } from '../permissions/roles';
import { jobPlanSchema } from './commands';
import { defineRoute } from './contract';

/** A person who can be put on a job, with every role of the account and the processes a welder may use. */
const personSchema = z.strictObject({
  accountId: z.uuid(),
  name: z.string(),
  roles: z.array(z.enum(roles)),
  qualifications: jobPlanSchema.shape.people.element.shape.qualifications,
});

/** What a new job is made from. Casing rows are data of the program and are not sent. */
export const catalogueSchema = z.strictObject({
  operators: z.array(
    z.strictObject({
      id: z.uuid(),
      name: z.string(),
      rigs: z.array(z.strictObject({ id: z.uuid(), name: z.string(), zone: z.string() })),
    }),
  ),
  heads: z.array(jobPlanSchema.shape.head),
  procedures: z.array(jobPlanSchema.shape.procedure),
  instruments: z.array(jobPlanSchema.shape.instruments.element),
  people: z.array(personSchema),
});
export type Catalogue = z.infer<typeof catalogueSchema>;

export const readCatalogue = defineRoute({
  method: 'get',
  path: '/api/catalogue',
  permission: 'catalogue.read',
  response: catalogueSchema,
  summary: 'Operators with rigs, heads, procedures, instruments and people for a new job',
});

/** Heads alone, for who sets one again: people, procedures and instruments are the firm's own and no guest's. */
export const readHeads = defineRoute({
  method: 'get',
  path: '/api/heads',
  permission: 'heads.read',
  response: z.strictObject({ heads: catalogueSchema.shape.heads }),
  summary: 'The casing heads in use, for a head that is set again',
});

export const catalogueRoutes = [readCatalogue, readHeads];
