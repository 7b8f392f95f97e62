import { MoreThan } from 'typeorm';
import type { Device } from '../../shared/contracts/session';
import { SessionRow } from '../entities/session-row';
import type { AppDeps } from './deps';

/** The devices on which somebody is signed in, the one last used first. */
export async function listDevices(deps: AppDeps, accountId: string, current: string | undefined): Promise<Device[]> {
  const { idleMs, longestMs } = deps.config.session;
  const now = deps.clock().getTime();
  const rows = await deps.dataSource.getRepository(SessionRow).find({
    where: { accountId, seenAt: MoreThan(new Date(now - idleMs)), createdAt: MoreThan(new Date(now - longestMs)) },
    order: { seenAt: 'DESC' },
    take: 100,
  });
  return rows.map((row) => ({
    id: row.handle,
    userAgent: row.userAgent,
    createdAt: row.createdAt.toISOString(),
    seenAt: row.seenAt.toISOString(),
    current: row.handle === current,
  }));
}
