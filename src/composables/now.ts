import { onScopeDispose, ref, type Ref } from 'vue';
import { useClockStore } from '../stores/clock';

/** Now by the corrected clock, moved on every `everyMs` while the page is seen; nothing ticks while it is hidden. */
export function useNow(everyMs = 1000): Ref<string> {
  const clock = useClockStore();
  const now = ref(clock.correctedNow().toISOString());
  let timer: ReturnType<typeof setInterval> | undefined;

  function tick(): void {
    now.value = clock.correctedNow().toISOString();
  }
  function start(): void {
    clearInterval(timer);
    timer = undefined;
    if (document.visibilityState === 'hidden') return;
    tick();
    timer = setInterval(tick, everyMs);
  }

  start();
  document.addEventListener('visibilitychange', start);
  onScopeDispose(() => {
    clearInterval(timer);
    document.removeEventListener('visibilitychange', start);
  });
  return now;
}
