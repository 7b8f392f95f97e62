import type { WireEvent } from '../../shared/contracts/jobs';
import type { TestJob } from './a-job';
import { chainOf } from './a-sealed-job';

/** A packet's summary as the list has it. */
export const summaryOf = (job: TestJob) => ({
  id: job.id,
  operator: job.plan.operator.name,
  rig: job.plan.rig.name,
  well: job.plan.well,
  zone: job.plan.zone,
  casing: '9-5/8 in, 40 lb/ft J55',
  head: '11 in 3000 psi',
  status: job.job.status,
  current: null,
  strip: job.job.points
    .filter((one) => one.carriedInto === null)
    .map(({ place, status }) => ({ id: place.id, status })),
  waitsFor: null,
  hot: false,
  stopped: false,
  concessions: 2,
  reopenings: 1,
  plannedAt: '2026-09-14T06:00:00.000Z',
  movedAt: job.job.lastAt.corrected,
  endedAt: job.job.ended?.at.corrected ?? null,
  seq: job.events.length,
});

/** Its events as they travel. */
export const wireOf = (job: TestJob): WireEvent[] =>
  chainOf(job).map((link) => ({ ...link, body: JSON.parse(link.body) as Record<string, unknown> }));

type Change = (events: WireEvent[]) => WireEvent[];

/** A server that has this one packet: it answers the three questions of the page. `change` meddles with what it sends. */
export const packetServer = (job: TestJob, change: Change = (events) => events) => {
  const whole = wireOf(job);
  const last = whole.at(-1);
  const head = { seq: last?.seq ?? 0, hash: last?.hash ?? '' };
  return (address: string): Response => {
    const url = new URL(address, 'http://headfast.test');
    if (url.pathname === '/api/packets') {
      const found = 'tallgrass'.includes(url.searchParams.get('q') ?? '');
      const next = url.searchParams.get('after') === null ? 'page-2' : null;
      return Response.json(found ? { packets: [summaryOf(job)], next } : { packets: [], next: null });
    }
    if (url.pathname.endsWith('/events')) {
      const after = Number(url.searchParams.get('after'));
      return Response.json({ events: change(whole).slice(after, after + 100), head });
    }
    return Response.json({
      packet: summaryOf(job),
      roles: ['auditor'],
      verification: { holds: true, links: head.seq, head: head.hash },
    });
  };
};
