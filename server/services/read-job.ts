import type { JobEvents, JobSummary } from '../../shared/contracts/jobs';
import { rolesOnJob } from '../../shared/permissions';
import type { Actor, Role } from '../../shared/permissions';
import { JobHead } from '../entities/job-head';
import { JobView } from '../entities/job-view';
import { readLinks } from '../ledger/read-links';
import { toWire } from './command-answer';
import type { AppDeps } from './deps';
import { findJobScope } from './find-job-scope';
import { jobSummary } from './job-summary';

/** Where a job stands, and what its reader is on it; null when there is no such job. */
export async function readJob(
  { dataSource }: AppDeps,
  actor: Actor,
  jobId: string,
): Promise<{ job: JobSummary; roles: Role[] } | null> {
  const row = await dataSource.getRepository(JobView).findOneBy({ id: jobId });
  const scope = await findJobScope(dataSource, jobId);
  return row && scope ? { job: jobSummary(row), roles: rolesOnJob(actor, scope) } : null;
}

/** A job's events after a number. The head is read first: events that arrive meanwhile come on top, never short. */
export async function readJobEvents({ dataSource }: AppDeps, jobId: string, after: number): Promise<JobEvents | null> {
  const head = await dataSource.getRepository(JobHead).findOneBy({ jobId });
  if (!head) return null;
  const links = await readLinks(dataSource.manager, jobId, after);
  const end = links.at(-1);
  return {
    events: links.map(toWire),
    head: end && end.seq > head.seq ? { seq: end.seq, hash: end.hash } : { seq: head.seq, hash: head.hash },
  };
}
