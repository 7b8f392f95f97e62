import type { JobSummary } from '../../shared/contracts/jobs';
import type { Actor } from '../../shared/permissions';
import { JobView } from '../entities/job-view';
import type { AppDeps } from './deps';
import { onJobsOf } from './on-jobs-of';
import { pageOfJobs } from './page-of-jobs';

/** Planned and running jobs that somebody is on, all of them for a coordinator, newest movement first. */
export async function listJobs(
  { dataSource }: AppDeps,
  actor: Actor,
  { after }: { after?: string | undefined },
): Promise<{ jobs: JobSummary[]; next: string | null }> {
  const query = dataSource
    .getRepository(JobView)
    .createQueryBuilder('job')
    .where('job.status IN (:...statuses)', { statuses: ['planned', 'running'] });
  if (!actor.roles.includes('coordinator')) query.andWhere(onJobsOf(actor));
  const { rows, next } = await pageOfJobs(query, 'movedAt', after);
  return { jobs: rows, next };
}
