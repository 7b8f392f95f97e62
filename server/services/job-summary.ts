import type { JobSummary } from '../../shared/contracts/jobs';
import type { JobView } from '../entities/job-view';

/** A job's row as it travels. */
export function jobSummary(row: JobView): JobSummary {
  const { id, operator, rig, well, zone, casing, head, hot, stopped, concessions, reopenings, seq } = row;
  return {
    ...{ id, operator, rig, well, zone, casing, head, hot, stopped, concessions, reopenings, seq },
    status: row.status as JobSummary['status'],
    current: row.point === null ? null : { point: row.point, status: row.pointStatus as 'open' },
    strip: JSON.parse(row.strip) as JobSummary['strip'],
    waitsFor: row.waitsFor as JobSummary['waitsFor'],
    plannedAt: row.plannedAt.toISOString(),
    movedAt: row.movedAt.toISOString(),
    endedAt: row.endedAt?.toISOString() ?? null,
  };
}
