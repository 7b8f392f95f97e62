import { ref, watch, type Ref } from 'vue';

export type OriginalState = 'asleep' | 'loading' | 'shown' | 'missing';

/**
 * Fetches the original when somebody looks closer, and hands its address out only once it is decoded: the preview
 * stays until then, so nothing flashes. Another photo starts again.
 */
export function useOriginal(url: () => string | null, wanted: () => boolean): Ref<OriginalState> {
  const state = ref<OriginalState>('asleep');
  let asked: string | null = null;

  watch(
    [url, wanted] as const,
    async ([address, isWanted], before) => {
      if (before?.[0] !== address) {
        state.value = 'asleep';
        asked = null;
      }
      if (!isWanted || asked === (address ?? '')) return;
      asked = address ?? '';
      if (address === null) {
        state.value = 'missing';
        return;
      }
      state.value = 'loading';
      const image = new Image();
      image.src = address;
      const decoded = await image.decode().then(
        () => true,
        () => false,
      );
      if (url() === address) state.value = decoded ? 'shown' : 'missing';
    },
    { immediate: true },
  );

  return state;
}
