import type { EntityManager } from 'typeorm';
import { DeskView } from '../entities/desk-view';
import { JobPersonView } from '../entities/job-person-view';
import { JobView } from '../entities/job-view';
import type { JobRows } from './job-rows';

/** Puts a job's rows in place of those before, in the transaction that moved the job. */
export async function writeProjections(manager: EntityManager, { job, people, desk }: JobRows): Promise<void> {
  const jobId = job.id;
  await manager.upsert(JobView, job, ['id']);
  await syncPeople(manager, jobId, people);
  if (desk) await manager.upsert(DeskView, desk, ['jobId']);
  else await manager.delete(DeskView, { jobId });
}

/** People change seldom: only what differs is touched, so that most commands write nothing here. */
async function syncPeople(manager: EntityManager, jobId: string, people: readonly JobPersonView[]): Promise<void> {
  const key = ({ accountId, role }: JobPersonView) => `${accountId} ${role}`;
  const before = await manager.findBy(JobPersonView, { jobId });
  const held = new Set(before.map(key));
  const wanted = new Set(people.map(key));
  for (const gone of before.filter((row) => !wanted.has(key(row)))) await manager.delete(JobPersonView, gone);
  const added = people.filter((row) => !held.has(key(row)));
  if (added.length > 0) await manager.insert(JobPersonView, added);
}
