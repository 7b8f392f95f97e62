import type { Command } from '../../../shared/contracts/commands';
import { decide } from '../../../shared/job/decide';
import type { JobActor } from '../../../shared/job/decision';
import { evolve } from '../../../shared/job/evolve';
import { changePoint } from '../../../shared/job/points';
import type { Refusal } from '../../../shared/job/refusal';
import type { JobState } from '../../../shared/job/state';
import { timesOf } from '../../../shared/job/actor';
import { hashText } from '../../offline/hash-text';

export type Tried = { ok: true; state: JobState } | { ok: false; refusal: Refusal };

/** The job as it would be with this command carried out: verdicts while typing, by the rules that judge it for good. */
export const tryOut = (state: JobState, command: Command, actor: JobActor): Tried => {
  const decision = decide(state, command, actor, timesOf(command.clock, null), hashText);
  if (!decision.ok) return decision;
  return {
    ok: true,
    state: decision.events.reduce<JobState>((next, event) => evolve(state.id, next, event), state),
  };
};

/** The job with one shut point open, so that drafts for it can be judged. Nothing of this is ever sent. */
export const asIfOpen = (state: JobState, point: string): JobState =>
  changePoint(state, point, (one) => (one.status === 'shut' ? { ...one, status: 'open' } : one));
