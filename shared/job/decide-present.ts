import { accept, contentMoved, event, pointNamed, refuse, type Decider } from './decision';
import { asJudged } from './decide-release';
import { reviewPoint } from './review';

/** Everything asked for is there, nothing is outside a stop: the recorder raises the hand. */
export const decidePresent: Decider<'present'> = (input) => {
  const { state, command } = input;
  const point = pointNamed(state, command.body.point);
  if (!point) return refuse('no-such-point');
  if (state.stopped) return refuse('work-stopped', { since: state.stopped });
  if (point.status === 'shut') return refuse('point-shut');
  if (point.status !== 'open') return refuse('point-not-open', { since: point.release ?? point.presentation });
  const review = reviewPoint(state, point);
  if (review.missing.length > 0) return refuse('not-complete', { missing: review.missing });
  if (review.stops.length > 0) return refuse('outside-stop', { blockers: review.stops });
  const moved = contentMoved(input, point, command.body);
  if (moved) return moved;
  return accept(
    event(input, 'point-presented', {
      point: point.place.id,
      contentHash: command.body.contentHash,
      judged: asJudged(review),
    }),
  );
};

/** A recorder takes a presented point back before its release. */
export const decideWithdraw: Decider<'withdraw'> = (input) => {
  const { state, command } = input;
  const point = pointNamed(state, command.body.point);
  if (!point) return refuse('no-such-point');
  if (point.status === 'released') return refuse('point-already-released', { since: point.release });
  if (point.status !== 'presented') return refuse('point-not-presented', { since: point.sentBack.at(-1) ?? null });
  return accept(
    event(input, 'presentation-withdrawn', { point: point.place.id, reason: command.body.reason, cause: 'recorder' }),
  );
};
