import type { readCatalogue } from '../../shared/contracts/catalogue';
import type { ResponseOf } from '../../shared/contracts/contract';
import type { readDesk } from '../../shared/contracts/desk';
import type { JobSummary, listJobs, Planning, planJob } from '../../shared/contracts/jobs';
import { ask } from './client';

export type { JobSummary, Planning };
export type { DeskEntry } from '../../shared/contracts/desk';
export type { Catalogue } from '../../shared/contracts/catalogue';

/** The doors of the lists, of planning and of the desk. `after` is the page's key as the list before gave it. */
export const askJobs = (after?: string) => ask<ResponseOf<typeof listJobs>>('GET', '/api/jobs', { query: { after } });
export const askPlan = (body: Planning) => ask<ResponseOf<typeof planJob>>('POST', '/api/jobs', { body });
export const askDesk = () => ask<ResponseOf<typeof readDesk>>('GET', '/api/desk');
export const askCatalogue = () => ask<ResponseOf<typeof readCatalogue>>('GET', '/api/catalogue');
