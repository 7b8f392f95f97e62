import { defineStore } from 'pinia';
import { computed, ref, shallowRef } from 'vue';
import { askJobs, type JobSummary } from '../api/jobs';
import type { Problem } from '../api/problem';
import { keepObject, keptObject } from './kept';
import { useSessionStore } from './session';

/** The list as one person read it last on this device. */
interface KeptList {
  readonly accountId: string;
  readonly jobs: readonly JobSummary[];
  readonly readAt: string;
}

const isKept = (value: unknown): value is KeptList =>
  typeof value === 'object' &&
  value !== null &&
  'accountId' in value &&
  'readAt' in value &&
  'jobs' in value &&
  Array.isArray(value.jobs);

/**
 * Planned and running jobs, newest movement first. The first page is kept on the device, by person, so that the list is
 * there at once and without a signal.
 */
export const useJobListStore = defineStore('job-list', () => {
  const session = useSessionStore();
  const kept = shallowRef<KeptList>();
  const later = shallowRef<readonly JobSummary[]>([]);
  const next = ref<string | null>(null);
  const problem = ref<Problem>();
  const loading = ref(false);

  const jobs = computed(() => [...(mine.value?.jobs ?? []), ...later.value]);
  const mine = computed(() => (kept.value?.accountId === session.me?.id ? kept.value : undefined));
  /** when the server last said so; undefined before the first answer */
  const readAt = computed(() => mine.value?.readAt);

  async function load(): Promise<void> {
    const accountId = session.me?.id;
    if (accountId === undefined) return;
    if (mine.value === undefined) kept.value = keptFor(accountId);
    loading.value = true;
    const answer = await askJobs();
    loading.value = false;
    if (accountId !== session.me?.id) return;
    problem.value = answer.ok ? undefined : answer.problem;
    if (!answer.ok) return;
    kept.value = { accountId, jobs: answer.value.jobs, readAt: new Date().toISOString() };
    later.value = [];
    next.value = answer.value.next;
    keepObject('job-list', kept.value);
  }

  async function more(): Promise<void> {
    if (next.value === null || loading.value) return;
    loading.value = true;
    const answer = await askJobs(next.value);
    loading.value = false;
    problem.value = answer.ok ? undefined : answer.problem;
    if (!answer.ok) return;
    later.value = [...later.value, ...answer.value.jobs];
    next.value = answer.value.next;
  }

  return { jobs, next, problem, loading, readAt, load, more };
});

function keptFor(accountId: string): KeptList | undefined {
  const found = keptObject('job-list', isKept);
  return found?.accountId === accountId ? found : undefined;
}
