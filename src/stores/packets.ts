import { defineStore } from 'pinia';
import { ref, shallowRef } from 'vue';
import { askPackets, type JobSummary } from '../api/packets';
import type { Problem } from '../api/problem';

/** Sealed and called-off jobs, newest first, page by page. The search text lives in the address, not here. */
export const usePacketsStore = defineStore('packets', () => {
  const packets = shallowRef<readonly JobSummary[]>([]);
  const next = ref<string | null>(null);
  const loading = ref(false);
  const loaded = ref(false);
  const problem = ref<Problem>();
  let asked = '';

  /** Reads the first page for a search. An answer to an older search is dropped. */
  async function search(q: string): Promise<void> {
    asked = q;
    loading.value = true;
    const answer = await askPackets(q);
    if (asked !== q) return;
    loading.value = false;
    problem.value = answer.ok ? undefined : answer.problem;
    if (!answer.ok) return;
    packets.value = answer.value.packets;
    next.value = answer.value.next;
    loaded.value = true;
  }

  /** Reads the page after the last one. */
  async function more(): Promise<void> {
    const [q, after] = [asked, next.value];
    if (after === null || loading.value) return;
    loading.value = true;
    const answer = await askPackets(q, after);
    if (asked !== q) return;
    loading.value = false;
    problem.value = answer.ok ? undefined : answer.problem;
    if (!answer.ok) return;
    packets.value = [...packets.value, ...answer.value.packets];
    next.value = answer.value.next;
  }

  function forget(): void {
    packets.value = [];
    next.value = null;
    loaded.value = false;
    problem.value = undefined;
  }

  return { packets, next, loading, loaded, problem, search, more, forget };
});
