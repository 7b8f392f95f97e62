import { onScopeDispose, watch } from 'vue';
import { useConnectionStore } from '../stores/connection';

/** Reads again when the page comes back into view and when the link returns; nothing runs in between. */
export function whenSeenAgain(read: () => unknown): void {
  const connection = useConnectionStore();
  function look(): void {
    if (document.visibilityState === 'visible') void read();
  }
  document.addEventListener('visibilitychange', look);
  onScopeDispose(() => document.removeEventListener('visibilitychange', look));
  watch(
    () => connection.reached,
    (reached) => reached && look(),
  );
}
