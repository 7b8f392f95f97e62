import request from 'supertest';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { deactivateAccount } from '../../server/services/deactivate-account';
import { aJobOn, browserOf, sha256 } from '../support/a-job-on';
import { strangers } from '../support/a-planning';
import type { JobOn } from '../support/a-job-on';
import { aJpeg } from '../support/images/make';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

let on: TestApp;
let [own, foreign]: JobOn[] = [];
beforeAll(async () => {
  on = await startTestApp();
  own = await aJobOn(on);
  foreign = await aJobOn(on, strangers());
});
afterAll(() => on.stop());

const clearance = 'hot-work-clearance';
const jobOf = (job: JobOn | undefined): JobOn => {
  if (!job) throw new Error('no job');
  return job;
};

describe('somebody taken off a job', () => {
  it('reads, sends and finds nothing of it from that moment on', async () => {
    const job = await aJobOn(on);
    const sha = await job.upload('welder');
    const welder = await browserOf(on, 'welder');
    await welder.get(`/api/jobs/${job.id}/events`).expect(200);
    const { id } = on.person('welder');
    await job.do('coordinator', 'remove-person', { accountId: id, role: 'welder', reason: 'Sent elsewhere' });
    for (const path of ['', '/events', '/events?after=0', `/files/${sha}`])
      await welder.get(`/api/jobs/${job.id}${path}`).expect(404);
    const bytes = aJpeg(77, 33);
    const put = welder.put(`/api/jobs/${job.id}/files/${sha256(bytes)}`).set('Content-Type', 'image/jpeg');
    expect((await put.send(bytes)).status).toBe(404);
    expect((await job.send('welder', 'stop-work', { reason: 'Out of spite' })).status).toBe(404);
    const list = await welder.get('/api/jobs').expect(200);
    expect(JSON.stringify(list.body)).not.toContain(job.id);
    await job.do('companyRep', 'call-off', { reason: 'The well was plugged', ...job.signingJob() });
    await welder.get(`/api/packets/${job.id}`).expect(404);
    await welder.get(`/api/packets/${job.id}/files/${sha}`).expect(404);
  });

  it('is no longer named as the one who measured', async () => {
    const entry = { field: 'gas.cellar.co', typed: '1', unit: 'ppm' };
    const stranger = { accountId: on.person('secondToolPusher').id, name: 'Somebody' };
    const body = { point: clearance, entries: [{ ...entry, measuredBy: stranger }] };
    const answer = await jobOf(own).send('welder', 'record', body);
    expect([answer.status, answer.body.refusal?.code]).toEqual([422, 'measurer-not-on-job']);
  });
});

describe('a role taken from an account', () => {
  it('ends what it allowed in sessions that are open', async () => {
    const agent = await on.agentFor('secondCompanyRep');
    const { id } = on.person('secondCompanyRep');
    await agent.get(`/api/jobs/${foreign?.id}`).expect(200);
    await on.deps.dataSource.query('DELETE FROM account_roles WHERE account_id = ?', [id]);
    await agent.get(`/api/jobs/${foreign?.id}`).expect(404);
    await agent.get('/api/desk').expect(403);
    await agent.get('/api/packets').expect(403);
    await on.deps.dataSource.query("INSERT INTO account_roles VALUES (?, 'company_rep')", [id]);
  });
});

describe('an auditor', () => {
  it("reads no running job and no other operator's packet, by any address", async () => {
    const packet = await aJobOn(on, strangers());
    const sha = await packet.upload('secondWelder');
    await packet.do('secondCompanyRep', 'call-off', { reason: 'The well was plugged', ...packet.signingJob() });
    const auditor = await browserOf(on, 'auditor');
    for (const id of [own?.id, packet.id]) {
      for (const path of ['', '/events', '/events?after=0', `/files/${sha}`]) {
        await auditor.get(`/api/jobs/${id}${path}`).expect(404);
        await auditor.get(`/api/packets/${id}${path}`).expect(404);
      }
    }
    const list = await auditor.get('/api/packets?q=%25').expect(200);
    expect(list.body.packets).toEqual([]);
  });
});

describe('signs that mean something in a search', () => {
  it.each(['%25', '_', '%5C', '%25%25 a', "'%20OR%20''='"])('%s stand for themselves', async (q) => {
    const job = await aJobOn(on, { well: 'Plain 1' });
    await job.do('companyRep', 'call-off', { reason: 'The well was plugged', ...job.signingJob() });
    const answer = await (await browserOf(on, 'companyRep')).get(`/api/packets?q=${q}`).expect(200);
    expect(answer.body.packets).toEqual([]);
  });

  it.each(['Per%cent', 'Under_score', 'Back\\slash', "Quo'te", '🔥 well'])('and are found: %s', async (well) => {
    const job = await aJobOn(on, { well });
    await job.do('companyRep', 'call-off', { reason: 'The well was plugged', ...job.signingJob() });
    const answer = await (await browserOf(on, 'companyRep')).get('/api/packets').query({ q: well }).expect(200);
    expect(answer.body.packets.map((one: { id: string }) => one.id)).toEqual([job.id]);
  });
});

