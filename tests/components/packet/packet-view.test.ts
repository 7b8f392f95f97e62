import { flushPromises } from '@vue/test-utils';
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import type { WireEvent } from '../../../shared/contracts/jobs';
import PacketView from '../../../src/views/PacketView.vue';
import { packetServer } from '../../support/a-packet';
import { aCalledOffJob, aSealedJob } from '../../support/a-sealed-job';
import { mountAt } from './mount-packet';

type Mounted = Awaited<ReturnType<typeof mountAt>>;
const words = ({ page }: Mounted, selector: string): string =>
  (page.element.parentElement?.querySelector(selector)?.textContent ?? '').replaceAll('\u00a0', ' ');

describe('a sealed packet', () => {
  const job = aSealedJob();
  let packet: Mounted;
  beforeAll(async () => {
    packet = await mountAt(PacketView, `/packets/${job.id}`, packetServer(job));
  }, 120_000);
  afterAll(() => packet.page.unmount());

  it('recomputes chain and signatures in the page and says how much', () => {
    const check = words(packet, '.check');
    expect(check).toContain('The record holds together');
    expect(check).toMatch(new RegExp(`${job.events.length} events recomputed in this page in \\d+\\.\\d\\d s`));
    expect(check).toMatch(/\d+ signatures worked out anew: each is bound/);
    expect(check).toContain('The server’s own check agrees.');
  });

  it('reads its events page by page until the end', () => {
    const pages = packet.asked.filter((path) => path.includes('/events')).map((path) => path.split('?')[1]);
    expect(pages).toEqual(['after=0', 'after=100']);
  });

  it('shows what an outsider reads first, each with the way to it', () => {
    expect(words(packet, '.worth')).toContain('2 concessions');
    expect(words(packet, '.worth')).toContain('0 instruments out of date');
    const links = [...document.querySelectorAll('.worth a, .summary a, .parts a')].map((link) =>
      link.getAttribute('href'),
    );
    expect(links[0]).toBe('#final-cut');
    const ids = new Set([...document.querySelectorAll('[id]')].map((part) => `#${part.id}`));
    expect(links.filter((link) => !ids.has(link ?? ''))).toEqual([]);
  });

  it('tells a low cut with its concessions, their reasons, the reading before and the calculations', () => {
    const cut = words(packet, '#final-cut');
    expect(cut).toContain('Released by O. Brandt');
    expect(cut).toContain('Before it: 32 1⁄4 in, W. Calder');
    expect(cut).toContain('The stack has room for 7/64 in. Nothing more is cut.');
    expect(cut).toContain('I permit the use of what is outside its limit');
    expect(cut).toContain('cut-plane v1');
    expect(cut).toContain('Worked out anew: it is this content.');
  });

  it('shows superseded evidence folded and marked, and a late reading as late', () => {
    const old = document.querySelector<HTMLDetailsElement>('#seal-greased-and-checked details.superseded');
    expect(old?.open).toBe(false);
    expect(old?.textContent).toContain('Superseded: O. Brandt');
    expect(words(packet, '#valve-orientation')).toContain('Arrived after the release; counts for nothing');
  });

  it('shows terms beside their defaults and who changed them', () => {
    expect(words(packet, '#terms')).toContain('Target on the gauge, from30 %25 %this job');
    expect(words(packet, '#terms')).toContain('The programme asks for 30 to 70 % of full scale.');
  });

  it('tells stops, handovers and directions between the hold points', () => {
    const between = words(packet, '#between');
    expect(between).toContain('Work stopped. The crane swings over the cellar.');
    expect(between).toContain('Shift handed over to J. Ostrom.');
    expect(between).toContain('Valve direction named: mud tanks');
  });

  it('has nothing to comment with', () => {
    expect(document.querySelectorAll('textarea, input, select')).toHaveLength(0);
  });

  it('gives device and received time when they are asked for', async () => {
    expect(words(packet, '#final-cut')).not.toContain('device 2026-');
    document.querySelector<HTMLButtonElement>('[aria-pressed="false"]')?.click();
    await flushPromises();
    expect(words(packet, '#final-cut')).toContain('device 2026-09-14T');
    expect(words(packet, '#final-cut')).toContain('received 2026-09-14T');
  }, 60_000);
});

describe('a packet of a job that was called off', () => {
  const job = aCalledOffJob();
  let packet: Mounted;
  const open = async (change?: (events: WireEvent[]) => WireEvent[]): Promise<void> => {
    packet = await mountAt(PacketView, `/packets/${job.id}`, packetServer(job, change));
  };
  afterEach(() => packet.page.unmount());
  afterAll(() => vi.unstubAllGlobals());

  it('has the reason on top and says how far the work came', async () => {
    await open();
    expect(words(packet, '.worth')).toContain('called off');
    expect(words(packet, '#seal')).toContain('The cement did not hold');
    expect(words(packet, '.summary')).toContain('not reached');
  });

  it('names the first event that does not hold, and marks all from there', async () => {
    await open((events) => events.map((one) => (one.seq === 4 ? { ...one, body: { ...one.body, extra: 1 } } : one)));
    expect(words(packet, '.check')).toContain('The record does not hold together');
    expect(words(packet, '.check')).toContain(`First at event 4 of ${job.events.length}`);
    expect(words(packet, '.check')).toContain('The server’s own check says that all holds.');
    expect(document.querySelectorAll('#time-line tr.broken')).toHaveLength(job.events.length - 3);
  });

  it('sees that the end was cut off', async () => {
    await open((events) => events.slice(0, -1));
    expect(words(packet, '.check')).toContain('The end is missing');
  });

  it('shows the bare list when the events make no job', async () => {
    await open((events) => events.slice(1));
    expect(packet.page.text()).toContain('These events do not make a job.');
    expect(words(packet, '.check')).toContain('First at event 1');
  });

  it('recomputes the photos when asked, and names those that are not what was hashed', async () => {
    await open();
    const button = [...document.querySelectorAll('button')].find((one) => one.textContent?.includes('photos too'));
    button?.click();
    await vi.waitFor(() =>
      expect(words(packet, '.check')).toContain('1 file missing or not what was hashed: aaaaaaaa'),
    );
  });

  it('says that there is nothing to see for who may not see it', async () => {
    packet = await mountAt(PacketView, `/packets/${job.id}`, () => new Response('', { status: 404 }));
    expect(packet.page.text()).toContain('There is nothing here that you may see.');
  });
});
