import type { PointPlace } from '../hold-points/points';
import type { Times } from './actor';
import type { ActRun, Evidence, JobState, PointState } from './state';

export const noEvidence = (): Evidence => ({
  readings: {},
  photos: [],
  acts: [],
  concessions: [],
  presentation: null,
  release: null,
});

export const blankPoint = (place: PointPlace): PointState => ({
  ...noEvidence(),
  place,
  status: 'shut',
  sentBack: [],
  withdrawn: [],
  reopened: [],
  superseded: [],
  carriedInto: null,
  openedAt: null,
});

export const hasEvidence = (point: Evidence): boolean =>
  Object.keys(point.readings).length > 0 || point.photos.length > 0 || point.acts.length > 0;

/** Points that still count for the sequence: a point carried into a repair round no longer does. */
export const counts = (point: PointState): boolean => point.carriedInto === null;

/** Opens the first point that is not released, if it is shut. One place decides what is open. */
export const openNext = (points: PointState[], at: Times): PointState[] => {
  const next = points.findIndex((point) => counts(point) && point.status !== 'released');
  return points.map((point, index) =>
    index === next && point.status === 'shut' ? { ...point, status: 'open', openedAt: at } : point,
  );
};

export const findPoint = (state: JobState, id: string): PointState | undefined =>
  state.points.find((point) => point.place.id === id);

export const changePoint = (state: JobState, id: string, change: (point: PointState) => PointState): JobState => ({
  ...state,
  points: state.points.map((point) => (point.place.id === id ? change(point) : point)),
});

/** The point that is open or presented now; undefined when all are released. */
export const currentPoint = (state: JobState): PointState | undefined =>
  state.points.find((point) => point.status === 'open' || point.status === 'presented');

/** The act that burns or runs now; undefined while nothing does. */
export const runningAct = (state: JobState): ActRun | undefined =>
  currentPoint(state)?.acts.find((run) => run.ended === null);
