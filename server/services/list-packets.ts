import { Brackets } from 'typeorm';
import type { JobSummary } from '../../shared/contracts/jobs';
import type { Actor } from '../../shared/permissions';
import { JobView } from '../entities/job-view';
import type { AppDeps } from './deps';
import { onJobsOf } from './on-jobs-of';
import { pageOfJobs } from './page-of-jobs';

/** Every word must be found; the signs that LIKE takes for its own are meant as they are typed. */
const wordsOf = (q: string | undefined): string[] =>
  (q ?? '')
    .split(/\s+/)
    .filter((word) => word !== '')
    .slice(0, 8)
    .map((word) => `%${word.replace(/[\\%_]/g, '\\$&')}%`);

/** Sealed and called-off jobs that somebody may read, newest first. */
export async function listPackets(
  { dataSource }: AppDeps,
  actor: Actor,
  { q, after }: { q?: string | undefined; after?: string | undefined },
): Promise<{ packets: JobSummary[]; next: string | null }> {
  const query = dataSource.getRepository(JobView).createQueryBuilder('job').where('job.endedAt IS NOT NULL');
  if (!actor.roles.includes('coordinator')) {
    const granted = actor.roles.includes('auditor') ? actor.operatorIds : [];
    query.andWhere(
      new Brackets((or) => {
        or.where(onJobsOf(actor));
        if (granted.length > 0) or.orWhere('job.operatorId IN (:...granted)', { granted });
      }),
    );
  }
  wordsOf(q).forEach((word, index) => query.andWhere(`job.search LIKE :word${index}`, { [`word${index}`]: word }));
  const { rows, next } = await pageOfJobs(query, 'endedAt', after);
  return { packets: rows, next };
}
