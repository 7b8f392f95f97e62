import { flushPromises } from '@vue/test-utils';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { defineComponent, h } from 'vue';
import { reviewPoint } from '../../../shared/job/review';
import EntryDialog from '../../../src/components/hold-point/EntryDialog.vue';
import { usePointWords } from '../../../src/composables/point-words';
import { aJob, type TestJob } from '../../support/a-job';
import { walkTo } from '../../support/drive';
import { aHand, mountInHand } from './a-hand';

/** The entry of one field at the height takeoff of an invented job, in the welder's hands. */
function anEntry(field: string, before: (job: TestJob) => void = () => undefined) {
  const job = aJob();
  walkTo(job, 'height-takeoff');
  before(job);
  const hand = aHand(job, job.person('welder'));
  const point = job.point('height-takeoff');
  const said: string[] = [];
  const page = defineComponent(() => {
    const words = usePointWords(point.place);
    const review = reviewPoint(job.job, point);
    return () => h(EntryDialog, { field, point, review, words, onRecorded: (key: string) => said.push(key) });
  });
  const wrapper = mountInHand(page, hand, {});
  const button = () => wrapper.get('button[type="submit"]');
  return { wrapper, hand, said, button, type: (text: string) => wrapper.get('input.control').setValue(text) };
}

beforeEach(() => {
  vi.spyOn(HTMLDialogElement.prototype, 'showModal').mockImplementation(function (this: HTMLDialogElement) {
    this.open = true;
  });
});
afterEach(() => vi.restoreAllMocks());

describe('the entry of a reading', () => {
  it('has nothing to record until something is typed that is understood', async () => {
    const { button, type } = anEntry('stub-top');
    expect(button().attributes('disabled')).toBeDefined();
    await type('3/0');
    expect(button().attributes('disabled')).toBeDefined();
    await type('2 1/2');
    expect(button().attributes('disabled')).toBeUndefined();
  });

  it('keeps what was typed, its unit and who measured', async () => {
    const { wrapper, hand, said, type } = anEntry('takeoff.first');
    await type('14 1/16');
    await wrapper.get('form').trigger('submit');
    await flushPromises();
    expect(hand.recorded[0]?.body).toEqual({
      point: 'height-takeoff',
      entries: [{ field: 'takeoff.first', typed: '14 1/16', unit: 'in', measuredBy: null }],
    });
    expect(said).toEqual(['takeoff.first']);
  });

  it('asks whether an unlikely number was typed right, and records it all the same', async () => {
    const { wrapper, hand, button, type } = anEntry('takeoff.first');
    await type('41');
    expect(wrapper.text()).toContain('Was it typed right?');
    expect(button().text()).toBe('It is right, record it');
    await wrapper.get('form').trigger('submit');
    await flushPromises();
    expect(hand.recorded).toHaveLength(1);
  });

  it('says the verdict while a name off the nameplate is typed', async () => {
    const { wrapper, type } = anEntry('nameplate.size');
    await type('13-5/8');
    expect(wrapper.find('[data-tone="outside"]').exists()).toBe(true);
    await type('11');
    expect(wrapper.find('[data-tone="within"]').exists()).toBe(true);
  });

  it('takes the second measurement from another hand, without showing the first figure', async () => {
    const { wrapper, hand, button, type } = anEntry('takeoff.second', (job) =>
      job.do(
        'record',
        {
          point: 'height-takeoff',
          entries: [{ field: 'takeoff.first', typed: '14 1/64', unit: 'in', measuredBy: null }],
        },
        job.person('welder'),
      ),
    );
    await type('14');
    expect(button().attributes('disabled')).toBeDefined();
    expect(wrapper.text()).not.toContain('14 1/64');
    const others = wrapper.findAll('input[type="radio"]').map((one) => (one.element as HTMLInputElement).value);
    expect(others).not.toContain('self');
    await wrapper.get(`input[value="${hand.state.value?.people[1]?.accountId}"]`).setValue(true);
    await wrapper.get('form').trigger('submit');
    await flushPromises();
    expect(hand.recorded[0]?.body).toMatchObject({ entries: [{ measuredBy: { name: 'J. Ostrom' } }] });
  });
});
