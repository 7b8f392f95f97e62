import type { DeskEntry } from '../../shared/contracts/desk';
import type { JobSummary } from '../../shared/contracts/jobs';
import { sequenceOf } from '../../shared/hold-points/sequence';

const strip = (at: number): JobSummary['strip'] =>
  sequenceOf(4, []).map(({ id }, place) => ({
    id,
    status: place < at ? 'released' : place === at ? 'presented' : 'shut',
  }));

/** The invented job in a list, its final cut presented. */
export const aSummary = (own: Partial<JobSummary> = {}): JobSummary => ({
  id: '0190a000-0000-7000-8000-000000000001',
  operator: 'Marrow Creek Resources',
  rig: 'Pronghorn 7',
  well: 'Tallgrass 14-2H',
  zone: 'America/Chicago',
  casing: '9 5/8 in 40 lb/ft J55',
  head: 'HD-11-3M',
  status: 'running',
  current: { point: 'final-cut', status: 'presented' },
  strip: strip(2),
  waitsFor: 'company_rep',
  hot: false,
  stopped: false,
  concessions: 0,
  reopenings: 0,
  plannedAt: '2026-09-14T01:00:00.000Z',
  movedAt: '2026-09-14T06:00:00.000Z',
  endedAt: null,
  seq: 40,
  ...own,
});

/** The same on a desk. */
export const aDeskEntry = (own: Partial<DeskEntry> = {}): DeskEntry => ({
  jobId: '0190a000-0000-7000-8000-000000000001',
  operator: 'Marrow Creek Resources',
  rig: 'Pronghorn 7',
  well: 'Tallgrass 14-2H',
  zone: 'America/Chicago',
  point: 'final-cut',
  ownerRole: 'company_rep',
  presentedAt: '2026-09-14T06:00:00.000Z',
  presentedBy: 'W. Calder',
  strip: strip(2),
  hot: false,
  stopped: false,
  outside: 0,
  unconceded: 0,
  turn: 'release',
  ...own,
});
