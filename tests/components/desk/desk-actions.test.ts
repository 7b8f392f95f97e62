import { computed } from 'vue';
import { describe, expect, it } from 'vitest';
import DeskActions from '../../../src/components/desk/DeskActions.vue';
import type { OwnerAnswers } from '../../../src/composables/owner-answers';
import { mountWithWords } from '../mount-with-words';

const answers = (own: { owns?: boolean; mustConcede?: boolean; ready?: boolean; why?: string }) =>
  ({
    owns: computed(() => own.owns ?? true),
    mustConcede: computed(() => own.mustConcede ?? false),
    ready: computed(() => own.ready ?? false),
    why: computed(() => own.why),
    direction: computed(() => ''),
    releaseLabel: computed(() => 'Release'),
  }) as unknown as OwnerAnswers;

const buttons = (props: Record<string, unknown>) =>
  mountWithWords(DeskActions, props)
    .findAll('button')
    .map((one) => `${one.text()}${one.attributes('disabled') === undefined ? '' : ' (not yet)'}`);

describe('the answers on the desk', () => {
  it('hold Release back until what is outside has been conceded', () => {
    expect(
      buttons({ answers: answers({ mustConcede: true, why: 'What is outside has to be conceded.' }), unconceded: 2 }),
    ).toEqual(['Send back', 'Concede 2, with reasons', 'Release (not yet)']);
    expect(buttons({ answers: answers({ ready: true }), unconceded: 0 })).toEqual(['Send back', 'Release']);
  });

  it('leave a company representative only the concession on a tool pusher’s point', () => {
    expect(buttons({ answers: answers({ owns: false, mustConcede: true }), unconceded: 1 })).toEqual([
      'Concede it, with a reason',
    ]);
  });

  it('give a tool pusher no concession to make', () => {
    expect(
      buttons({ answers: answers({ why: 'The company representative has to concede first.' }), unconceded: 1 }),
    ).toEqual(['Send back', 'Release (not yet)']);
  });
});
