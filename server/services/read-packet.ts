import type { JobSummary } from '../../shared/contracts/jobs';
import type { Verification } from '../../shared/contracts/packets';
import { verifyChain } from '../../shared/ledger/chain';
import { rolesOnJob } from '../../shared/permissions';
import type { Actor, Role } from '../../shared/permissions';
import { JobHead } from '../entities/job-head';
import { JobView } from '../entities/job-view';
import { readLinks } from '../ledger/read-links';
import { sha256 } from '../ledger/sha256';
import type { AppDeps } from './deps';
import { findPacketScope } from './find-job-scope';
import { jobSummary } from './job-summary';

/** Recomputes a job's chain from its start to the end that its head promises. */
export async function verifyJob({ dataSource }: Pick<AppDeps, 'dataSource'>, jobId: string): Promise<Verification> {
  const head = await dataSource.getRepository(JobHead).findOneBy({ jobId });
  const links = await readLinks(dataSource.manager, jobId);
  const verdict = verifyChain(jobId, links, sha256);
  if (!verdict.holds) return verdict;
  if (!head || head.seq > verdict.links) return { holds: false, seq: verdict.links + 1, why: 'cut-short' };
  return head.hash === verdict.head ? verdict : { holds: false, seq: verdict.links, why: 'hash' };
}

/** One packet, with its chain recomputed now; null when there is no such packet. */
export async function readPacket(
  deps: AppDeps,
  actor: Actor,
  jobId: string,
): Promise<{ packet: JobSummary; roles: Role[]; verification: Verification } | null> {
  const row = await deps.dataSource.getRepository(JobView).findOneBy({ id: jobId });
  const scope = await findPacketScope(deps.dataSource, jobId);
  if (!row || !scope) return null;
  return { packet: jobSummary(row), roles: rolesOnJob(actor, scope), verification: await verifyJob(deps, jobId) };
}
