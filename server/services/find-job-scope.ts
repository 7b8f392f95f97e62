import type { DataSource } from 'typeorm';
import type { JobScope, Role } from '../../shared/permissions';
import { JobPersonView } from '../entities/job-person-view';
import { JobView } from '../entities/job-view';

/** What must be known of a job to say who may do what on it; null when there is no such job. */
export async function findJobScope(dataSource: DataSource, jobId: string): Promise<JobScope | null> {
  const job = await dataSource.getRepository(JobView).findOne({
    select: { id: true, operatorId: true, status: true },
    where: { id: jobId },
  });
  if (!job) return null;
  const people = await dataSource.getRepository(JobPersonView).findBy({ jobId });
  return {
    operatorId: job.operatorId,
    status: job.status as JobScope['status'],
    people: people.map(({ accountId, role }) => ({ accountId, role: role as Role })),
  };
}

/** The same of a packet: a job that is neither sealed nor called off is none. */
export async function findPacketScope(dataSource: DataSource, jobId: string): Promise<JobScope | null> {
  const scope = await findJobScope(dataSource, jobId);
  return scope && (scope.status === 'sealed' || scope.status === 'called-off') ? scope : null;
}
