import type { Shown } from '../contracts/commands';
import { canonicalJson } from '../ledger/canonical-json';
import type { HashText } from '../ledger/chain';
import type { JobState, PointState } from './state';
import { reviewPoint, standingPhotos, type PointReview } from './review';

const readingsOf = (review: PointReview) =>
  review.fields.flatMap((field) => {
    const reading = review.context.read(field.key);
    return reading
      ? [
          {
            id: reading.id,
            field: field.key,
            typed: reading.typed,
            unit: reading.unit,
            value: reading.value,
            measuredBy: reading.measuredBy.name,
            typedBy: reading.typedBy.name,
            at: reading.at.corrected,
          },
        ]
      : [];
  });

/**
 * What a signature at a hold point is bound to: readings, verdicts with their limits, file hashes, concessions, terms,
 * definition version, language and units. Nothing in it depends on now, so equal evidence gives equal content.
 */
export const contentOf = (state: JobState, point: PointState, shown: Shown) => {
  const review = reviewPoint(state, point);
  return {
    job: state.id,
    setting: state.setting,
    point: point.place.id,
    definition: review.definition,
    terms: state.plan.terms,
    head: state.plan.head.id,
    procedure: `${state.plan.procedure.number} rev ${state.plan.procedure.revision}`,
    direction: state.direction ? { direction: state.direction.direction, words: state.direction.words } : null,
    readings: readingsOf(review),
    photos: standingPhotos(point.photos).map(({ shot, sha256, previewSha256 }) => ({ shot, sha256, previewSha256 })),
    acts: point.acts.map((run) => ({
      act: run.act,
      begun: run.begun.at.corrected,
      ended: run.ended?.at.corrected ?? null,
    })),
    computed: review.computed,
    verdicts: review.verdicts,
    concessions: review.conceded.map(({ limit, basis, reason }) => ({ limit, basis, reason })),
    shown,
  };
};

export const contentHashOf = (state: JobState, point: PointState, shown: Shown, hash: HashText): string =>
  hash(canonicalJson(contentOf(state, point, shown)));

/** What a signature on the whole job is bound to: everything that has been recorded so far, by its count and its end. */
export const jobContentOf = (state: JobState, shown: Shown) => ({
  job: state.id,
  setting: state.setting,
  status: state.status,
  terms: state.plan.terms,
  events: state.eventCount,
  stopped: state.stopped ? { reason: state.stopped.reason, at: state.stopped.at.corrected } : null,
  points: state.points.map((point) => ({
    point: point.place.id,
    status: point.status,
    release: point.release?.signature.contentHash ?? null,
    concessions: point.concessions.length,
  })),
  shown,
});

export const jobContentHashOf = (state: JobState, shown: Shown, hash: HashText): string =>
  hash(canonicalJson(jobContentOf(state, shown)));
