import { flushPromises } from '@vue/test-utils';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { firstPage } from '../../../src/router/first-page';
import JobsView from '../../../src/views/JobsView.vue';
import { aSummary } from '../../support/a-summary';
import { mountPage, serverSays, signedInAs } from '../mount-with-ways';

const list = (jobs: unknown[], next: string | null = null) => ({ 'GET /api/jobs': { jobs, next } });

beforeEach(() => {
  localStorage.clear();
  vi.useFakeTimers({ now: new Date('2026-09-14T06:26:00.000Z'), toFake: ['Date'] });
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

describe('the list of jobs', () => {
  it('says where a job stands, whose turn it is and since when', async () => {
    serverSays(list([aSummary()]));
    const { wrapper } = await mountPage(JobsView, '/jobs', signedInAs(['welder']).pinia);
    expect(wrapper.get('.job').attributes('href')).toBe('/jobs/0190a000-0000-7000-8000-000000000001');
    const words = wrapper.get('.job').text().replaceAll('\u00a0', ' ');
    for (const said of ['Tallgrass 14-2H', 'Pronghorn 7, Marrow Creek Resources', 'Final cut', 'Presented'])
      expect(words).toContain(said);
    expect(words).toContain('Waits for the company representative, 26 min');
  });

  it('says it plainly when it is the reader’s own turn', async () => {
    serverSays(list([aSummary()]));
    const { wrapper } = await mountPage(JobsView, '/jobs', signedInAs(['company_rep']).pinia);
    expect(wrapper.get('.job').text().replaceAll('\u00a0', ' ')).toContain('Waits for you, 26 min');
  });

  it('opens without a signal with what was read last, and says when that was', async () => {
    serverSays(list([aSummary()]));
    await mountPage(JobsView, '/jobs', signedInAs(['welder']).pinia);
    serverSays({});
    const { wrapper } = await mountPage(JobsView, '/jobs', signedInAs(['welder']).pinia);
    expect(wrapper.findAll('.job')).toHaveLength(1);
    expect(wrapper.text()).toContain('As read');
    expect(wrapper.get('[role="alert"]').text()).toContain('no connection');
  });

  it('shows nobody what another person read on this device', async () => {
    serverSays(list([aSummary()]));
    await mountPage(JobsView, '/jobs', signedInAs(['welder']).pinia);
    serverSays({});
    const { pinia } = signedInAs(['welder'], '0190a000-0000-7000-8000-00000000000b');
    const { wrapper } = await mountPage(JobsView, '/jobs', pinia);
    expect(wrapper.findAll('.job')).toHaveLength(0);
  });

  it('tells an empty list what to do, and offers a new job to who may plan one', async () => {
    serverSays(list([]));
    const guest = await mountPage(JobsView, '/jobs', signedInAs(['tool_pusher']).pinia);
    expect(guest.wrapper.text()).toContain('No job is planned or running.');
    expect(guest.wrapper.text()).not.toContain('New job');
    const office = await mountPage(JobsView, '/jobs', signedInAs(['coordinator']).pinia);
    expect(office.wrapper.text()).toContain('New job');
  });

  it('goes on to older jobs by the key that the page before gave', async () => {
    serverSays(list([aSummary()], 'older'));
    const { wrapper } = await mountPage(JobsView, '/jobs', signedInAs(['welder']).pinia);
    serverSays(list([aSummary({ id: '0190a000-0000-7000-8000-000000000002', well: 'Millrace 3' })]));
    await wrapper.findAll('button').at(-1)?.trigger('click');
    await flushPromises();
    expect(wrapper.findAll('h2').map((one) => one.text())).toEqual(['Tallgrass 14-2H', 'Millrace 3']);
  });
});

describe('the first page after sign-in', () => {
  const other = aSummary({ id: '0190a000-0000-7000-8000-000000000002' });

  it('is the one running job of a welder', async () => {
    serverSays(list([aSummary(), aSummary({ ...other, status: 'planned' })]));
    signedInAs(['welder']);
    expect(await firstPage()).toBe('/jobs/0190a000-0000-7000-8000-000000000001');
  });

  it('is the list when a welder has two running or none, and for the office', async () => {
    signedInAs(['welder']);
    for (const jobs of [[aSummary(), other], [aSummary({ status: 'planned' })], []]) {
      serverSays(list(jobs));
      expect(await firstPage()).toBe('/jobs');
    }
    serverSays(list([aSummary()]));
    signedInAs(['coordinator']);
    expect(await firstPage()).toBe('/jobs');
  });

  it('is the desk for who releases', async () => {
    serverSays({});
    signedInAs(['company_rep']);
    expect(await firstPage()).toBe('/desk');
  });
});
