import { sequenceOf } from '../hold-points/sequence';
import { beginSetting } from './begin-setting';
import type { JobEvent, JobEventOf } from './events';
import { blankPoint, changePoint, counts, hasEvidence, noEvidence, openNext } from './points';
import type { Evidence, JobState, PointState } from './state';

const evidenceOf = ({ readings, photos, acts, concessions, presentation, release }: PointState): Evidence => ({
  readings,
  photos,
  acts,
  concessions,
  presentation,
  release,
});

/** Shuts a point and keeps what was recorded at it as superseded. */
const supersede = (point: PointState): PointState =>
  hasEvidence(point) || point.release
    ? {
        ...point,
        ...noEvidence(),
        status: 'shut',
        openedAt: null,
        superseded: [...point.superseded, evidenceOf(point)],
      }
    : { ...point, ...noEvidence(), status: 'shut', openedAt: null };

const released = (state: JobState, event: JobEventOf<'point-released'>): JobState => {
  const { point, readings, photos, statements, judged, signature, actor, at } = event.body;
  const release = { by: actor, at, readings, photos, statements, judged, signature };
  const next = changePoint(state, point, (one) => ({ ...one, status: 'released', release }));
  return { ...next, points: openNext(next.points, at) };
};

/** The point itself keeps its readings and loses release and concessions; everything after it is shut. */
const reopened = (state: JobState, event: JobEventOf<'point-reopened'>): JobState => {
  const { point, reason, actor, at } = event.body;
  const place = state.points.findIndex((one) => one.place.id === point);
  const round = state.points[place]?.place.round ?? 0;
  const points = state.points.map((one, index): PointState => {
    if (index < place) return one;
    // a later repair round falls away: what it mended is being done again
    if (index > place) return { ...supersede(one), carriedInto: one.place.round > round ? round : null };
    const entry = { reason, by: actor, at };
    return {
      ...one,
      status: 'open',
      openedAt: at,
      concessions: [],
      presentation: null,
      release: null,
      reopened: [...one.reopened, entry],
      superseded: [...one.superseded, evidenceOf(one)],
    };
  });
  // before point 5 the head has to be lifted off again; at point 5 it sits where it was set
  const headPoint = points.findIndex((one) => one.place.kind === 'seal-greased-and-checked');
  return { ...state, points, headSet: place < headPoint ? false : state.headSet };
};

/** The unreleased rest of the sequence is carried into the round's own points; what was released stays. */
const roundOpened = (state: JobState, event: JobEventOf<'repair-round-opened'>): JobState => {
  const { round, passes, at } = event.body;
  const rounds = [...state.rounds, { round, passes }];
  const places = sequenceOf(state.plan.procedure.passes.length, rounds);
  const kept = state.points.map((one) =>
    counts(one) && one.status !== 'released' ? { ...one, status: 'shut' as const, carriedInto: round } : one,
  );
  const added = places.slice(kept.length).map(blankPoint);
  return { ...state, rounds, points: openNext([...kept, ...added], at) };
};

/** The head is cut off: everything so far stands as an earlier setting and the work begins again at point 1. */
const settingBegun = (state: JobState, event: JobEventOf<'setting-begun'>): JobState => {
  const { setting, head, targetHeightIn, reason, actor, at } = event.body;
  const { points, site } = state;
  const earlier = { setting: state.setting, reason, points, site, ended: { by: actor, at } };
  const plan = { ...state.plan, head, terms: { ...state.plan.terms, targetHeightIn } };
  return {
    ...state,
    ...beginSetting(plan, at),
    setting,
    plan,
    earlierSettings: [...state.earlierSettings, earlier],
  };
};

/** What happens to the row of hold points: presented, sent back, released, reopened, repaired, begun again. */
export const evolveSequence = (state: JobState, event: JobEvent): JobState => {
  switch (event.type) {
    case 'point-presented': {
      const { point, contentHash, judged, actor, at } = event.body;
      return changePoint(state, point, (one) => ({
        ...one,
        status: 'presented',
        presentation: { by: actor, at, contentHash, judged },
      }));
    }
    case 'presentation-withdrawn': {
      const { point, actor, at } = event.body;
      return changePoint(state, point, (one) => ({
        ...one,
        status: 'open',
        presentation: null,
        withdrawn: [...one.withdrawn, { by: actor, at }],
      }));
    }
    case 'point-sent-back': {
      const { point, reason, contentHash, actor, at } = event.body;
      return changePoint(state, point, (one) => ({
        ...one,
        status: 'open',
        presentation: null,
        sentBack: [...one.sentBack, { reason, contentHash, by: actor, at }],
      }));
    }
    case 'point-released':
      return released(state, event);
    case 'point-reopened':
      return reopened(state, event);
    case 'repair-round-opened':
      return roundOpened(state, event);
    case 'setting-begun':
      return settingBegun(state, event);
    default:
      return state;
  }
};
