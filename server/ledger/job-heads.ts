import type { EntityManager } from 'typeorm';
import { chainStart } from '../../shared/ledger/chain';
import { JobHead } from '../entities/job-head';
import { sha256 } from './sha256';

/** Locks a job's head until the transaction ends, before anything of the job is read; null when there is no such job. */
export const lockHead = (manager: EntityManager, jobId: string): Promise<JobHead | null> =>
  manager.findOne(JobHead, { where: { jobId }, lock: { mode: 'pessimistic_write' } });

/** Begins the chain of a new job. */
export async function beginHead(manager: EntityManager, jobId: string, createdAt: Date): Promise<JobHead> {
  const head = { jobId, seq: 0, hash: chainStart(jobId, sha256), createdAt };
  await manager.insert(JobHead, head);
  return head;
}
