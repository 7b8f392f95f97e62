import { defineStore } from 'pinia';
import { computed, shallowRef, watch } from 'vue';
import type { Command } from '../../shared/contracts/commands';
import { askSession } from '../api/account';
import type { CommandAnswer } from '../api/job';
import { forgetJobs } from '../offline/job-cache';
import { outboxShelf } from '../offline/outbox';
import type { OutboxEntry, OutboxItem } from '../offline/outbox-entry';
import { makeSender } from '../offline/sender';
import { aloneAmongTabs, listenToTabs, tellTabs } from '../offline/tabs';
import { sendEntry, type Sent } from '../offline/send-entry';
import { useConnectionStore } from './connection';
import { useSessionStore } from './session';

type Arrival = (jobId: string, answer: CommandAnswer) => void;

/** What this person has not yet sent, and the way out of it. Every write of a job goes through here. */
export const useOutboxStore = defineStore('outbox', () => {
  const session = useSessionStore();
  const connection = useConnectionStore();
  const entries = shallowRef<OutboxEntry[]>([]);
  const arrivals = new Set<Arrival>();

  const sender = makeSender({
    shelf: outboxShelf,
    send: sendEntry,
    whoSends,
    alone: aloneAmongTabs,
    changed,
    after(ms, work) {
      const timer = setTimeout(work, ms);
      return () => clearTimeout(timer);
    },
  });

  /** The server says whose session this is: another tab may have signed somebody else in meanwhile. */
  async function whoSends(): Promise<string | null> {
    if (session.me === undefined) return null;
    const answer = await askSession();
    return answer.ok && answer.value.id === session.me?.id ? answer.value.id : null;
  }

  async function read(): Promise<void> {
    const accountId = session.me?.id;
    const found = accountId === undefined ? [] : await outboxShelf.of(accountId);
    if (accountId === session.me?.id) entries.value = found;
  }

  async function changed(entry: OutboxEntry, sent: Sent): Promise<void> {
    // The events are merged before the entry leaves the list, so that nothing flickers back for a moment.
    if (sent.is === 'arrived' && sent.answer !== null) {
      for (const arrival of arrivals) arrival(entry.jobId, sent.answer);
    }
    await read();
    tellTabs(entry.jobId);
  }

  /** Puts items in line, all or none, and starts sending. Resolves when they are on the disk. */
  async function put(jobId: string, items: readonly OutboxItem[]): Promise<void> {
    const accountId = session.me?.id;
    if (accountId === undefined) return;
    await outboxShelf.put(accountId, jobId, items, new Date().toISOString());
    await read();
    void sender.kick();
  }

  /** A refused entry is let go of by a person, never by itself. */
  async function discard(entry: OutboxEntry): Promise<void> {
    await outboxShelf.take(entry.place);
    await read();
    void sender.kick();
  }

  /** Tries a refused command again as a new one, in its old place in the line. */
  async function tryAgain(entry: OutboxEntry, command?: Command): Promise<void> {
    const item: OutboxItem = command === undefined ? entry : { kind: 'command', body: command };
    await outboxShelf.replace(
      entry.place,
      item.kind === 'command' ? { kind: item.kind, body: item.body } : { kind: item.kind, body: item.body },
    );
    await read();
    void sender.kick();
  }

  /** Waits until nothing of a job is on its way; says whether that was reached. */
  async function emptied(jobId: string): Promise<boolean> {
    if (waitingOf(jobId).length > 0) await sender.kick();
    return waitingOf(jobId).length === 0;
  }

  const waitingOf = (jobId: string) => entries.value.filter((one) => one.jobId === jobId && one.state === 'waiting');
  const refusedOf = (jobId: string) => entries.value.filter((one) => one.jobId === jobId && one.state === 'refused');

  /** Tells of every command that arrived, with the events that the server made of it. */
  function onArrival(arrival: Arrival): void {
    arrivals.add(arrival);
  }

  const unsent = computed(() => entries.value.filter((one) => one.kind === 'command').length);
  watch(unsent, (count) => connection.setUnsent(count), { immediate: true });
  watch(
    () => session.me?.id,
    async (id, before) => {
      // Whoever signs out takes what was read along; what is unsent waits for its owner. A session that ran out keeps both.
      if (id === undefined && before !== undefined && !session.ended) await forgetJobs(before);
      await read();
      void sender.kick();
    },
    { immediate: true },
  );
  watch(
    () => connection.reached,
    (reached) => {
      if (reached && entries.value.length > 0) void sender.kick();
    },
  );
  addEventListener('online', () => void sender.kick());
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'visible') void sender.kick();
  });
  listenToTabs(() => void read());

  return { entries, unsent, put, discard, tryAgain, emptied, waitingOf, refusedOf, onArrival };
});
