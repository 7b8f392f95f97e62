import { flushPromises } from '@vue/test-utils';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import NewJobView from '../../../src/views/NewJobView.vue';
import { aCatalogue, aDraft } from '../../support/a-catalogue';
import { mountPage, serverSays, signedInAs } from '../mount-with-ways';

const me = '0190a000-0000-7000-8000-00000000000a';
const catalogue = { 'GET /api/catalogue': aCatalogue() };
const keep = (draft: unknown) => localStorage.setItem(`headfast.plan.${me}`, JSON.stringify(draft));
const kept = () => localStorage.getItem(`headfast.plan.${me}`);
const open = () => mountPage(NewJobView, '/jobs/new', signedInAs(['coordinator'], me).pinia);

beforeEach(() => {
  localStorage.clear();
  Element.prototype.scrollIntoView = () => {};
  vi.useFakeTimers({ now: new Date('2026-09-14T06:26:00.000Z'), toFake: ['Date'] });
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

describe('planning a job', () => {
  it('lists what is missing on top when it is asked for, in the words of each field, and nothing before', async () => {
    serverSays(catalogue);
    const { wrapper } = await open();
    expect(wrapper.text()).not.toContain('Name the well.');
    await wrapper.get('form').trigger('submit');
    await flushPromises();
    expect(wrapper.get('.wrong[role="alert"]').text()).toContain('Name the well.');
    expect(wrapper.get('[data-field="well"] .error').text()).toBe('Name the well.');
  });

  it('keeps what was typed through a reload, by person', async () => {
    serverSays(catalogue);
    const { wrapper } = await open();
    await wrapper.get('[data-field="well"] input').setValue('Larkspur 5H');
    await flushPromises();
    wrapper.unmount();
    const again = await open();
    expect(again.wrapper.get<HTMLInputElement>('[data-field="well"] input').element.value).toBe('Larkspur 5H');
    const other = await mountPage(NewJobView, '/jobs/new', signedInAs(['coordinator'], `${me.slice(0, -1)}b`).pinia);
    expect(other.wrapper.get<HTMLInputElement>('[data-field="well"] input').element.value).toBe('');
  });

  it('shows beside the form what the plan comes to and what it will need', async () => {
    serverSays(catalogue);
    keep(aDraft({ pressure: '2200' }));
    const { wrapper } = await open();
    const beside = wrapper.get('aside').text().replaceAll('\u00a0', ' ');
    for (const said of [
      '14 in',
      '8 in below ground',
      '2056 psi',
      '80 % of the casing’s collapse 2570 psi',
      'Will need a concession',
    ])
      expect(beside).toContain(said);
    const atField = wrapper.get('[data-field="test.pressurePsi"] .faults').text().replaceAll('\u00a0', ' ');
    expect(atField).toContain('144 psi over 2056 psi');
  });

  it('goes to the job that it planned, and lets go of the draft', async () => {
    serverSays({
      ...catalogue,
      'POST /api/jobs': { id: '0190a000-0000-7000-8000-000000000077', seq: 1, replayed: false },
    });
    keep(aDraft());
    const { wrapper, router } = await open();
    await wrapper.get('form').trigger('submit');
    await flushPromises();
    expect(router.currentRoute.value.fullPath).toBe('/jobs/0190a000-0000-7000-8000-000000000077');
    expect(JSON.parse(kept() ?? '{}')).not.toHaveProperty('well', 'Tallgrass 14-2H');
  });

  it('sends the very same request again when no answer came', async () => {
    const bodies: string[] = [];
    serverSays(catalogue);
    const reach = fetch;
    vi.stubGlobal('fetch', (address: string, call: { method: string; body?: string }) => {
      if (call.method === 'POST') bodies.push(call.body ?? '');
      return (reach as unknown as (at: string, call: unknown) => Promise<Response>)(address, call);
    });
    keep(aDraft());
    const { wrapper } = await open();
    for (const minutes of [1, 2]) {
      await wrapper.get('form').trigger('submit');
      await flushPromises();
      vi.setSystemTime(new Date(`2026-09-14T06:3${minutes}:00.000Z`));
    }
    expect(wrapper.get('header [role="alert"]').text()).toContain('no connection');
    expect(bodies).toHaveLength(2);
    expect(bodies[0]).toBe(bodies[1]);
    await wrapper.get('[data-field="well"] input').setValue('Larkspur 5H');
    await wrapper.get('form').trigger('submit');
    await flushPromises();
    expect(JSON.parse(bodies[2] ?? '').commandId).not.toBe(JSON.parse(bodies[1] ?? '').commandId);
  });
});
