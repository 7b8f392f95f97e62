import {
  computed,
  inject,
  onScopeDispose,
  provide,
  toValue,
  watch,
  type ComputedRef,
  type InjectionKey,
  type MaybeRefOrGetter,
} from 'vue';
import { v7 } from 'uuid';
import type { Command, CommandOf, CommandType, Shown } from '../../shared/contracts/commands';
import { contentHashOf, jobContentHashOf } from '../../shared/job/content';
import { decide } from '../../shared/job/decide';
import type { JobActor } from '../../shared/job/decision';
import { findPoint } from '../../shared/job/points';
import type { Refusal } from '../../shared/job/refusal';
import type { JobState } from '../../shared/job/state';
import type { Text } from '../../shared/locales/text';
import { rolesOnJob } from '../../shared/permissions/can';
import { commandGrants } from '../../shared/permissions/commands';
import { sendCommand } from '../api/job';
import type { Problem } from '../api/problem';
import type { SigningSecrets } from '../api/signing';
import { timesOf } from '../../shared/job/actor';
import { expectedState } from '../offline/expected-state';
import { hashText } from '../offline/hash-text';
import type { OutboxEntry } from '../offline/outbox-entry';
import { refusalIn } from '../offline/send-entry';
import { useClockStore } from '../stores/clock';
import { useConnectionStore } from '../stores/connection';
import { useJobsStore } from '../stores/jobs';
import { useOutboxStore } from '../stores/outbox';
import { usePreferencesStore } from '../stores/preferences';
import { useSessionStore } from '../stores/session';

/** What came of a command: done (or in line), refused by a rule, or not judged at all (no signal, wrong PIN, no room). */
export type Outcome = { ok: true } | { ok: false; refusal: Refusal | null; problem: Problem | null; says?: Text };

/** A job that somebody works on: what it is, what this person may do with it, and the two ways to write. */
export interface JobInHand {
  readonly id: string;
  readonly state: ComputedRef<JobState | null>;
  readonly problem: ComputedRef<Problem | null>;
  readonly loading: ComputedRef<boolean>;
  readonly actor: ComputedRef<JobActor>;
  readonly waiting: ComputedRef<OutboxEntry[]>;
  readonly refused: ComputedRef<OutboxEntry[]>;
  may(type: CommandType): boolean;
  make<T extends CommandType>(type: T, body: CommandOf<T>['body']): CommandOf<T>;
  /** what the rules say to a command before anything is sent; null when they let it pass */
  judge(command: Command): Refusal | null;
  /** decides here, then puts it in line with its files in front */
  record(command: Command, files?: readonly { sha256: string; bytes: Blob }[]): Promise<Outcome>;
  /** sends a signed command with its secrets beside it; needs the server */
  sign(command: Command, secrets: SigningSecrets): Promise<Outcome>;
  /** hash of what is on the screen: of a point, or of the whole job */
  contentHash(point?: string): { contentHash: string; shown: Shown };
  refresh(): Promise<void>;
}

const nobody: JobActor = { accountId: '', name: '', roles: [] };
const inHand: InjectionKey<JobInHand> = Symbol('job in hand');

