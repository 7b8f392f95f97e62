import type { Verdict } from '../../../shared/hold-points/verdict';
import type { PlacedField, PointReview } from '../../../shared/job/review';
import type { PointState } from '../../../shared/job/state';

/** The one thing that the main button does now. */
export type Step =
  | { kind: 'field'; field: string }
  | { kind: 'shot'; shot: string }
  | { kind: 'begin-act'; act: string }
  | { kind: 'end-act'; act: string }
  | { kind: 'measure-again'; field: string }
  | { kind: 'present'; outside: number }
  /** something of the site stands in the way: the air has grown old, the permit has run out */
  | { kind: 'site'; what: 'air' | 'permit' }
  | { kind: 'blocked' };

export interface Steps {
  main: Step;
  /** offered below the main one, smaller */
  other: Step | null;
}

type JudgeBegin = (act: string) => readonly Verdict[];

const isStop = (verdict: Verdict): boolean => verdict.outcome === 'outside' && verdict.kind === 'stop';

const missingFields = (review: PointReview): PlacedField[] =>
  review.fields.filter((field) => review.missing.includes(`field:${field.key}`));

const missingAct = (review: PointReview, point: PointState): string | undefined =>
  review.acts.find((act) => act.required && !point.acts.some((run) => run.act === act.key))?.key;

/** What is read or photographed next: fields in their order, then shots. */
const evidenceStep = (review: PointReview): Step | null => {
  const field = missingFields(review)[0];
  if (field) return { kind: 'field', field: field.key };
  const shot = review.missing.find((key) => key.startsWith('shot:'));
  return shot === undefined ? null : { kind: 'shot', shot: shot.slice('shot:'.length) };
};

/** The field of this point that such a verdict waits for: one that is not there yet, else the oldest reading. */
const fieldThatHolds = (review: PointReview, verdicts: readonly Verdict[]): string | undefined => {
  const readAt = (key: string): string => review.context.read(key)?.at.corrected ?? '';
  const here = (key: string): boolean => review.fields.some((field) => field.key === key);
  const found = verdicts.map((verdict) => verdict.about.filter(here)).find((keys) => keys.length > 0);
  return found?.sort((a, b) => readAt(a).localeCompare(readAt(b)))[0];
};

const siteThatHolds = (verdicts: readonly Verdict[]): 'air' | 'permit' | undefined => {
  const about = verdicts.flatMap((verdict) => verdict.about);
  if (about.some((key) => key.startsWith('gas.'))) return 'air';
  return about.some((key) => key.startsWith('permit.')) ? 'permit' : undefined;
};

/**
 * What comes next at an open point. Work that runs is ended first; work that must be done begins as soon as nothing
 * stands in its way; then readings and photos; complete, it is presented, or measured again while that can help.
 */
export const nextSteps = (review: PointReview, point: PointState, judgeBegin: JudgeBegin): Steps => {
  const evidence = evidenceStep(review);
  const running = point.acts.find((run) => run.ended === null);
  if (running) return { main: { kind: 'end-act', act: running.act }, other: evidence };
  const act = missingAct(review, point);
  if (act !== undefined) {
    const stops = judgeBegin(act).filter(isStop);
    if (stops.length === 0) return { main: { kind: 'begin-act', act }, other: evidence };
    // What stands in the way and can be read here comes before everything else.
    const key = fieldThatHolds(review, stops);
    if (key !== undefined) return { main: { kind: 'field', field: key }, other: null };
    const what = siteThatHolds(stops);
    if (what !== undefined) return { main: { kind: 'site', what }, other: evidence };
  }
  if (evidence) return { main: evidence, other: null };
  if (act !== undefined) return { main: { kind: 'blocked' }, other: null };
  return finished(review);
};

const finished = (review: PointReview): Steps => {
  const again = fieldThatHolds(review, review.stops.length > 0 ? review.stops : review.holds);
  if (review.stops.length > 0)
    return { main: again === undefined ? { kind: 'blocked' } : { kind: 'measure-again', field: again }, other: null };
  const present: Step = { kind: 'present', outside: review.holds.length };
  if (review.holds.length === 0 || again === undefined) return { main: present, other: null };
  return { main: { kind: 'measure-again', field: again }, other: present };
};

/** The field that the entry goes on to after one was recorded; undefined when something else comes next. */
export const fieldAfter = (review: PointReview, key: string): string | undefined => {
  const at = review.fields.findIndex((field) => field.key === key);
  const open = missingFields(review).filter((field) => field.key !== key);
  return (open.find((field) => review.fields.indexOf(field) > at) ?? open[0])?.key;
};
