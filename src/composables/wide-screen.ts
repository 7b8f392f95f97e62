import { onScopeDispose, ref, type Ref } from 'vue';

/** Whether there is room for two things side by side: a tablet held upright and everything larger. */
export function useWideScreen(query = '(min-width: 48em)'): Ref<boolean> {
  const media = matchMedia(query);
  const wide = ref(media.matches);
  const change = () => (wide.value = media.matches);
  media.addEventListener('change', change);
  onScopeDispose(() => media.removeEventListener('change', change));
  return wide;
}
