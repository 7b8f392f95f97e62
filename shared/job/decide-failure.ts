import { judgeResume } from '../hold-points/site';
import type { Verdict } from '../hold-points/verdict';
import { accept, event, jobContentMoved, refuse, signature, type Decider } from './decision';
import { planRefused } from './plan-refused';
import { counts, currentPoint, runningAct } from './points';
import { covers, reviewPoint } from './review';
import type { JobState, PointState } from './state';

/** Opened from point 10 or 11, the last ones: before that a point is simply reopened. */
export const decideOpenRepairRound: Decider<'open-repair-round'> = (input) => {
  const { state, command } = input;
  const current = currentPoint(state);
  const kind = current?.place.kind;
  if (!current || (kind !== 'cooled-to-touch' && kind !== 'pressure-test-held')) return refuse('no-round-here');
  const running = runningAct(state);
  if (running) return refuse('act-running', { since: running.begun });
  const moved = jobContentMoved(input, command.body);
  if (moved) return moved;
  const { reason, passes } = command.body;
  return accept(
    event(input, 'repair-round-opened', {
      round: state.rounds.length + 1,
      passes,
      from: current.place.id,
      reason,
      signature: signature(input, 'open-repair-round', command.body),
    }),
  );
};

/** The head is cut off again: back to point 1 with a new height and head. */
export const decideSetAgain: Decider<'set-again'> = (input) => {
  const { state, command, at } = input;
  const running = runningAct(state);
  if (running) return refuse('act-running', { since: running.begun });
  if (!state.headSet) return refuse('plan-not-workable', { params: { why: { key: 'refusals.head-never-set' } } });
  const moved = jobContentMoved(input, command.body);
  if (moved) return moved;
  const { reason, head, targetHeightIn } = command.body;
  const terms = { ...state.plan.terms, targetHeightIn };
  const unworkable = planRefused({ ...state.plan, head, terms, people: state.people }, at);
  if (unworkable) return unworkable;
  return accept(
    event(input, 'setting-begun', {
      setting: state.setting + 1,
      head,
      targetHeightIn,
      reason,
      signature: signature(input, 'set-again', command.body),
    }),
  );
};

/** Anyone on the job may stop it. */
export const decideStopWork: Decider<'stop-work'> = (input) => {
  const { state, command } = input;
  if (state.stopped) return refuse('work-stopped', { since: state.stopped });
  return accept(event(input, 'work-stopped', { reason: command.body.reason }));
};

export const decideResumeWork: Decider<'resume-work'> = (input) => {
  const { state, command, at } = input;
  if (!state.stopped) return refuse('work-not-stopped');
  const verdicts = judgeResume(state, at.corrected);
  const blockers = verdicts.filter((verdict) => verdict.outcome === 'outside' && verdict.kind === 'stop');
  if (blockers.length > 0) return refuse('not-ready-to-resume', { blockers });
  const moved = jobContentMoved(input, command.body);
  if (moved) return moved;
  return accept(
    event(input, 'work-resumed', {
      note: command.body.note,
      verdicts,
      signature: signature(input, 'resume-work', command.body),
    }),
  );
};

export const decideCallOff: Decider<'call-off'> = (input) => {
  const moved = jobContentMoved(input, input.command.body);
  if (moved) return moved;
  return accept(
    event(input, 'job-called-off', {
      reason: input.command.body.reason,
      signature: signature(input, 'call-off', input.command.body),
    }),
  );
};

/** What is outside a hold at a point: as it was released, else by its evidence now. */
const holdsOf = (state: JobState, point: PointState): Verdict[] =>
  (point.release?.judged.verdicts ?? reviewPoint(state, point).verdicts).filter(
    (verdict) => verdict.kind === 'hold' && verdict.outcome === 'outside',
  );

/**
 * Concessions that stand, read back before the seal: those that a new reading has not voided, of every point that was
 * neither superseded nor carried into a repair round.
 */
export const concessionTotal = (state: JobState): number =>
  state.points
    .filter((point) => counts(point) && point.concessions.length > 0)
    .reduce((total, point) => {
      const conceded = (verdict: Verdict) => point.concessions.some((concession) => covers(concession, verdict));
      return total + holdsOf(state, point).filter(conceded).length;
    }, 0);

export const decideSeal: Decider<'seal'> = (input) => {
  const { state, command } = input;
  if (state.stopped) return refuse('work-stopped', { since: state.stopped });
  const waiting = state.points.filter((point) => counts(point) && point.status !== 'released');
  if (waiting.length > 0)
    return refuse('not-all-released', { missing: waiting.map((point) => `point:${point.place.id}`) });
  if (command.body.concessions !== concessionTotal(state))
    return refuse('concessions-miscounted', { params: { total: concessionTotal(state) } });
  const moved = jobContentMoved(input, command.body);
  if (moved) return moved;
  return accept(
    event(input, 'job-sealed', {
      concessions: command.body.concessions,
      signature: signature(input, 'seal', command.body),
    }),
  );
};