/** Opens a job, keeps it fresh when the page is looked at again, and hands it to everything below. */
export function takeJobInHand(id: MaybeRefOrGetter<string>): JobInHand {
  const session = useSessionStore();
  const jobs = useJobsStore();
  const outbox = useOutboxStore();
  const clock = useClockStore();
  const connection = useConnectionStore();
  const preferences = usePreferencesStore();
  const jobId = computed(() => toValue(id));

  const actorIn = (state: JobState): JobActor => {
    const { actor } = session;
    if (actor === undefined) return nobody;
    const scope = { people: state.people, operatorId: state.plan.operator.id, status: state.status };
    return { accountId: actor.accountId, name: actor.name, roles: rolesOnJob(actor, scope) };
  };

  const known = computed(() => jobs.of(jobId.value));
  const mine = computed(() => outbox.entries.filter((entry) => entry.jobId === jobId.value));
  const state = computed(() => {
    const { confirmed } = known.value;
    return confirmed === null ? null : expectedState(confirmed, mine.value, actorIn);
  });
  const actor = computed(() => (state.value === null ? nobody : actorIn(state.value)));

  function judge(command: Command): Refusal | null {
    const decision = decide(state.value, command, actor.value, timesOf(command.clock, null), hashText);
    return decision.ok ? null : decision.refusal;
  }

  const shown = (): Shown => ({ language: preferences.language, units: preferences.units });

  function contentHash(point?: string): { contentHash: string; shown: Shown } {
    const job = state.value;
    const seen = shown();
    const at = job === null || point === undefined ? undefined : findPoint(job, point);
    if (job === null) return { contentHash: '', shown: seen };
    return {
      contentHash: at === undefined ? jobContentHashOf(job, seen, hashText) : contentHashOf(job, at, seen, hashText),
      shown: seen,
    };
  }

  async function sign(command: Command, secrets: SigningSecrets): Promise<Outcome> {
    if (!(await outbox.emptied(jobId.value)))
      return { ok: false, refusal: null, problem: null, says: { key: 'job.unsentFirst' } };
    const answer = await sendCommand(jobId.value, command, secrets);
    if (answer.ok) {
      jobs.take(jobId.value, answer.value.events);
      return { ok: true };
    }
    const rule = refusalIn(answer.problem);
    if (rule !== null) await jobs.refresh(jobId.value);
    return { ok: false, refusal: rule, problem: answer.problem };
  }

  const hand: JobInHand = {
    get id() {
      return jobId.value;
    },
    state,
    problem: computed(() => known.value.problem),
    loading: computed(() => known.value.loading),
    actor,
    waiting: computed(() => mine.value.filter((entry) => entry.state === 'waiting')),
    refused: computed(() => mine.value.filter((entry) => entry.state === 'refused')),
    may: (type) => commandGrants[type].some((role) => actor.value.roles.includes(role)) && state.value?.ended === null,
    make: <T extends CommandType>(type: T, body: CommandOf<T>['body']) =>
      ({
        id: v7(),
        type,
        basedOn: known.value.events.length || null,
        clock: { ...clock.stamp() },
        // A plain copy: what a form holds is watched, and what is watched cannot be put into the device's store.
        body: JSON.parse(JSON.stringify(body)),
      }) as unknown as CommandOf<T>,
    judge,
    async record(command, files = []) {
      const refused = judge(command);
      if (refused !== null) return { ok: false, refusal: refused, problem: null };
      const inFront = files.map((file) => ({ kind: 'file' as const, body: file }));
      try {
        await outbox.put(jobId.value, [...inFront, { kind: 'command', body: command }]);
      } catch (error) {
        // what cannot be copied is a fault of ours and must not pass for a full device
        if (error instanceof DOMException && error.name === 'DataCloneError') throw error;
        return { ok: false, refusal: null, problem: null, says: { key: 'refusals.device-full' } };
      }
      return { ok: true };
    },
    sign,
    contentHash,
    refresh: () => jobs.refresh(jobId.value),
  };

  function look(): void {
    if (document.visibilityState === 'visible') void hand.refresh();
  }
  document.addEventListener('visibilitychange', look);
  onScopeDispose(() => document.removeEventListener('visibilitychange', look));
  watch(
    () => connection.reached,
    (reached) => reached && look(),
  );
  watch(jobId, (one) => void jobs.open(one), { immediate: true });
  provideJobInHand(hand);
  return hand;
}

/** Hands a job to everything below. */
export function provideJobInHand(hand: JobInHand): void {
  provide(inHand, hand);
}

/** The job that the page above has in hand. */
export function useJobInHand(): JobInHand {
  const hand = inject(inHand);
  if (hand === undefined) throw new Error('no job in hand above this component');
  return hand;
}
