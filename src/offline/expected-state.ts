import { decide } from '../../shared/job/decide';
import type { JobActor } from '../../shared/job/decision';
import { evolve } from '../../shared/job/evolve';
import type { JobState } from '../../shared/job/state';
import { timesOf } from '../../shared/job/actor';
import { hashText } from './hash-text';
import type { OutboxEntry } from './outbox-entry';

/**
 * The job as it will stand once everything in line has arrived: the same rules on the same commands give the same
 * events, so that verdicts and progress show at once and without a signal. A command that a rule refuses is left out.
 */
export const expectedState = (
  confirmed: JobState,
  entries: readonly OutboxEntry[],
  actorIn: (state: JobState) => JobActor,
): JobState =>
  entries.reduce((state, entry) => {
    if (entry.kind !== 'command' || entry.state !== 'waiting') return state;
    const decision = decide(state, entry.body, actorIn(state), timesOf(entry.body.clock, null), hashText);
    return decision.ok
      ? decision.events.reduce<JobState>((next, event) => evolve(state.id, next, event), state)
      : state;
  }, confirmed);
