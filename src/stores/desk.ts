import { defineStore } from 'pinia';
import { computed, ref, shallowRef } from 'vue';
import { askDesk, type DeskEntry } from '../api/jobs';
import type { Problem } from '../api/problem';
import { useSessionStore } from './session';

/** The name of an entry: a job has one point that waits at a time, yet the next may follow at once. */
export const keyOfEntry = ({ jobId, point }: Pick<DeskEntry, 'jobId' | 'point'>): string => `${jobId} ${point}`;

/** What waits for this person's signature over all jobs, in the server's order: hot joints first, then the oldest. */
export const useDeskStore = defineStore('desk', () => {
  const session = useSessionStore();
  const entries = shallowRef<readonly DeskEntry[]>([]);
  const problem = ref<Problem>();
  const loading = ref(false);
  const owner = ref<string>();
  let asked: Promise<void> | undefined;

  /** the server has answered this person at least once */
  const isRead = computed(() => owner.value !== undefined && owner.value === session.me?.id);
  const mine = computed(() => (isRead.value ? entries.value : []));

  function load(): Promise<void> {
    asked ??= loadOnce().finally(() => (asked = undefined));
    return asked;
  }

  async function loadOnce(): Promise<void> {
    const accountId = session.me?.id;
    loading.value = true;
    const answer = await askDesk();
    loading.value = false;
    if (accountId !== session.me?.id) return;
    problem.value = answer.ok ? undefined : answer.problem;
    if (!answer.ok) return;
    entries.value = answer.value.entries;
    owner.value = accountId;
  }

  /** Takes an entry away that was answered just now, until the server says the same. */
  function answered(key: string): void {
    entries.value = entries.value.filter((one) => keyOfEntry(one) !== key);
  }

  return { entries: mine, problem, loading, isRead, load, answered };
});
