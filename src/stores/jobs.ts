import { defineStore } from 'pinia';
import { shallowReactive } from 'vue';
import { asEvent } from '../../shared/job/as-event';
import { evolve } from '../../shared/job/evolve';
import type { JobState } from '../../shared/job/state';
import { readEvents, type WireEvent } from '../api/job';
import type { Problem } from '../api/problem';
import { cachedEvents, cacheEvents } from '../offline/job-cache';
import { listenToTabs } from '../offline/tabs';
import { useOutboxStore } from './outbox';
import { useSessionStore } from './session';

/** A job as the server has confirmed it. */
export interface KnownJob {
  readonly events: readonly WireEvent[];
  readonly confirmed: JobState | null;
  /** why it could not be read from the server the last time */
  readonly problem: Problem | null;
  readonly loading: boolean;
}

const unknown: KnownJob = { events: [], confirmed: null, problem: null, loading: false };

/** The jobs that were looked at: their events, folded. What waits in the outbox is laid on top elsewhere. */
export const useJobsStore = defineStore('jobs', () => {
  const session = useSessionStore();
  const outbox = useOutboxStore();
  const known = shallowReactive(new Map<string, KnownJob>());
  const asked = new Map<string, Promise<void>>();
  let owner: string | undefined;

  const of = (jobId: string): KnownJob => known.get(jobId) ?? unknown;
  const change = (jobId: string, by: Partial<KnownJob>) => known.set(jobId, { ...of(jobId), ...by });

  /** Adds events that follow on what is known. False when there is a gap: then the rest has to be asked for. */
  function merge(jobId: string, events: readonly WireEvent[]): boolean {
    const before = of(jobId);
    const fresh = events.filter((one) => one.seq > before.events.length).sort((a, b) => a.seq - b.seq);
    if (fresh.length === 0) return true;
    if (fresh[0]?.seq !== before.events.length + 1) return false;
    const confirmed = fresh.reduce<JobState | null>(
      (state, one) => evolve(jobId, state, asEvent(one)),
      before.confirmed,
    );
    const all = [...before.events, ...fresh];
    change(jobId, { events: all, confirmed });
    if (session.me !== undefined) void cacheEvents(session.me.id, jobId, all);
    return true;
  }

  /** First what this device kept, then what the server adds. */
  function open(jobId: string): Promise<void> {
    if (owner !== session.me?.id) {
      known.clear();
      owner = session.me?.id;
    }
    return refresh(jobId);
  }

  function refresh(jobId: string): Promise<void> {
    const running = asked.get(jobId) ?? load(jobId).finally(() => asked.delete(jobId));
    asked.set(jobId, running);
    return running;
  }

  async function load(jobId: string): Promise<void> {
    change(jobId, { loading: true });
    if (of(jobId).events.length === 0 && session.me !== undefined)
      merge(jobId, await cachedEvents(session.me.id, jobId));
    const answer = await readEvents(jobId, of(jobId).events.length);
    if (answer.ok) merge(jobId, answer.value.events);
    change(jobId, { loading: false, problem: answer.ok ? null : answer.problem });
  }

  /** Takes what the server made of a command; asks for the rest when others were faster. */
  function take(jobId: string, events: readonly WireEvent[]): void {
    if (!merge(jobId, events)) void refresh(jobId);
  }

  outbox.onArrival((jobId, answer) => take(jobId, answer.events));
  listenToTabs((jobId) => {
    if (known.has(jobId)) void refresh(jobId);
  });

  return { of, open, refresh, take };
});
