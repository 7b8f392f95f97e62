import { MoreThan } from 'typeorm';
import type { DataSource } from 'typeorm';
import { DeskView } from '../entities/desk-view';
import { JobHead } from '../entities/job-head';
import { JobPersonView } from '../entities/job-person-view';
import { JobView } from '../entities/job-view';
import { lockHead } from '../ledger/job-heads';
import { jobRows } from '../ledger/job-rows';
import { readLinks } from '../ledger/read-links';
import { inTransaction } from '../ledger/transaction';
import { upcast } from '../ledger/upcast';
import { writeProjections } from '../ledger/write-projections';

const batch = 200;

/**
 * Makes every projection again from the events, job by job under its lock, while the server may go on working: each
 * job's rows are thrown away and written in one transaction.
 * @returns how many jobs were read
 */
export async function rebuildProjections(dataSource: DataSource): Promise<number> {
  await dropOrphans(dataSource);
  let done = 0;
  for (let last = ''; ;) {
    const heads = await dataSource
      .getRepository(JobHead)
      .find({ where: { jobId: MoreThan(last) }, order: { jobId: 'ASC' }, take: batch });
    for (const { jobId } of heads) await rebuildJob(dataSource, jobId);
    done += heads.length;
    const end = heads.at(-1);
    if (!end) return done;
    last = end.jobId;
  }
}

function rebuildJob(dataSource: DataSource, jobId: string): Promise<void> {
  return inTransaction(dataSource, async (manager) => {
    await lockHead(manager, jobId);
    const events = (await readLinks(manager, jobId)).map(upcast);
    await manager.delete(DeskView, { jobId });
    await manager.delete(JobPersonView, { jobId });
    await manager.delete(JobView, { id: jobId });
    await writeProjections(manager, jobRows(jobId, events));
  });
}

/** Rows of jobs that have no chain came from nowhere. */
async function dropOrphans(dataSource: DataSource): Promise<void> {
  for (const [table, column] of [
    ['jobs_view', 'id'],
    ['job_people_view', 'job_id'],
    ['desk_view', 'job_id'],
  ] as const) {
    await dataSource.query(`DELETE FROM ${table} WHERE ${column} NOT IN (SELECT job_id FROM job_heads)`);
  }
}
