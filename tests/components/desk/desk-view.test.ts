import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import DeskView from '../../../src/views/DeskView.vue';
import { aDeskEntry } from '../../support/a-summary';
import { mountPage, serverSays, signedInAs } from '../mount-with-ways';

const desk = (entries: unknown[]) => ({ 'GET /api/desk': { entries } });
const screen = (wide: boolean) =>
  vi.stubGlobal('matchMedia', () => ({ matches: wide, addEventListener: () => {}, removeEventListener: () => {} }));

beforeEach(() => vi.useFakeTimers({ now: new Date('2026-09-14T06:26:00.000Z'), toFake: ['Date'] }));
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

describe('the signing desk', () => {
  it('lists what waits in the server’s order, with the minutes and what is outside', async () => {
    screen(false);
    serverSays(
      desk([
        aDeskEntry({ well: 'Quarry Bend 7H', point: 'pass-2-inspected', hot: true, outside: 1 }),
        aDeskEntry({ jobId: '0190a000-0000-7000-8000-000000000002' }),
      ]),
    );
    const { wrapper } = await mountPage(DeskView, '/desk', signedInAs(['company_rep']).pinia);
    const [hot, other] = wrapper.findAll('.entry').map((one) => one.text().replaceAll('\u00a0', ' '));
    for (const said of ['Quarry Bend 7H', 'Pass 2 inspected', '26 min', 'Hot joint', '1 outside'])
      expect(hot).toContain(said);
    expect(other).toContain('Final cut');
    expect(wrapper.text()).toContain('2 wait for you');
  });

  it('leads from the list to the hold point’s page on a phone', async () => {
    screen(false);
    serverSays(desk([aDeskEntry()]));
    const { wrapper } = await mountPage(DeskView, '/desk', signedInAs(['company_rep']).pinia);
    expect(wrapper.get('.entry').attributes('href')).toBe('/jobs/0190a000-0000-7000-8000-000000000001/final-cut');
  });

  it('says whose release comes after a concession', async () => {
    screen(false);
    serverSays(desk([aDeskEntry({ point: 'valve-orientation', ownerRole: 'tool_pusher', turn: 'concede' })]));
    const { wrapper } = await mountPage(DeskView, '/desk', signedInAs(['company_rep']).pinia);
    expect(wrapper.get('.entry').text()).toContain('Waits for your concession; then the tool pusher releases');
  });

  it('says that nothing waits and where to look next', async () => {
    screen(true);
    serverSays(desk([]));
    const { wrapper } = await mountPage(DeskView, '/desk', signedInAs(['tool_pusher']).pinia);
    expect(wrapper.text()).toContain('Nothing waits for you.');
    expect(wrapper.findAll('.way').map((one) => one.attributes('href'))).toEqual(
      expect.arrayContaining(['/jobs', '/packets']),
    );
  });

  it('says when the server is not reached, and offers to try again', async () => {
    screen(true);
    serverSays({});
    const { wrapper } = await mountPage(DeskView, '/desk', signedInAs(['company_rep']).pinia);
    expect(wrapper.get('[role="alert"]').text()).toContain('Try again');
    expect(wrapper.text()).not.toContain('Nothing waits');
  });
});
