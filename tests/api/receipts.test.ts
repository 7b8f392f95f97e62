import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createApp } from '../../server/app';
import { openDataSource, makeDataSource } from '../../server/data-source';
import request from 'supertest';
import { aJobOn, browserOf } from '../support/a-job-on';
import { aPlanning } from '../support/a-planning';
import type { JobOn } from '../support/a-job-on';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';
import { hours } from '../support/test-clock';

let on: TestApp;
let job: JobOn;
beforeAll(async () => {
  on = await startTestApp();
  job = await aJobOn(on);
});
afterAll(() => on.stop());

const clearance = 'hot-work-clearance';
const air = (typed: string) => ({
  point: clearance,
  entries: [{ field: 'gas.cellar.co', typed, unit: 'ppm', measuredBy: null }],
});

interface Recorded {
  events: { seq: number; hash: string }[];
  seq: number;
  replayed: boolean;
}

describe('a command that is sent again', () => {
  it('five times at once, and again after a restart, leaves one event and one answer', async () => {
    const command = job.command('record', air('3'));
    const answers = await Promise.all(Array.from({ length: 5 }, () => job.post('welder', command)));
    expect(answers.map((answer) => answer.status)).toEqual([200, 200, 200, 200, 200]);
    const bodies = answers.map((answer) => answer.body as Recorded);
    expect(bodies.filter((body) => !body.replayed)).toHaveLength(1);
    expect(new Set(bodies.map((body) => JSON.stringify(body.events))).size).toBe(1);

    const dataSource = await openDataSource(makeDataSource(on.database.config));
    try {
      const agent = request.agent(createApp({ ...on.deps, dataSource }));
      const { email, password } = on.person('welder');
      await agent.post('/api/session').send({ email, password }).expect(200);
      const again = await agent.post(`/api/jobs/${job.id}/commands`).send({ command }).expect(200);
      expect(again.body).toEqual({ events: bodies[0]?.events, seq: bodies[0]?.seq, replayed: true });
    } finally {
      await dataSource.destroy();
    }
    await job.refresh();
    expect(job.state.site['gas.cellar.co']).toHaveLength(1);
  });

  it('with another body is refused as 422, and with another job too', async () => {
    const command = job.command('record', air('4'));
    await job.post('welder', command);
    const other = await job.post('welder', { ...job.command('record', air('5')), id: command.id });
    expect([other.status, other.body.code]).toEqual([422, 'command.id-reused']);
    const elsewhere = await (await aJobOn(on)).post('welder', command);
    expect([elsewhere.status, elsewhere.body.code]).toEqual([422, 'command.id-reused']);
  });

  it('by somebody else is a bare 409', async () => {
    const command = job.command('record', air('4'));
    await job.post('welder', command);
    const answer = await job.post('secondWelder', command);
    expect(answer.status).toBe(409);
    expect(Object.keys(answer.body as object).sort()).toEqual([
      'code',
      'detail',
      'instance',
      'status',
      'title',
      'type',
    ]);
    expect(answer.body.code).toBe('command.id-taken');
  });

  it('is answered from its receipt when its sender is not on the job any more', async () => {
    const own = await aJobOn(on);
    const command = own.command('record', air('1'));
    const first = await own.post('secondWelder', command);
    await own.do('coordinator', 'remove-person', {
      accountId: on.person('secondWelder').id,
      role: 'welder',
      reason: 'Sent to another job',
    });
    const again = await own.post('secondWelder', command);
    expect(again.status).toBe(200);
    expect((again.body as Recorded).events).toEqual((first.body as Recorded).events);
    expect((await own.send('secondWelder', 'record', air('2'))).status).toBe(404);
  });

  it('keeps its refusal when what stood in its way is gone', async () => {
    const own = await aJobOn(on);
    const entry = { field: 'gas.cellar.co', typed: 'plenty', unit: 'ppm', measuredBy: null };
    const command = own.command('record', { point: clearance, entries: [entry] });
    const present = own.command('present', { point: clearance, ...own.signing(clearance) });
    const [first, early] = [await own.post('welder', command), await own.post('welder', present)];
    expect([first.status, first.body.code, first.body.refusal.code]).toEqual([
      422,
      'command.blocked',
      'not-understood',
    ]);
    expect([early.status, early.body.refusal.code]).toEqual([422, 'not-complete']);
    await own.fill();
    const again = await own.post('welder', present);
    expect([again.status, again.body.refusal]).toEqual([422, early.body.refusal]);
  });

  it('needs no PIN for the answer that it got with one', async () => {
    const own = await aJobOn(on);
    await (await own.fill()).present();
    const command = own.command('release', own.releaseBody(clearance));
    expect((await own.post('companyRep', command)).status).toBe(200);
    const again = await own.post('companyRep', command, null);
    expect([again.status, (again.body as Recorded).replayed]).toEqual([200, true]);
  });
});

