import type { PointContext } from '../../shared/hold-points/context';
import { contextOf } from '../../shared/hold-points/context';
import type { PointKind, PointPlace } from '../../shared/hold-points/points';
import { sequenceOf } from '../../shared/hold-points/sequence';
import type { Times } from '../../shared/job/actor';
import { beginSetting } from '../../shared/job/begin-setting';
import type { JobPlan } from '../../shared/job/plan';
import type { ActRun, JobState, PointState, Reading } from '../../shared/job/state';
import { aPlan, helper, toolPusher, welder } from './a-plan';

/** When things happen in these tests unless they say otherwise. */
export const noon = '2026-09-14T12:00:00.000Z';

interface ReadingSpec {
  value: string | number;
  /** corrected time */
  at?: string;
  measuredBy?: { accountId: string | null; name: string };
  doubtMs?: number | null;
  late?: boolean;
}

/** A plain value, or a reading with its time and hand; a list is the field's history, the oldest first. */
export type ReadingSpecs = Record<string, string | number | ReadingSpec | ReadingSpec[]>;

interface ActSpec {
  act: string;
  begun: string;
  ended?: string;
}

interface PointSpec {
  kind: PointKind;
  /** 1 where it is a pass and nothing is said */
  pass?: number;
  round?: number;
  readings?: ReadingSpecs;
  acts?: ActSpec[];
}

interface StateSpec {
  plan?: JobPlan;
  site?: ReadingSpecs;
  /** points before it that something was read at */
  earlier?: PointSpec[];
  /** merged into the state last: direction, custody, headSet, ... */
  state?: Partial<JobState>;
}

const timesAt = (corrected: string, doubtMs: number | null = 500): Times => ({
  device: corrected,
  corrected,
  received: corrected,
  doubtMs,
});

/** The welder measures, the helper confirms, and somebody without an account settles it. */
const handOf = (field: string): Reading['measuredBy'] => {
  if (field.endsWith('.second')) return helper;
  return field.endsWith('.third') ? { accountId: null, name: 'P. Lind' } : welder;
};

const aReading = (point: string, field: string, index: number, spec: ReadingSpec): Reading => ({
  id: `${point}/${field}/${index}`,
  field,
  typed: String(spec.value),
  unit: null,
  value: String(spec.value),
  measuredBy: spec.measuredBy ?? handOf(field),
  typedBy: { ...welder, role: 'welder' },
  at: timesAt(spec.at ?? noon, spec.doubtMs === undefined ? 500 : spec.doubtMs),
  late: spec.late ?? false,
  struck: null,
});

const readingsOf = (point: string, specs: ReadingSpecs = {}): Record<string, Reading[]> =>
  Object.fromEntries(
    Object.entries(specs).map(([field, spec]) => {
      const history = Array.isArray(spec) ? spec : [typeof spec === 'object' ? spec : { value: spec }];
      return [field, history.map((one, index) => aReading(point, field, index, one))];
    }),
  );

const aRun = (point: string, index: number, { act, begun, ended }: ActSpec): ActRun => ({
  id: `${point}/act/${index}`,
  act,
  begun: { by: { ...welder, role: 'welder' }, at: timesAt(begun) },
  ended: ended === undefined ? null : { by: { ...welder, role: 'welder' }, at: timesAt(ended) },
  verdicts: [],
});

const aPointState = (place: PointPlace, status: PointState['status'], spec?: PointSpec): PointState => ({
  place,
  status,
  readings: readingsOf(place.id, spec?.readings),
  photos: [],
  acts: (spec?.acts ?? []).map((one, index) => aRun(place.id, index, one)),
  concessions: [],
  presentation: null,
  release: null,
  sentBack: [],
  withdrawn: [],
  reopened: [],
  superseded: [],
  carriedInto: null,
  openedAt: status === 'shut' ? null : timesAt(noon),
});

const isThe = (place: PointPlace, spec: PointSpec): boolean =>
  place.kind === spec.kind &&
  place.round === (spec.round ?? 0) &&
  place.pass === (spec.kind === 'pass-inspected' ? (spec.pass ?? 1) : null);

/**
 * The context of one point of an invented running job: points before it stand released, it is open, the rest shut.
 * @example aPointContext({ kind: 'final-cut', readings: { 'cut.12': '8' }, earlier: [{ kind: 'height-takeoff', readings: {} }] })
 */
export const aPointContext = (spec: PointSpec & StateSpec): PointContext => {
  const plan = spec.plan ?? aPlan();
  const rounds = Array.from({ length: spec.round ?? 0 }, (_, index) => ({ round: index + 1, passes: 2 }));
  const places = sequenceOf(plan.procedure.passes.length, rounds);
  const here = places.findIndex((place) => isThe(place, spec));
  if (here < 0) throw new Error(`this job has no such point: ${spec.kind} ${spec.pass ?? ''} round ${spec.round ?? 0}`);
  const points = places.map((place, index) =>
    aPointState(
      place,
      index < here ? 'released' : index === here ? 'open' : 'shut',
      index === here ? spec : spec.earlier?.find((one) => isThe(place, one)),
    ),
  );
  const state: JobState = {
    id: '7f9c2f1e-11aa-4c6e-9a51-6a0c9a3f2001',
    status: 'running',
    plan,
    definitions: 1,
    setting: 1,
    ...beginSetting(plan, timesAt(noon)),
    rounds,
    points,
    site: readingsOf('site', spec.site),
    earlierSettings: [],
    direction: { direction: 'mud-tanks', words: null, by: { ...toolPusher, role: 'tool_pusher' }, at: timesAt(noon) },
    proposedDirection: plan.proposedDirection,
    stopped: null,
    handovers: [],
    termsChanges: [],
    people: plan.people,
    ended: null,
    eventCount: 1,
    lastAt: timesAt(noon),
    ...spec.state,
  };
  const point = state.points[here];
  if (!point) throw new Error('the point went missing');
  return contextOf(state, point);
};
