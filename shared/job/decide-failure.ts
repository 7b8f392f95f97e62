import { judgeResume } from '../hold-points/site';
import { accept, event, jobContentMoved, refuse, signature, type Decider } from './decision';
import { counts, currentPoint } from './points';
import type { JobState } from './state';

/** Opened from point 10 or 11, the last ones: before that a point is simply reopened. */
export const decideOpenRepairRound: Decider<'open-repair-round'> = (input) => {
  const { state, command } = input;
  const current = currentPoint(state);
  const kind = current?.place.kind;
  if (!current || (kind !== 'cooled-to-touch' && kind !== 'pressure-test-held')) return refuse('no-round-here');
  if (current.acts.some((run) => run.ended === null)) return refuse('act-running');
  const { reason, passes } = command.body;
  return accept(
    event(input, 'repair-round-opened', { round: state.rounds.length + 1, passes, from: current.place.id, reason }),
  );
};

/** The head is cut off again: back to point 1 with a new height and head. */
export const decideSetAgain: Decider<'set-again'> = (input) => {
  const { state, command } = input;
  if (!state.headSet) return refuse('plan-not-workable', { params: { why: { key: 'refusals.head-never-set' } } });
  const moved = jobContentMoved(input, command.body);
  if (moved) return moved;
  const { reason, head, targetHeightIn } = command.body;
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

/** Concessions that stand in the packet, read back before the seal: those of every point that was not superseded. */
export const concessionTotal = (state: JobState): number =>
  state.points.reduce((total, point) => total + point.concessions.length, 0);

export const decideSeal: Decider<'seal'> = (input) => {
  const { state, command } = input;
  if (state.stopped) return refuse('work-stopped', { since: state.stopped });
  const waiting = state.points.filter((point) => counts(point) && point.status !== 'released');
  if (waiting.length > 0) return refuse('not-all-released', { missing: waiting.map((point) => `point:${point.place.id}`) });
  if (command.body.concessions !== concessionTotal(state))
    return refuse('concessions-miscounted', { params: { total: concessionTotal(state) } });
  const moved = jobContentMoved(input, command.body);
  if (moved) return moved;
  return accept(
    event(input, 'job-sealed', { concessions: command.body.concessions, signature: signature(input, 'seal', command.body) }),
  );
};
