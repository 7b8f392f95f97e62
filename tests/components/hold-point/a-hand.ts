import { computed, defineComponent, h, shallowRef, type Component } from 'vue';
import type { Command, CommandOf, CommandType } from '../../../shared/contracts/commands';
import { decide } from '../../../shared/job/decide';
import type { JobActor } from '../../../shared/job/decision';
import type { JobState } from '../../../shared/job/state';
import { commandGrants } from '../../../shared/permissions/commands';
import type { SigningSecrets } from '../../../src/api/signing';
import { provideJobInHand, type JobInHand, type Outcome } from '../../../src/composables/job-in-hand';
import { timesOf } from '../../../shared/job/actor';
import { hash, idNumber, shown, type TestJob } from '../../support/a-job';
import { mountWithWords } from '../mount-with-words';

export interface HandOfTest extends JobInHand {
  recorded: Command[];
  signed: { command: Command; secrets: SigningSecrets }[];
  /** what the server answers to a signature */
  answer: Outcome;
}

/** A job in memory in the hands of one person: the rules are real, nothing is sent. */
export function aHand(job: TestJob, actor: JobActor): HandOfTest {
  const state = shallowRef<JobState | null>(job.state);
  let ids = 9000;
  const hand: HandOfTest = {
    id: job.id,
    recorded: [],
    signed: [],
    answer: { ok: true },
    state: computed(() => state.value),
    problem: computed(() => null),
    loading: computed(() => false),
    actor: computed(() => actor),
    waiting: computed(() => []),
    refused: computed(() => []),
    may: (type) => commandGrants[type].some((role) => actor.roles.includes(role)),
    make: <T extends CommandType>(type: T, body: CommandOf<T>['body']) =>
      ({
        id: idNumber(++ids),
        type,
        basedOn: null,
        clock: { deviceAt: new Date(job.now).toISOString(), offsetMs: 0, doubtMs: 100 },
        body,
      }) as unknown as CommandOf<T>,
    judge(command) {
      const decision = decide(state.value, command, actor, timesOf(command.clock, null), hash);
      return decision.ok ? null : decision.refusal;
    },
    async record(command) {
      const refusal = hand.judge(command);
      if (refusal !== null) return { ok: false, refusal, problem: null };
      hand.recorded.push(command);
      return { ok: true };
    },
    async sign(command, secrets) {
      hand.signed.push({ command, secrets });
      return hand.answer;
    },
    contentHash: () => ({ contentHash: '0'.repeat(64), shown }),
    refresh: async () => undefined,
  };
  return hand;
}

/** Mounts a component below a job in hand. */
export function mountInHand(component: Component, hand: JobInHand, props: Record<string, unknown>) {
  const frame = defineComponent({
    setup() {
      provideJobInHand(hand);
      return () => h(component, props);
    },
  });
  return mountWithWords(frame);
}
