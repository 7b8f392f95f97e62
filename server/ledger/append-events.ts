import type { EntityManager } from 'typeorm';
import type { JobEvent } from '../../shared/job/events';
import { makeLink } from '../../shared/ledger/chain';
import type { ChainLink } from '../../shared/ledger/chain';
import { JobEventRow } from '../entities/job-event';
import { JobHead } from '../entities/job-head';
import { refuseFloats } from './refuse-floats';
import { sha256 } from './sha256';

/**
 * Adds events at the end of a job's chain and moves its head along. The only code that inserts events; the head's row
 * must be locked by this transaction.
 */
export async function appendEvents(
  manager: EntityManager,
  head: JobHead,
  commandId: string,
  events: readonly JobEvent[],
): Promise<ChainLink[]> {
  const links: ChainLink[] = [];
  for (const { type, schema, body } of events) {
    refuseFloats(body);
    const last = links.at(-1) ?? head;
    links.push(makeLink(head.jobId, { seq: last.seq + 1, commandId, type, schema, body }, last.hash, sha256));
  }
  const end = links.at(-1);
  if (!end) throw new Error('an accepted command leaves at least one event');
  await manager.insert(
    JobEventRow,
    links.map(({ schema, ...link }) => ({ jobId: head.jobId, ...link, schemaVersion: schema })),
  );
  await manager.update(JobHead, { jobId: head.jobId }, { seq: end.seq, hash: end.hash });
  return links;
}
