import type { PointId } from '../hold-points/points';
import type { Verdict } from '../hold-points/verdict';
import type { ActorStamp, Times } from './actor';
import type { JobEvent } from './events';
import { evolve } from './evolve';
import { findPoint, hasEvidence } from './points';
import { reviewPoint, type PointReview } from './review';
import type { JobState, PointState } from './state';

/** How a telling of a hold point ended. */
export type Ending = 'released' | 'superseded' | 'carried' | 'unfinished' | 'untouched';

/** One telling of a hold point: its evidence, read with the job as it stood then. */
export interface Chapter {
  point: PointState;
  review: PointReview;
  /** as judged at the release, else when it was presented, else by the evidence alone */
  verdicts: readonly Verdict[];
  judgedAt: 'release' | 'presentation' | 'evidence';
  ending: Ending;
  /** why and by whom it was superseded */
  why: { reason: string; by: ActorStamp; at: Times } | null;
}

/** A hold point in the order of the work: what counts, and before it what no longer does. */
export interface Section {
  point: PointState;
  chapter: Chapter;
  superseded: readonly Chapter[];
}

/** The head set once: all hold points of that setting. `reason` says why the head was cut off again. */
export interface Setting {
  setting: number;
  reason: string | null;
  sections: readonly Section[];
}

export interface Story {
  state: JobState;
  settings: readonly Setting[];
}

const endingOf = (point: PointState): Ending => {
  if (point.carriedInto !== null) return 'carried';
  if (point.release) return 'released';
  return hasEvidence(point) ? 'unfinished' : 'untouched';
};

const chapterOf = (moment: JobState, point: PointState, ending: Ending, why: Chapter['why'] = null): Chapter => {
  const review = reviewPoint(moment, point);
  const frame = { point, review, ending, why };
  if (point.release) return { ...frame, verdicts: point.release.judged.verdicts, judgedAt: 'release' };
  if (point.presentation) return { ...frame, verdicts: point.presentation.judged.verdicts, judgedAt: 'presentation' };
  return { ...frame, verdicts: review.verdicts, judgedAt: 'evidence' };
};

/** The point whose own evidence an event moves; what arrives late moves nothing. */
const touched = ({ body }: JobEvent): PointId | null =>
  'point' in body && !('late' in body && body.late) ? body.point : null;

/** What is remembered between two events while a setting is told. */
class Telling {
  /** the job right after each point's own last event */
  private moments = new Map<PointId, JobState>();
  private past = new Map<PointId, Chapter[]>();

  private momentOf(state: JobState, id: PointId): JobState {
    return this.moments.get(id) ?? state;
  }

  supersede(before: JobState, after: JobState, why: NonNullable<Chapter['why']>): void {
    for (const { place, superseded } of after.points) {
      const old = findPoint(before, place.id);
      if (!old || superseded.length === old.superseded.length) continue;
      const chapter = chapterOf(this.momentOf(before, place.id), old, 'superseded', why);
      this.past.set(place.id, [...(this.past.get(place.id) ?? []), chapter]);
      this.moments.delete(place.id);
    }
  }

  moved(state: JobState, id: PointId): void {
    this.moments.set(id, state);
  }

  sections(state: JobState): Section[] {
    return state.points.map((point) => ({
      point,
      chapter: chapterOf(this.momentOf(state, point.place.id), point, endingOf(point)),
      superseded: this.past.get(point.place.id) ?? [],
    }));
  }
}

/**
 * A job told from its events: each hold point with its evidence as it stood when it was released or set aside, so that
 * later changes of terms or of other points change nothing that was read then. Null when there are no events.
 */
export const storyOf = (jobId: string, events: readonly JobEvent[]): Story | null => {
  let state: JobState | null = null;
  let telling = new Telling();
  const settings: Setting[] = [];
  for (const event of events) {
    const before: JobState | null = state;
    const after: JobState = evolve(jobId, before, event);
    if (before && event.type === 'point-reopened') {
      const { reason, actor, at } = event.body;
      telling.supersede(before, after, { reason, by: actor, at });
    }
    if (before && event.type === 'setting-begun') {
      settings.push({ setting: before.setting, reason: event.body.reason, sections: telling.sections(before) });
      telling = new Telling();
    }
    const id = touched(event);
    if (id !== null) telling.moved(after, id);
    state = after;
  }
  if (state === null) return null;
  return {
    state,
    settings: [...settings, { setting: state.setting, reason: null, sections: telling.sections(state) }],
  };
};
