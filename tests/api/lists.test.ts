import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoOperators } from '../../server/demo/operators';
import type { DemoKey } from '../../server/demo/people';
import type { DeskEntry } from '../../shared/contracts/desk';
import type { JobSummary } from '../../shared/contracts/jobs';
import { aJobOn, browserOf } from '../support/a-job-on';
import type { JobOn } from '../support/a-job-on';
import { strangers } from '../support/a-planning';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';
import { minutes } from '../support/test-clock';

let on: TestApp;
beforeAll(async () => {
  on = await startTestApp();
});
afterAll(() => on.stop());

const read = async <T>(key: DemoKey, path: string): Promise<T> =>
  (await (await browserOf(on, key)).get(path).expect(200)).body as T;
const jobsOf = async (key: DemoKey, query = '') => (await read<{ jobs: JobSummary[] }>(key, `/api/jobs${query}`)).jobs;
const deskOf = async (key: DemoKey) => (await read<{ entries: DeskEntry[] }>(key, '/api/desk')).entries;

const quillback = { operatorId: demoOperators[1].id, rigId: demoOperators[1].rigs[0].id };

describe('the desk', () => {
  let [cold, coldLater, hot, pushers]: JobOn[] = [];
  beforeAll(async () => {
    hot = await (await aJobOn(on, { well: 'Hot 1H' })).walkTo('pass-1-inspected');
    cold = await aJobOn(on, { well: 'Cold 1H' });
    await (await cold.fill()).present();
    on.clock.advance(minutes(5));
    coldLater = await aJobOn(on, { well: 'Cold 2H' });
    await (await coldLater.fill()).present();
    await (await hot.fill()).present();
    pushers = await (await aJobOn(on, { well: 'Pusher 1H' })).walkTo('valve-orientation');
    await pushers.fill();
    const entries = [{ field: 'set.level.x', typed: '0.4', unit: 'deg', measuredBy: null }];
    await pushers.do('welder', 'record', { point: 'valve-orientation', entries });
    await pushers.present();
  });

  it('holds hot joints first, then the oldest, with what is outside', async () => {
    const entries = await deskOf('companyRep');
    expect(entries.map((one) => one.well)).toEqual(['Hot 1H', 'Cold 1H', 'Cold 2H', 'Pusher 1H']);
    expect(entries[0]).toMatchObject({
      jobId: hot?.id,
      point: 'pass-1-inspected',
      hot: true,
      presentedBy: 'W. Calder',
      outside: 0,
      turn: 'release',
    });
  });

  it("shows a tool pusher's point to the company representative as long as it waits for a concession", async () => {
    const mine = (await deskOf('companyRep')).find((one) => one.jobId === pushers?.id);
    expect(mine).toMatchObject({ turn: 'concede', ownerRole: 'tool_pusher', outside: 1, unconceded: 1 });
    const [only, ...others] = await deskOf('toolPusher');
    expect([only?.jobId, only?.turn, others]).toEqual([pushers?.id, 'release', []]);

    const [waiting] = (await jobsOf('welder')).filter((one) => one.id === pushers?.id);
    expect(waiting?.waitsFor).toBe('company_rep');
    const { limit, basis } = { limit: 'set.tilt', basis: [] as string[] };
    const verdict = pushers
      ?.point('valve-orientation')
      .presentation?.judged.verdicts.find((one) => one.limit === limit);
    const items = [{ limit, basis: verdict?.basis ?? basis, reason: 'Within what the stack takes' }];
    await pushers?.do('companyRep', 'concede', {
      point: 'valve-orientation',
      items,
      ...pushers.signing('valve-orientation'),
    });
    expect((await deskOf('companyRep')).some((one) => one.jobId === pushers?.id)).toBe(false);
    expect((await deskOf('toolPusher'))[0]).toMatchObject({ outside: 1, unconceded: 0 });
  });

  it('is empty again when everything is released', async () => {
    await cold?.release();
    expect((await deskOf('companyRep')).map((one) => one.well)).toEqual(['Hot 1H', 'Cold 2H']);
  });

  it('shows nobody what is on a job that he is not on', async () => {
    expect(await deskOf('secondToolPusher')).toEqual([]);
  });
});

describe('the list of jobs', () => {
  it('shows the newest movement first, and to each only his own', async () => {
    const strange = await aJobOn(on, { ...strangers(), well: 'Quillback 1' });
    on.clock.advance(minutes(1));
    const newest = await aJobOn(on, { well: 'Newest 1H' });
    expect((await jobsOf('coordinator'))[0]?.id).toBe(newest.id);
    expect((await jobsOf('secondToolPusher')).map((one) => one.id)).toEqual([strange.id]);
    expect((await jobsOf('welder')).map((one) => one.well)).not.toContain('Quillback 1');
    const coordinator = await browserOf(on, 'oneManFirm');
    expect(((await coordinator.get('/api/jobs')).body as { jobs: JobSummary[] }).jobs.map((one) => one.id)).toContain(
      strange.id,
    );
  });
});

describe('the list of packets', () => {
  it('pages through all of them once, newest first, and finds words in any order', async () => {
    const wells = Array.from({ length: 53 }, (_, index) => `Sealed ${index + 1}H`);
    for (const well of wells) {
      on.clock.advance(1000);
      const job = await aJobOn(on, { well });
      await job.do('companyRep', 'call-off', { reason: 'Never spudded', ...job.signingJob() });
    }
    type Page = { packets: JobSummary[]; next: string | null };
    const first = await read<Page>('auditor', '/api/packets');
    expect([first.packets.length, typeof first.next]).toEqual([50, 'string']);
    const second = await read<Page>('auditor', `/api/packets?after=${first.next}`);
    expect(second.next).toBeNull();
    expect([...first.packets, ...second.packets].map((one) => one.well)).toEqual([...wells].reverse());
    const found = await read<Page>('auditor', `/api/packets?q=${encodeURIComponent('53h  PRONGHORN')}`);
    expect(found.packets.map((one) => one.well)).toEqual(['Sealed 53H']);
    expect((await read<Page>('auditor', `/api/packets?q=${encodeURIComponent('%')}`)).packets).toEqual([]);
    expect((await read<Page>('secondToolPusher', '/api/packets')).packets).toEqual([]);
  });

  it('holds nothing of an operator that an auditor was not granted', async () => {
    const job = await aJobOn(on, { ...quillback, well: 'Quillback 9' });
    await job.do('companyRep', 'call-off', { reason: 'Never spudded', ...job.signingJob() });
    const { packets } = await read<{ packets: JobSummary[] }>('auditor', '/api/packets?q=quillback');
    expect(packets).toEqual([]);
    await (await browserOf(on, 'auditor')).get(`/api/packets/${job.id}`).expect(404);
    expect((await read<{ packets: JobSummary[] }>('companyRep', '/api/packets?q=quillback')).packets).toHaveLength(1);
  });
});
