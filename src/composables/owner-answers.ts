import { computed, toValue, type ComputedRef, type MaybeRefOrGetter, type Ref } from 'vue';
import type { Command } from '../../shared/contracts/commands';
import { namedDirection } from '../../shared/hold-points/named-direction';
import { ownerOf } from '../../shared/hold-points/points';
import { handIsIn } from '../../shared/job/decide-release';
import type { PointReview } from '../../shared/job/review';
import type { JobState, PointState } from '../../shared/job/state';
import type { TextParam } from '../../shared/locales/text';
import { useJobInHand, type Outcome } from './job-in-hand';
import { useSay } from './say';

/** A presented point before its owner, with the statements made so far. */
export interface PointToAnswer {
  readonly state: JobState;
  readonly point: PointState;
  readonly review: PointReview;
}

/** What an owner may answer to a presented point, whether Release stands ready, and if not, why. */
export interface OwnerAnswers {
  readonly owns: ComputedRef<boolean>;
  /** something outside waits for this person's concession */
  readonly mustConcede: ComputedRef<boolean>;
  readonly ready: ComputedRef<boolean>;
  readonly why: ComputedRef<string | undefined>;
  readonly direction: ComputedRef<TextParam>;
  readonly releaseLabel: ComputedRef<string>;
  release(): Command;
  sendBack(reason: string): Promise<Outcome>;
}

/**
 * The owner's three answers. Release stands ready only when nothing is outside that was not conceded, every statement
 * is made, work is not stopped and none of the evidence is by the owner's own hand.
 */
export function useOwnerAnswers(shown: MaybeRefOrGetter<PointToAnswer>, said: Ref<readonly string[]>): OwnerAnswers {
  const { say } = useSay();
  const hand = useJobInHand();
  const point = computed(() => toValue(shown).point);
  const review = computed(() => toValue(shown).review);
  const state = computed(() => toValue(shown).state);

  const waits = computed(() => point.value.status === 'presented');
  const owns = computed(() => hand.actor.value.roles.includes(ownerOf[point.value.place.kind]));
  const concedes = computed(() => hand.may('concede'));
  const ownHand = computed(() => handIsIn(review.value, point.value, hand.actor.value));
  const allSaid = computed(() => review.value.statements.every((one) => said.value.includes(one)));
  const direction = computed(() => namedDirection(review.value.context));
  const isValve = computed(() => point.value.place.kind === 'valve-orientation');

  const why = computed(() => {
    if (!waits.value) return undefined;
    if (ownHand.value) return say('job.point.review.ownEvidence');
    if (review.value.unconceded.length > 0)
      return say(concedes.value ? 'job.point.review.concedeFirst' : 'job.point.review.concedeByRep');
    return owns.value && !allSaid.value ? say('job.point.review.statementsFirst') : undefined;
  });
  const ready = computed(
    () =>
      waits.value &&
      owns.value &&
      why.value === undefined &&
      review.value.stops.length === 0 &&
      state.value.stopped === null,
  );

  return {
    owns,
    mustConcede: computed(() => waits.value && concedes.value && review.value.unconceded.length > 0 && !ownHand.value),
    ready,
    why,
    direction,
    releaseLabel: computed(() =>
      isValve.value && state.value.direction
        ? say('job.point.review.releaseFaces', { direction: direction.value })
        : say('job.point.review.release'),
    ),
    release: () =>
      hand.make('release', {
        point: point.value.place.id,
        ...hand.contentHash(point.value.place.id),
        statements: [...review.value.statements],
      }),
    sendBack: (reason) =>
      hand.record(
        hand.make('send-back', {
          point: point.value.place.id,
          reason,
          contentHash: point.value.presentation?.contentHash ?? '',
        }),
      ),
  };
}
