import { computed, type ComputedRef } from 'vue';
import { useSay } from '../../composables/say';
import { usePlanStore } from '../../stores/plan';
import type { FormFault } from '../../stores/planning/read-draft';

/** What a field of the planning form says of itself: its name, that it is missing, and what the rules object to. */
export interface PlanField {
  readonly label: ComputedRef<string>;
  /** said in the field's own place: it is missing or not understood */
  readonly missing: ComputedRef<string | undefined>;
  /** said under it: the rules' sentences */
  readonly judged: ComputedRef<FormFault[]>;
}

export function usePlanField(name: () => string): PlanField {
  const store = usePlanStore();
  const { say } = useSay();
  const all = computed(() => store.at(name()));
  return {
    label: computed(() => say(`plan.fields.${name()}`)),
    missing: computed(() => {
      const fault = all.value.find(({ kind }) => kind === 'missing' || kind === 'unread');
      return fault === undefined ? undefined : say(fault.text);
    }),
    judged: computed(() => all.value.filter(({ kind }) => kind !== 'missing' && kind !== 'unread')),
  };
}
