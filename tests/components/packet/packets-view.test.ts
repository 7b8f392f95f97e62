import { enableAutoUnmount, flushPromises } from '@vue/test-utils';
import { afterEach, describe, expect, it, vi } from 'vitest';
import PacketsView from '../../../src/views/PacketsView.vue';
import { packetServer } from '../../support/a-packet';
import { aCalledOffJob } from '../../support/a-sealed-job';
import { mountAt } from './mount-packet';

enableAutoUnmount(afterEach);
afterEach(() => vi.unstubAllGlobals());
const serve = packetServer(aCalledOffJob());

describe('the list of packets', () => {
  it('shows well, rig, operator and how each job ended, on the site’s clock', async () => {
    const { page } = await mountAt(PacketsView, '/packets', serve);
    const row = page.find('.packet');
    expect(row.attributes('href')).toContain('/packets/');
    expect(row.text()).toContain('Tallgrass 14-2H');
    expect(row.text()).toContain('Called off');
    expect(row.text()).toMatch(/14 Sep 2026 \d\d:\d\d/);
    expect(row.text()).toContain('2 concessions, 1 reopened');
  });

  it('keeps the search in the address and asks the server with it', async () => {
    const { page, router, asked } = await mountAt(PacketsView, '/packets?q=tall', serve);
    expect(page.find('input').element.value).toBe('tall');
    expect(asked).toEqual(['/api/packets?q=tall']);
    await page.find('input').setValue('grass');
    await page.find('form').trigger('submit');
    await flushPromises();
    expect(router.currentRoute.value.query).toEqual({ q: 'grass' });
    expect(asked.at(-1)).toBe('/api/packets?q=grass');
  });

  it('goes on from where the page before ended', async () => {
    const { page, asked } = await mountAt(PacketsView, '/packets', serve);
    const more = page.findAll('button').find((button) => button.text() === 'More');
    await more?.trigger('click');
    await flushPromises();
    expect(asked.at(-1)).toBe('/api/packets?after=page-2');
    expect(page.findAll('.packet')).toHaveLength(2);
    expect(page.text()).not.toContain('More');
  });

  it('says when no packet has the words, and how to go on', async () => {
    const { page } = await mountAt(PacketsView, '/packets?q=nowhere', serve);
    expect(page.text()).toContain('No packet has all of these words.');
    expect(page.text()).toContain('Clear the search');
  });

  it('says why when it cannot be read, and offers to try again', async () => {
    const { page } = await mountAt(PacketsView, '/packets', () => new Response('', { status: 503 }));
    expect(page.find('[role="alert"]').text()).toContain('The server is busy or restarting.');
    expect(page.text()).toContain('Try again');
  });
});
