import { ownerOf } from '../hold-points/points';
import { samePerson } from './actor';
import {
  accept,
  contentMoved,
  event,
  pointNamed,
  refuse,
  signature,
  type Decider,
  type Decision,
  type JobActor,
} from './decision';
import type { AsJudged, JobEventOf } from './events';
import { runningAct } from './points';
import { covers, reviewPoint, standingPhotos, type PointReview } from './review';
import type { JobState, PointState } from './state';

/** Verdicts and versions to keep beside an event: what is sealed is never judged again. */
export const asJudged = (review: PointReview): AsJudged => ({
  verdicts: review.verdicts,
  definition: review.definition,
  calculations: review.computed.map((one) => one.calculation),
});

/** Everybody whose hand is in a point's standing evidence. */
export const handsIn = (review: PointReview, point: PointState) => [
  ...review.fields.flatMap((field) => {
    const reading = review.context.read(field.key);
    return reading ? [reading.measuredBy, reading.typedBy] : [];
  }),
  ...standingPhotos(point.photos).map((photo) => photo.by),
  ...point.acts.flatMap((run) => (run.ended ? [run.begun.by, run.ended.by] : [run.begun.by])),
];

/** Whether somebody's own hand is in the evidence: such a person releases and concedes nothing here. */
export const handIsIn = (
  review: PointReview,
  point: PointState,
  actor: Pick<JobActor, 'accountId' | 'name'>,
): boolean => handsIn(review, point).some((hand) => samePerson(hand, actor));

/** The point must be presented; if not, the loser of a race hears who was faster. */
const notPresented = (point: PointState): Decision | null => {
  switch (point.status) {
    case 'presented':
      return null;
    case 'released':
      return refuse('point-already-released', { since: point.release });
    case 'open':
      return refuse('point-not-presented', { since: point.sentBack.at(-1) ?? null });
    case 'shut':
      return refuse('point-shut');
  }
};

export const mayOwn = (actor: JobActor, point: PointState): boolean => actor.roles.includes(ownerOf[point.place.kind]);

const stopped = (state: JobState): Decision | null =>
  state.stopped ? refuse('work-stopped', { since: state.stopped }) : null;

export const decideRelease: Decider<'release'> = (input) => {
  const { state, command, actor } = input;
  const point = pointNamed(state, command.body.point);
  if (!point) return refuse('no-such-point');
  if (!mayOwn(actor, point)) return refuse('not-the-owner');
  const early = notPresented(point) ?? stopped(state) ?? contentMoved(input, point, command.body);
  if (early) return early;
  const review = reviewPoint(state, point);
  if (handIsIn(review, point, actor)) return refuse('own-evidence');
  if (review.missing.length > 0) return refuse('not-complete', { missing: review.missing });
  if (review.stops.length > 0) return refuse('outside-stop', { blockers: review.stops });
  if (review.unconceded.length > 0) return refuse('outside-hold', { blockers: review.unconceded });
  const unsaid = review.statements.filter((statement) => !command.body.statements.includes(statement));
  if (unsaid.length > 0) return refuse('statements-missing', { missing: unsaid.map((one) => `statement:${one}`) });
  return accept(
    event({ ...input, stamp: { ...input.stamp, role: ownerOf[point.place.kind] } }, 'point-released', {
      point: point.place.id,
      readings: review.fields.flatMap((field) => review.context.read(field.key)?.id ?? []),
      photos: standingPhotos(point.photos).map((photo) => photo.id),
      statements: [...review.statements],
      judged: asJudged(review),
      signature: { ...signature(input, 'release', command.body), role: ownerOf[point.place.kind] },
    }),
  );
};

export const decideSendBack: Decider<'send-back'> = (input) => {
  const { state, command, actor } = input;
  const { point: id, reason, contentHash } = command.body;
  const point = pointNamed(state, id);
  if (!point) return refuse('no-such-point');
  if (!mayOwn(actor, point)) return refuse('not-the-owner');
  const early = notPresented(point);
  if (early) return early;
  if (point.presentation?.contentHash !== contentHash) return refuse('content-changed', { since: point.presentation });
  return accept(
    event({ ...input, stamp: { ...input.stamp, role: ownerOf[point.place.kind] } }, 'point-sent-back', {
      point: id,
      reason,
      contentHash,
    }),
  );
};

/** The company representative concedes on every point, also on the tool pusher's: there it comes before his release. */
export const decideConcede: Decider<'concede'> = (input) => {
  const { state, command, actor } = input;
  const point = pointNamed(state, command.body.point);
  if (!point) return refuse('no-such-point');
  const early = notPresented(point) ?? contentMoved(input, point, command.body);
  if (early) return early;
  const review = reviewPoint(state, point);
  if (handIsIn(review, point, actor)) return refuse('own-evidence');
  const items: JobEventOf<'reading-conceded'>['body']['items'] = [];
  for (const item of command.body.items) {
    const verdict = review.verdicts.find((one) => one.limit === item.limit);
    if (verdict?.outcome === 'outside' && verdict.kind === 'stop')
      return refuse('cannot-concede-stop', { blockers: [verdict] });
    const hold = review.unconceded.find((one) => one.limit === item.limit);
    if (!hold) return refuse('nothing-to-concede', { params: { limit: item.limit } });
    if (!covers({ ...item, verdict: hold }, hold)) return refuse('verdict-moved', { blockers: [hold] });
    if (items.some((one) => one.limit === item.limit))
      return refuse('nothing-to-concede', { params: { limit: item.limit } });
    items.push({ limit: item.limit, basis: hold.basis, reason: item.reason, verdict: hold });
  }
  return accept(
    event(input, 'reading-conceded', {
      point: point.place.id,
      items,
      signature: signature(input, 'concede', command.body),
    }),
  );
};

export const decideReopen: Decider<'reopen'> = (input) => {
  const { state, command } = input;
  const point = pointNamed(state, command.body.point);
  if (!point) return refuse('no-such-point');
  if (point.status !== 'released') return refuse('point-not-released');
  const running = runningAct(state);
  if (running) return refuse('act-running', { since: running.begun });
  const moved = contentMoved(input, point, command.body);
  if (moved) return moved;
  return accept(
    event(input, 'point-reopened', {
      point: point.place.id,
      reason: command.body.reason,
      signature: signature(input, 'reopen', command.body),
    }),
  );
};