describe('a file that is asked for', () => {
  it('in parts, without a body or under a false name tells nobody more', async () => {
    const sha = await jobOf(own).upload();
    const address = `/api/jobs/${own?.id}/files/${sha}`;
    const welder = await browserOf(on, 'welder');
    for (const range of ['bytes=0-0', 'bytes=5-1', 'bytes=-99999', 'lines=1-2', 'bytes=0-0,1-1,2-2']) {
      const answer = await welder.get(address).set('Range', range).buffer(true);
      expect([answer.status, answer.headers['content-range']]).toEqual([200, undefined]);
    }
    const stranger = await browserOf(on, 'secondToolPusher');
    for (const agent of [stranger, on.guest()]) {
      const head = await agent.head(address).set('If-None-Match', `"${sha}"`);
      expect([401, 404]).toContain(head.status);
      expect(head.headers['etag']).toBeUndefined();
      expect(head.headers['cache-control']).toBe('no-store');
    }
    await welder.get(`${address}%0d%0aX-Evil:%201`).expect(404);
    await welder.get(`${address}/..%2f..%2f..%2fetc%2fpasswd`).expect(404);
  });
});

describe('other methods', () => {
  it.each(['head', 'options', 'patch', 'delete', 'trace'] as const)(
    '%s changes nothing and fails nowhere',
    async (method) => {
      const welder = await browserOf(on, 'welder');
      for (const path of [
        '/api/session/',
        '/api/jobs',
        `/api/jobs/${own?.id}/commands`,
        '/api/nothing',
        '/',
        '/%00',
        '/..%2f..%2fpackage.json',
      ]) {
        if (method === 'delete' && path === '/api/session/') continue;
        const answer = await welder[method](path);
        expect(answer.status, `${method} ${path}`).toBeLessThan(500);
        expect(JSON.stringify(answer.headers)).not.toContain('access-control');
      }
      await welder.get('/api/session').expect(200);
    },
  );
});

describe('a session', () => {
  it('is never one that was brought along', async () => {
    const fixed = 's%3Aaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaa.bbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbbb';
    for (const cookie of [fixed, 's%3A', '%E0%A4%A', 'j%3A%7B%22a%22%3A1%7D', '__proto__', 'x'.repeat(6000)]) {
      const agent = request(on.app);
      expect((await agent.get('/api/session').set('Cookie', `headfast=${cookie}`)).status).toBe(401);
      const { email, password } = on.person('toolPusher');
      const answer = await agent.post('/api/session').set('Cookie', `headfast=${cookie}`).send({ email, password });
      expect(answer.status).toBe(200);
      const [given] = answer.headers['set-cookie'] as unknown as string[];
      expect(given).toMatch(/HttpOnly; SameSite=Strict/);
      expect(given?.split(';')[0]).not.toBe(`headfast=${cookie}`);
    }
  });

  it("of one person's device signs nobody else in when two sign in on it", async () => {
    const agent = await on.agentFor('toolPusher');
    const { email, password } = on.person('welder');
    await agent.post('/api/session').send({ email, password }).expect(200);
    expect((await agent.get('/api/session')).body.email).toBe(email);
    const devices = await (await on.agentFor('toolPusher')).get('/api/sessions').expect(200);
    expect(devices.body.devices.filter((one: { current: boolean }) => one.current)).toHaveLength(1);
  });
});

describe('a PIN', () => {
  it('is not tried more often from many sessions, jobs and addresses', async () => {
    const sessions = await Promise.all([1, 2, 3].map(() => on.agentFor('secondCompanyRep')));
    const job = jobOf(foreign);
    const statuses: number[] = [];
    for (let round = 0; round < 4; round += 1) {
      for (const agent of sessions) {
        const command = job.command('call-off', { reason: 'A guess', ...job.signingJob() }, v7());
        const answer = await agent
          .post(`/api/jobs/${job.id}/commands`)
          .set('X-Forwarded-For', `10.0.0.${round}`)
          .send({ command, signing: { pin: `12345${round}` } });
        statuses.push(answer.status);
      }
    }
    expect(statuses.filter((status) => status === 403).length).toBeLessThanOrEqual(7);
    expect(statuses.at(-1)).toBe(429);
    const { password } = on.person('secondCompanyRep');
    const change = await sessions[0]?.put('/api/account/pin').send({ password, pin: '640281' });
    expect(change?.status).toBe(429);
  });
});

// The last one: the account stays closed.
describe('an account that is closed', () => {
  it('does nothing more, in no session, whatever was under way', async () => {
    const agents = await Promise.all([on.agentFor('secondWelder'), on.agentFor('secondWelder')]);
    await deactivateAccount(on.deps, on.person('secondWelder').id);
    for (const agent of agents) {
      await agent.get('/api/session').expect(401);
      await agent.get(`/api/jobs/${foreign?.id}/events`).expect(401);
      await agent
        .post(`/api/jobs/${foreign?.id}/commands`)
        .send({ command: jobOf(foreign).command('stop-work', { reason: 'Gas' }) })
        .expect(401);
    }
  });
});
