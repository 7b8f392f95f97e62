import { flushPromises } from '@vue/test-utils';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { defineComponent, h } from 'vue';
import SignDialog from '../../../src/components/job/SignDialog.vue';
import type { Outcome } from '../../../src/composables/job-in-hand';
import { useConnectionStore } from '../../../src/stores/connection';
import { aJob } from '../../support/a-job';
import { presentPoint, recordPoint } from '../../support/drive';
import { aHand, mountInHand } from './a-hand';

const pin = '269053';

/** The release of a presented point, in its owner's hands. */
function aRelease(answer: Outcome = { ok: true }, offline = false) {
  const job = aJob();
  recordPoint(job, 'hot-work-clearance');
  presentPoint(job, 'hot-work-clearance');
  const hand = aHand(job, job.person('company_rep'));
  hand.answer = answer;
  const done: string[] = [];
  const statements = ['cement-wait-over', 'float-holding', 'no-flow', 'casing-supported'];
  const page = defineComponent(() => {
    useConnectionStore().reached = !offline;
    return () =>
      h(SignDialog, {
        open: true,
        title: 'Release',
        meaning: 'release',
        confirm: 'Release',
        place: job.point('hot-work-clearance').place,
        command: () =>
          hand.make('release', { point: 'hot-work-clearance', ...job.signing('hot-work-clearance'), statements }),
        onSigned: () => done.push('signed'),
      });
  });
  const wrapper = mountInHand(page, hand, {});
  const sign = async () => {
    await wrapper.get('input[inputmode="none"]').setValue(pin);
    // The password is asked for when nothing is known of the session.
    const password = wrapper.find('input[type="password"]:not([inputmode])');
    if (password.exists()) await password.setValue('trailer light at midnight');
    await wrapper.get('form').trigger('submit');
    await flushPromises();
  };
  return { wrapper, hand, done, sign };
}

beforeEach(() => {
  vi.spyOn(HTMLDialogElement.prototype, 'showModal').mockImplementation(function (this: HTMLDialogElement) {
    this.open = true;
  });
});
afterEach(() => vi.restoreAllMocks());

describe('a signature', () => {
  it('says who signs and what it means before the PIN is asked', () => {
    const { wrapper } = aRelease();
    expect(wrapper.text()).toContain('O. Brandt, company representative');
    expect(wrapper.text()).toContain('I have looked at this hold point’s evidence and release it.');
  });

  it('sends the PIN beside the command and never in it', async () => {
    const { hand, done, sign } = aRelease();
    await sign();
    expect(hand.signed[0]?.secrets.pin).toBe(pin);
    expect(JSON.stringify(hand.signed[0]?.command)).not.toContain(pin);
    expect(done).toEqual(['signed']);
  });

  it('sends the same command again when no verdict came', async () => {
    const lost: Outcome = { ok: false, refusal: null, problem: { status: 0, code: 'no-signal', more: {} } };
    const { hand, done, sign } = aRelease(lost);
    await sign();
    hand.answer = { ok: true };
    await sign();
    expect(hand.signed[1]?.command).toEqual(hand.signed[0]?.command);
    expect(done).toEqual(['signed']);
  });

  it('says at the PIN that it was wrong, and keeps the dialog', async () => {
    const wrong: Outcome = { ok: false, refusal: null, problem: { status: 403, code: 'signing.pin-wrong', more: {} } };
    const { wrapper, done, sign } = aRelease(wrong);
    await sign();
    expect(wrapper.get('.complaint').text()).toContain('not the right PIN');
    expect(done).toEqual([]);
  });

  it('tells the loser of a race who was faster', async () => {
    const at = { device: '', corrected: '2026-09-14T08:03:00.000Z', received: null, doubtMs: 0 };
    const lost: Outcome = {
      ok: false,
      problem: null,
      refusal: {
        code: 'point-already-released',
        kind: 'conflict',
        text: { key: 'refusals.point-already-released' },
        since: { by: { accountId: 'x', name: 'N. Ekberg', role: 'company_rep' }, at },
        blockers: [],
        missing: [],
      },
    };
    const { wrapper, sign } = aRelease(lost);
    await sign();
    expect(wrapper.get('[role="alert"]').text()).toContain('By N. Ekberg, 14 Sep 2026');
  });

  it('says without a signal that it needs the server, and asks for no PIN', () => {
    const { wrapper } = aRelease({ ok: true }, true);
    expect(wrapper.text()).toContain('There is no signal.');
    expect(wrapper.find('input[inputmode="none"]').exists()).toBe(false);
  });
});
