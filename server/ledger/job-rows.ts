import { concessionTotal } from '../../shared/job/decide-failure';
import type { JobEvent } from '../../shared/job/events';
import { foldEvents } from '../../shared/job/evolve';
import { counts, currentPoint } from '../../shared/job/points';
import { reviewPoint } from '../../shared/job/review';
import type { JobState, PointState } from '../../shared/job/state';
import { ownerOf } from '../../shared/hold-points/points';
import type { Role } from '../../shared/permissions';
import type { DeskView } from '../entities/desk-view';
import type { JobPersonView } from '../entities/job-person-view';
import type { JobView } from '../entities/job-view';

/** What the lists hold about one job. */
export interface JobRows {
  job: JobView;
  people: JobPersonView[];
  desk: DeskView | null;
}

const receivedAt = (event: JobEvent): Date => new Date(event.body.at.received ?? event.body.at.corrected);

/** From preheat on until the last pass is released the joint must not wait. */
const isHot = (point: PointState): boolean =>
  point.place.kind === 'pass-inspected' || (point.place.kind === 'preheat-reached' && point.status === 'presented');

function deskOf(state: JobState, point: PointState | undefined): DeskView | null {
  if (state.ended || point?.status !== 'presented' || !point.presentation) return null;
  const review = reviewPoint(state, point);
  return {
    jobId: state.id,
    point: point.place.id,
    ownerRole: ownerOf[point.place.kind],
    presentedAt: new Date(point.presentation.at.corrected),
    presentedBy: point.presentation.by.name,
    hot: isHot(point),
    outside: review.holds.length + review.stops.length,
    unconceded: review.unconceded.length,
  };
}

/** Whose turn it is: a tool pusher's point with something to concede waits for the company representative first. */
function waitsFor(state: JobState, point: PointState | undefined, desk: DeskView | null): Role | null {
  if (state.ended) return null;
  if (state.stopped || !point) return 'company_rep';
  if (!desk) return 'welder';
  return desk.unconceded > 0 ? 'company_rep' : ownerOf[point.place.kind];
}

const inchesOf = (text: string): string => `${text} in`;

/** Reads a job's lists from its events, and from nothing else: the same events make the same rows at any time. */
export function jobRows(jobId: string, events: readonly JobEvent[]): JobRows {
  const state = foldEvents(jobId, events);
  const [first, last] = [events[0], events.at(-1)];
  if (!state || !first || !last) throw new Error('a job without events has no rows');
  const { operator, rig, well, zone, casing, head } = state.plan;
  const point = state.ended ? undefined : currentPoint(state);
  const desk = deskOf(state, point);
  const casingText = `${inchesOf(casing.odIn)} ${casing.weightLbFt} lb/ft ${casing.grade}`;
  const strip = state.points.filter(counts).map(({ place, status }) => ({ id: place.id, status }));
  return {
    job: {
      id: jobId,
      operatorId: operator.id,
      operator: operator.name,
      rig: rig.name,
      well,
      zone,
      casing: casingText,
      head: head.name,
      status: state.status,
      point: point?.place.id ?? null,
      pointStatus: point?.status ?? null,
      strip: JSON.stringify(strip),
      waitsFor: waitsFor(state, point, desk),
      hot: point !== undefined && isHot(point),
      stopped: state.stopped !== null,
      concessions: concessionTotal(state),
      reopenings: events.filter((event) => event.type === 'point-reopened').length,
      plannedAt: receivedAt(first),
      movedAt: receivedAt(last),
      endedAt: state.ended ? receivedAt(last) : null,
      seq: events.length,
      search: [operator.name, rig.name, well, casingText].join(' · '),
    },
    people: uniquePeople(state),
    desk,
  };
}

function uniquePeople(state: JobState): JobPersonView[] {
  const rows = state.people.map(({ accountId, role }) => ({ jobId: state.id, accountId, role }));
  return [...new Map(rows.map((row) => [`${row.accountId} ${row.role}`, row])).values()];
}
