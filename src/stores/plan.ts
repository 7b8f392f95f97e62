import { defineStore } from 'pinia';
import { computed, ref, shallowRef, watch } from 'vue';
import { v7 } from 'uuid';
import type { Refusal } from '../../shared/job/refusal';
import { askCatalogue, askPlan, type Catalogue, type Planning } from '../api/jobs';
import type { Problem } from '../api/problem';
import { refusalIn } from '../offline/send-entry';
import { useClockStore } from './clock';
import { keepObject, keptObject, letGo } from './kept';
import { blankDraft, isDraft, type PlanDraft } from './planning/draft';
import { readDraft, type FormFault } from './planning/read-draft';
import { usePreferencesStore } from './preferences';
import { useSessionStore } from './session';

const place = (accountId: string) => `plan.${accountId}`;

/** The day at the site as an ISO date: calibration and qualification are held against it. */
const dayIn = (zone: string, now: Date): string => {
  const parts = { year: 'numeric', month: '2-digit', day: '2-digit' } as const;
  return new Intl.DateTimeFormat('en-CA', { ...parts, ...(zone === '' ? {} : { timeZone: zone }) }).format(now);
};

/** Whether an answer left open what the server did with the request: then the very same request is sent again. */
const unanswered = ({ status }: Problem): boolean => status === 0 || status === 401 || status === 429 || status >= 500;

/**
 * The job that a coordinator is planning. Every change is kept on the device, by person, until the job stands or the
 * draft is dropped. The same request goes out under the same number until the server has answered it.
 */
export const usePlanStore = defineStore('plan', () => {
  const session = useSessionStore();
  const clock = useClockStore();
  const preferences = usePreferencesStore();
  const catalogue = shallowRef<Catalogue>();
  const draft = ref<PlanDraft>(blankDraft(preferences.units));
  const problem = ref<Problem>();
  const refusal = shallowRef<Refusal | null>(null);
  const loading = ref(false);
  const sending = ref(false);
  /** somebody asked for the job: from now on what is missing is said at its field */
  const tried = ref(false);
  let owner: string | undefined;
  let open: Planning | undefined;

  const day = computed(() => dayIn(draft.value.zone, clock.correctedNow()));
  const read = computed(() =>
    catalogue.value === undefined ? undefined : readDraft(draft.value, catalogue.value, day.value),
  );
  const faults = computed<readonly FormFault[]>(() => read.value?.faults ?? []);
  const hasSeal = computed(() => (catalogue.value?.heads.find((one) => one.id === draft.value.headId)?.seals ?? 0) > 0);
  /** what keeps the job from being planned */
  const stops = computed(() => faults.value.filter(({ kind }) => kind !== 'hold' && kind !== 'advice'));
  const warnings = computed(() => faults.value.filter(({ kind }) => kind === 'hold' || kind === 'advice'));
  /** what a field has to say now */
  const at = (field: string): FormFault[] =>
    faults.value.filter((one) => one.field === field && (tried.value || one.kind !== 'missing'));

  watch(draft, (now) => owner !== undefined && keepObject(place(owner), now), { deep: true });

  async function begin(): Promise<void> {
    if (owner !== session.me?.id) {
      owner = session.me?.id;
      draft.value =
        (owner === undefined ? undefined : keptObject(place(owner), isDraft)) ?? blankDraft(preferences.units);
      tried.value = false;
      open = undefined;
    }
    problem.value = undefined;
    refusal.value = null;
    loading.value = true;
    const answer = await askCatalogue();
    loading.value = false;
    if (answer.ok) catalogue.value = answer.value;
    else problem.value = answer.problem;
  }

  function drop(): void {
    draft.value = blankDraft(preferences.units);
    tried.value = false;
    open = undefined;
    if (owner !== undefined) letGo(place(owner));
  }

  /** Asks for the job; answers its id once it stands. */
  async function plan(): Promise<string | undefined> {
    tried.value = true;
    problem.value = undefined;
    refusal.value = null;
    const asked = read.value?.planning;
    if (!asked || stops.value.length > 0 || sending.value) return undefined;
    const same = open !== undefined && JSON.stringify({ ...open, ...asked }) === JSON.stringify(open);
    open = same && open !== undefined ? open : { ...asked, commandId: v7(), clock: { ...clock.stamp() } };
    sending.value = true;
    const answer = await askPlan(open);
    sending.value = false;
    if (answer.ok) {
      drop();
      return answer.value.id;
    }
    problem.value = answer.problem;
    refusal.value = refusalIn(answer.problem);
    if (!unanswered(answer.problem)) open = undefined;
    return undefined;
  }

  return {
    catalogue,
    draft,
    day,
    read,
    faults,
    hasSeal,
    stops,
    warnings,
    at,
    problem,
    refusal,
    loading,
    sending,
    tried,
    begin,
    drop,
    plan,
  };
});
