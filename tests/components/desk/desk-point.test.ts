import { flushPromises, mount, RouterLinkStub } from '@vue/test-utils';
import { createPinia } from 'pinia';
import { afterEach, beforeAll, expect, it, vi } from 'vitest';
import { defineComponent, h, shallowRef } from 'vue';
import { reviewPoint } from '../../../shared/job/review';
import DeskPoint from '../../../src/components/desk/DeskPoint.vue';
import { provideJobInHand } from '../../../src/composables/job-in-hand';
import { aJob } from '../../support/a-job';
import { presentPoint, recordPoint } from '../../support/drive';
import { aHand } from '../hold-point/a-hand';

const point = 'hot-work-clearance';

/** Nothing is sent from here: the one who sends never gets his turn. */
beforeAll(() => Object.defineProperty(navigator, 'locks', { value: { request: async () => undefined } }));
afterEach(() => vi.restoreAllMocks());

it('takes the PIN pad away and says who withdrew what was about to be released', async () => {
  vi.spyOn(HTMLDialogElement.prototype, 'showModal').mockImplementation(function (this: HTMLDialogElement) {
    this.open = true;
  });
  const job = aJob();
  recordPoint(job, point);
  presentPoint(job, point);
  const state = shallowRef(job.state);
  const page = defineComponent(() => {
    provideJobInHand(aHand(job, job.person('company_rep')));
    return () => {
      if (state.value === null) return null;
      const shown = job.point(point);
      return h(DeskPoint, {
        state: state.value,
        point: shown,
        review: reviewPoint(state.value, shown),
        takesFocus: false,
      });
    };
  });
  const wrapper = mount(page, {
    global: { plugins: [createPinia()], stubs: { RouterLink: RouterLinkStub } },
    attachTo: document.body,
  });
  for (const box of wrapper.findAll('input[type="checkbox"]')) await box.setValue(true);
  await wrapper
    .findAll('button')
    .find((one) => one.text() === 'Release')
    ?.trigger('click');
  await flushPromises();
  expect(wrapper.findAll('dialog[open]')).toHaveLength(1);

  job.do('withdraw', { point, reason: null }, job.person('welder'));
  state.value = job.state;
  await flushPromises();
  expect(wrapper.findAll('dialog[open]')).toHaveLength(0);
  expect(wrapper.get('.gone').text()).toMatch(/Withdrawn by W\. Calder, \d\d \w+ \d{4}/);
  expect(document.activeElement).toBe(wrapper.get('h2').element);
});
