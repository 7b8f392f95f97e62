import { inject, provide, ref, type InjectionKey, type Ref } from 'vue';

const wish: InjectionKey<Ref<boolean>> = Symbol('all three times');

/** Whether the reader wants device and received time beside the corrected one. The page provides it, each time asks. */
export function provideAllTimes(): Ref<boolean> {
  const all = ref(false);
  provide(wish, all);
  return all;
}

export function useAllTimes(): Ref<boolean> {
  return inject(wish, () => ref(false), true);
}
