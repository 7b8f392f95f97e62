import { Brackets } from 'typeorm';
import type { SelectQueryBuilder } from 'typeorm';
import type { JobSummary } from '../../shared/contracts/jobs';
import type { JobView } from '../entities/job-view';
import { jobSummary } from './job-summary';
import { printPageKey, readPageKey } from './page-key';

const pageSize = 50;

/**
 * One page of jobs, newest first, by keyset: the page after the eighty-thousandth row costs what the first one does.
 * @param by the time that orders the list; the index must end in it and the id
 */
export async function pageOfJobs(
  query: SelectQueryBuilder<JobView>,
  by: 'movedAt' | 'endedAt',
  after: string | undefined,
): Promise<{ rows: JobSummary[]; next: string | null }> {
  const key = readPageKey(after);
  if (key) {
    query
      .andWhere(`job.${by} <= :at`, { at: key.at })
      .andWhere(new Brackets((or) => or.where(`job.${by} < :at`).orWhere('job.id < :id', { id: key.id })));
  }
  query
    .orderBy(`job.${by}`, 'DESC')
    .addOrderBy('job.id', 'DESC')
    .limit(pageSize + 1);
  const found = await query.getMany();
  const page = found.slice(0, pageSize);
  const last = page.at(-1);
  const at = last?.[by];
  return {
    rows: page.map(jobSummary),
    next: found.length > pageSize && last && at ? printPageKey({ at, id: last.id }) : null,
  };
}
