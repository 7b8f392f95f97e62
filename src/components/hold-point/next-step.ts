import type { Verdict } from '../../../shared/hold-points/verdict';
import { dueAt, type Due } from '../../../shared/job/due';
import type { PointReview } from '../../../shared/job/review';
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

const evidenceStep = (due: Due | undefined): Step | null => {
  if (due?.due === 'fields') return { kind: 'field', field: due.fields[0]?.key ?? '' };
  return due?.due === 'shot' ? { kind: 'shot', shot: due.shot } : null;
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

/** Work whose turn has come begins; what stands in its way and can be put right here comes before it. */
const toBegin = (review: PointReview, act: string, judgeBegin: JudgeBegin): Step => {
  const stops = judgeBegin(act).filter(isStop);
  if (stops.length === 0) return { kind: 'begin-act', act };
  const field = fieldThatHolds(review, stops);
  if (field !== undefined) return { kind: 'field', field };
  const what = siteThatHolds(stops);
  return what === undefined ? { kind: 'blocked' } : { kind: 'site', what };
};

/**
 * What comes next at an open point, in the order of its definition. Work that runs is ended first; work that may be
 * passed over is offered beside what comes after it; complete, the point is presented, or measured again while that
 * can help.
 */
export const nextSteps = (review: PointReview, point: PointState, judgeBegin: JudgeBegin): Steps => {
  const dues = dueAt(review, point);
  const running = point.acts.find((run) => run.ended === null);
  if (running) {
    const evidence = dues.find((one) => one.due === 'fields' || one.due === 'shot');
    return { main: { kind: 'end-act', act: running.act }, other: evidenceStep(evidence) };
  }
  const at = dues.findIndex((one) => one.due !== 'optional-act');
  const due = dues[at];
  if (!due) return finished(review);
  if (due.due === 'act') return { main: toBegin(review, due.act, judgeBegin), other: null };
  const before = dues[at - 1];
  const optional = before?.due === 'optional-act' ? toBegin(review, before.act, judgeBegin) : null;
  return {
    main: evidenceStep(due) ?? { kind: 'blocked' },
    other: optional?.kind === 'begin-act' || optional?.kind === 'site' ? optional : null,
  };
};

const finished = (review: PointReview): Steps => {
  const again = fieldThatHolds(review, review.stops.length > 0 ? review.stops : review.holds);
  if (review.stops.length > 0)
    return { main: again === undefined ? { kind: 'blocked' } : { kind: 'measure-again', field: again }, other: null };
  const present: Step = { kind: 'present', outside: review.holds.length };
  if (review.holds.length === 0 || again === undefined) return { main: present, other: null };
  return { main: { kind: 'measure-again', field: again }, other: present };
};

/**
 * The field that the entry goes on to after one was recorded: the next that is missing up to the next photo or work,
 * then those passed over before it; undefined when the main button has something else to say.
 */
export const fieldAfter = (review: PointReview, point: PointState, key: string): string | undefined => {
  const dues = dueAt(review, point).filter((one) => one.due !== 'optional-act');
  const end = dues.findIndex((one) => one.due !== 'fields');
  const open = dues
    .slice(0, end < 0 ? undefined : end)
    .flatMap((one) => (one.due === 'fields' ? one.fields : []))
    .filter((field) => field.key !== key);
  const at = review.fields.findIndex((field) => field.key === key);
  return (open.find((field) => review.fields.indexOf(field) > at) ?? open[0])?.key;
};
