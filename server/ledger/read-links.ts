import { MoreThan } from 'typeorm';
import type { EntityManager } from 'typeorm';
import type { ChainLink } from '../../shared/ledger/chain';
import { JobEventRow } from '../entities/job-event';

/** The links of a job's chain after a number, in the order of the chain, exactly as they are stored. */
export async function readLinks(manager: EntityManager, jobId: string, after = 0): Promise<ChainLink[]> {
  const rows = await manager.find(JobEventRow, { where: { jobId, seq: MoreThan(after) }, order: { seq: 'ASC' } });
  return rows.map(({ seq, commandId, type, schemaVersion, body, prevHash, hash }) => ({
    seq,
    commandId,
    type,
    schema: schemaVersion,
    body,
    prevHash,
    hash,
  }));
}