describe('the secrets of a signature', () => {
  it('are checked before anything is recorded, and a failure leaves no receipt', async () => {
    const own = await aJobOn(on);
    await (await own.fill()).present();
    const command = own.command('release', own.releaseBody(clearance));
    const wrong = await own.post('companyRep', command, { pin: '000000' });
    expect([wrong.status, wrong.body.code]).toEqual([403, 'signing.pin-wrong']);
    const without = await own.post('companyRep', command, null);
    expect(without.status).toBe(403);
    expect((await own.post('companyRep', command)).status).toBe(200);
  });

  it('stand in no table and in no line of the log', async () => {
    const { pin } = on.person('companyRep');
    const [{ receipts, events }] = (await on.deps.dataSource.query(
      `SELECT (SELECT COUNT(*) FROM command_receipts WHERE answer LIKE ?) AS receipts,
              (SELECT COUNT(*) FROM job_events WHERE body LIKE ?) AS events`,
      [`%${pin}%`, `%${pin}%`],
    )) as [{ receipts: string; events: string }];
    expect([Number(receipts), Number(events)]).toEqual([0, 0]);
    expect(on.logged.join('\n')).not.toContain(pin);
  });

  it('are not asked of somebody who may not sign at all', async () => {
    const body = { point: clearance, ...job.signing(clearance), statements: [] };
    expect((await job.send('welder', 'release', body, { signing: { pin: '000000' } })).status).toBe(403);
    expect((await job.send('secondToolPusher', 'release', body, { signing: { pin: '000000' } })).status).toBe(404);
  });
});

describe('planning', () => {
  it('five times at once gives one job', async () => {
    const coordinator = await browserOf(on, 'coordinator');
    const asked = aPlanning(on.clock());
    const answers = await Promise.all(Array.from({ length: 5 }, () => coordinator.post('/api/jobs').send(asked)));
    expect(answers.map((answer) => answer.status)).toEqual([201, 201, 201, 201, 201]);
    expect(new Set(answers.map((answer) => (answer.body as { id: string }).id)).size).toBe(1);
    const other = await coordinator.post('/api/jobs').send({ ...asked, well: 'Tallgrass 15-1H' });
    expect([other.status, other.body.code]).toEqual([422, 'command.id-reused']);
  });
});

describe('text that cannot be kept', () => {
  it('is refused in words', async () => {
    const body = JSON.stringify({ command: job.command('stop-work', { reason: 'Wind §' }, v7()) }).replace(
      '§',
      '\\ud800',
    );
    const agent = await browserOf(on, 'welder');
    const answer = await agent.post(`/api/jobs/${job.id}/commands`).set('Content-Type', 'application/json').send(body);
    expect([answer.status, answer.body.code]).toEqual([422, 'command.text-broken']);
  });
});

// The last one: a night passes, and whoever did nothing in it is signed out.
describe('signing through a long night', () => {
  it('takes password and PIN when the password lies twelve hours back, and after that the PIN alone', async () => {
    const own = await aJobOn(on);
    await own.fill();
    const rep = await browserOf(on, 'companyRep');
    for (let hour = 0; hour < 13; hour += 1) {
      on.clock.advance(hours(1));
      await rep.get('/api/session').expect(200);
    }
    const stop = own.command('stop-work', { reason: 'Long night' });
    await own.post('companyRep', stop);
    const { pin, password } = on.person('companyRep');
    const terms = () =>
      own.command('change-terms', { terms: own.state.plan.terms, reason: 'Read again', ...own.signingJob() });
    const command = terms();
    const alone = await own.post('companyRep', command, { pin });
    expect([alone.status, alone.body.code]).toEqual([403, 'signing.password-needed']);
    expect((await own.post('companyRep', command, { pin, password })).status).toBe(200);
    expect((await own.post('companyRep', terms(), { pin })).status).toBe(200);
  });
});
