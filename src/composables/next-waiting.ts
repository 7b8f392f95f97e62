import { useRouter } from 'vue-router';
import { keyOfEntry, useDeskStore } from '../stores/desk';

/**
 * After an answer given on a hold point's own page: on to the next one that waits for this person, as on the desk. With
 * nothing else waiting the page stays and shows what was answered.
 */
export function useNextWaiting(): (jobId: string, point: string) => Promise<void> {
  const desk = useDeskStore();
  const router = useRouter();
  return async (jobId, point) => {
    const done = keyOfEntry({ jobId, point });
    await desk.load();
    desk.answered(done);
    const next = desk.entries.find((one) => keyOfEntry(one) !== done);
    const page = router.currentRoute.value;
    if (next === undefined || page.params['id'] !== jobId || page.params['point'] !== point) return;
    await router.replace({ name: 'hold-point', params: { id: next.jobId, point: next.point } });
  };
}
