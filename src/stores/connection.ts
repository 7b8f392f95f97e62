import { defineStore } from 'pinia';
import { computed, ref } from 'vue';
import { onSignal } from '../api/signals';

/** Whether the server can be reached, and how much has not arrived there yet; the outbox says how much. */
export const useConnectionStore = defineStore('connection', () => {
  const reached = ref(navigator.onLine);
  const unsent = ref(0);

  onSignal('reached', () => (reached.value = true));
  onSignal('lost', () => (reached.value = false));
  addEventListener('offline', () => (reached.value = false));
  addEventListener('online', () => (reached.value = true));

  const allSent = computed(() => unsent.value === 0);

  /** Called by the outbox whenever its length changes. */
  function setUnsent(count: number): void {
    unsent.value = count;
  }

  return { reached, unsent, allSent, setUnsent };
});
