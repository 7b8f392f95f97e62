import type { DeskEntry } from '../../shared/contracts/desk';
import type { Actor, Role } from '../../shared/permissions';
import type { AppDeps } from './deps';

interface Row {
  job_id: string;
  operator: string;
  rig: string;
  well: string;
  zone: string;
  stopped: number;
  strip: string;
  point: string;
  owner_role: Role;
  presented_at: Date;
  presented_by: string;
  hot: number;
  outside: string | number;
  unconceded: string | number;
  owns: string | number;
}

/** A desk with more than this on it is worked off from the top. */
const atMost = 200;

/**
 * What waits for somebody's signature: points that he owns, and as a company representative those of the tool pusher
 * that can't be released before he concedes. Hot joints first, then the oldest.
 */
export async function listDesk({ dataSource }: AppDeps, actor: Actor): Promise<DeskEntry[]> {
  const rows = await dataSource.query<Row[]>(
    `SELECT d.job_id, j.operator, j.rig, j.well, j.zone, j.stopped, j.strip, d.point, d.owner_role, d.presented_at, d.presented_by,
            d.hot, d.outside, d.unconceded,
            EXISTS (SELECT 1 FROM job_people_view o
                     WHERE o.job_id = d.job_id AND o.account_id = ? AND o.role IN (?) AND o.role = d.owner_role) AS owns
       FROM desk_view d
       JOIN jobs_view j ON j.id = d.job_id
      WHERE EXISTS (SELECT 1 FROM job_people_view p
                     WHERE p.job_id = d.job_id AND p.account_id = ? AND p.role IN (?)
                       AND (p.role = d.owner_role OR (p.role = 'company_rep' AND d.unconceded > 0)))
      ORDER BY d.hot DESC, d.presented_at, d.job_id
      LIMIT ?`,
    [actor.accountId, actor.roles, actor.accountId, actor.roles, atMost],
  );
  return rows.map((row) => ({
    jobId: row.job_id,
    operator: row.operator,
    rig: row.rig,
    well: row.well,
    zone: row.zone,
    point: row.point,
    ownerRole: row.owner_role,
    presentedAt: row.presented_at.toISOString(),
    presentedBy: row.presented_by,
    strip: JSON.parse(row.strip) as DeskEntry['strip'],
    hot: Number(row.hot) === 1,
    stopped: Number(row.stopped) === 1,
    outside: Number(row.outside),
    unconceded: Number(row.unconceded),
    turn: Number(row.owns) === 1 ? 'release' : 'concede',
  }));
}
