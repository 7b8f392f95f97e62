import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { SessionRow } from '../../server/entities/session-row';
import { deactivateAccount } from '../../server/services/deactivate-account';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';
import { hours, minutes } from '../support/test-clock';

describe('signing in', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());
  beforeEach(() => test.database.app.query('DELETE FROM attempt_throttles'));

  const attempt = (email: string, password: string) => test.guest().post('/api/session').send({ email, password });
  const cookieOf = (response: { headers: Record<string, unknown> }) =>
    String((response.headers['set-cookie'] as string[] | undefined)?.[0] ?? '');

  it('answers who signed in, with roles, preferences and how long the PIN alone will do', async () => {
    const { email, password, id, name } = test.person('welder');
    const response = await attempt(email.toUpperCase(), password).expect(200);
    expect(response.body).toMatchObject({
      id,
      name,
      email,
      roles: ['welder'],
      hasPin: true,
      preferences: { language: 'en', units: 'imperial', theme: 'system' },
      passwordAt: test.clock().toISOString(),
      signingFreshUntil: new Date(test.clock().getTime() + hours(12)).toISOString(),
    });
    expect(JSON.stringify(response.body)).not.toContain('argon2');
  });

  it('gives the cookie to this host only, out of reach of scripts and of other sites', async () => {
    const { email, password } = test.person('welder');
    const cookie = cookieOf(await attempt(email, password));
    expect(cookie).toMatch(/^headfast=/);
    expect(cookie).toMatch(/HttpOnly/);
    expect(cookie).toMatch(/SameSite=Strict/);
    expect(cookie).toMatch(/Path=\//);
    expect(cookie).not.toMatch(/Domain/);
  });

  it('answers a wrong password and an unknown address with the same words', async () => {
    const wrong = await attempt(test.person('welder').email, 'not the password at all').expect(401);
    const unknown = await attempt('nobody@headfast.example', 'not the password at all').expect(401);
    const withoutId = ({ instance: _instance, ...rest }: Record<string, unknown>) => rest;
    expect(withoutId(unknown.body)).toEqual(withoutId(wrong.body));
    expect(wrong.body.code).toBe('sign-in.refused');
    expect(cookieOf(wrong)).toBe('');
  });

  it('takes as long for an unknown address as for a known one', async () => {
    const timed = async (email: string) => {
      const began = performance.now();
      await attempt(email, 'not the password at all').expect(401);
      return performance.now() - began;
    };
    const known: number[] = [];
    const unknown: number[] = [];
    for (let round = 0; round < 7; round += 1) {
      await test.database.app.query('DELETE FROM attempt_throttles');
      known.push(await timed(test.person('welder').email));
      unknown.push(await timed(`nobody${round}@headfast.example`));
    }
    const median = (all: number[]) => all.toSorted((a, b) => a - b)[3] ?? 0;
    expect(median(unknown) / median(known)).toBeGreaterThan(0.5);
  });

  it('locks an address after five failures in a row, longer each time, and opens again by itself', async () => {
    const { email, password } = test.person('auditor');
    for (let time = 0; time < 6; time += 1) await attempt(email, 'not the password at all').expect(401);
    const locked = await attempt(email, password).expect(429);
    expect(locked.body).toMatchObject({ code: 'sign-in.locked', params: { seconds: 30 } });
    expect(locked.headers['retry-after']).toBe('30');
    test.clock.advance(31_000);
    await attempt(email, 'not the password at all').expect(401);
    const longer = await attempt(email, password).expect(429);
    expect(Number(longer.headers['retry-after'])).toBe(60);
    test.clock.advance(minutes(2));
    await attempt(email, password).expect(200);
    await attempt(email, 'not the password at all').expect(401);
  });

  it('locks an address that nobody has in the same way', async () => {
    const ghost = () => attempt('ghost@headfast.example', 'not the password at all');
    for (let time = 0; time < 6; time += 1) await ghost().expect(401);
    await ghost().expect(429);
  });

  it('counts thirty tries at once as thirty', async () => {
    const { email } = test.person('secondToolPusher');
    const answers = await Promise.all(Array.from({ length: 30 }, () => attempt(email, 'not the password at all')));
    expect(answers.filter((answer) => answer.status === 401)).toHaveLength(6);
    expect(answers.filter((answer) => answer.status === 429)).toHaveLength(24);
  });

  it('locks a place on the network that tries many accounts', async () => {
    for (let time = 0; time < 31; time += 1) await attempt(`${time}@headfast.example`, 'not the password at all');
    const { email, password } = test.person('welder');
    await attempt(email, password).expect(429);
  });

  it('takes another session id at every sign-in', async () => {
    const { email, password } = test.person('companyRep');
    const agent = test.guest();
    const first = cookieOf(await agent.post('/api/session').send({ email, password }).expect(200));
    const second = cookieOf(await agent.post('/api/session').send({ email, password }).expect(200));
    expect(second).not.toBe(first);
    await test
      .guest()
      .get('/api/session')
      .set('Cookie', first.split(';')[0] ?? '')
      .expect(401);
    await test
      .guest()
      .get('/api/session')
      .set('Cookie', second.split(';')[0] ?? '')
      .expect(200);
  });

  it('keeps no usable session id in the database', async () => {
    const { email, password } = test.person('companyRep');
    const cookie = decodeURIComponent(cookieOf(await attempt(email, password)).split('=')[1] ?? '');
    const sid = cookie.slice(2).split('.')[0] ?? '';
    const rows = await test.database.app.getRepository(SessionRow).find();
    expect(sid.length).toBeGreaterThan(20);
    expect(JSON.stringify(rows)).not.toContain(sid);
  });

  it('ends the session on the server when somebody signs out', async () => {
    const { email, password } = test.person('toolPusher');
    const agent = test.guest();
    const cookie = cookieOf(await agent.post('/api/session').send({ email, password })).split(';')[0] ?? '';
    await agent.delete('/api/session').expect(204);
    await agent.get('/api/session').expect(401);
    await test.guest().get('/api/session').set('Cookie', cookie).expect(401);
  });

  it('lists the devices and signs out on all of them', async () => {
    await test.database.app.query('DELETE FROM sessions');
    const phone = await test.agentFor('secondWelder');
    const tablet = await test.agentFor('secondWelder');
    const { body } = await phone.get('/api/sessions').expect(200);
    expect(body.devices).toHaveLength(2);
    expect(body.devices.filter((device: { current: boolean }) => device.current)).toHaveLength(1);
    await phone.delete('/api/sessions').expect(204);
    await phone.get('/api/session').expect(401);
    await tablet.get('/api/session').expect(401);
  });

  it('ends a session that was idle for twelve hours, and none that was used', async () => {
    const idle = await test.agentFor('welder');
    const used = await test.agentFor('welder');
    test.clock.advance(hours(11));
    await used.get('/api/session').expect(200);
    test.clock.advance(hours(1) + 1);
    await idle.get('/api/session').expect(401);
    await used.get('/api/session').expect(200);
  });

  it('ends every session after seven days however much it is used', async () => {
    const agent = await test.agentFor('welder');
    for (let day = 0; day < 13; day += 1) {
      test.clock.advance(hours(11));
      await agent.get('/api/session').expect(200);
    }
    test.clock.advance(hours(168 - 13 * 11));
    await agent.get('/api/session').expect(401);
  });

  it('does not bring back a session that was ended while a request was under way', async () => {
    const agent = await test.agentFor('coordinator');
    const store = test.database.app.getRepository(SessionRow);
    const before = await store.count();
    await Promise.all([agent.delete('/api/sessions'), agent.get('/api/session'), agent.get('/api/clock')]);
    expect(await store.count()).toBeLessThan(before);
    await agent.get('/api/session').expect(401);
  });

  it('ends the sessions of an account that is deactivated and refuses it from then on', async () => {
    const { email, password, id } = test.person('oneManFirm');
    const agent = await test.agentFor('oneManFirm');
    await deactivateAccount(test.deps, id);
    await agent.get('/api/session').expect(401);
    const refused = await attempt(email, password).expect(401);
    expect(refused.body.code).toBe('sign-in.refused');
  });

  it('lists the demo accounts in demo mode', async () => {
    const { body } = await test.guest().get('/api/demo-accounts').expect(200);
    expect(body.accounts.map((each: { email: string }) => each.email)).toContain(test.person('welder').email);
  });
});

describe('outside demo mode', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp({ DEMO: '0', PUBLIC_ORIGIN: 'https://headfast.example', TRUST_PROXY: '1' });
  });
  afterAll(() => test.stop());

  it('refuses the demo accounts and lists none', async () => {
    const { email, password } = test.person('welder');
    await test.guest().post('/api/session').send({ email, password }).expect(401);
    const { body } = await test.guest().get('/api/demo-accounts').expect(200);
    expect(body.accounts).toEqual([]);
  });

  it('marks the cookie as secure and bound to the host behind https', async () => {
    await test.database.app.query('UPDATE accounts SET demo = 0');
    const { email, password } = test.person('welder');
    const response = await test
      .guest()
      .post('/api/session')
      .set('X-Forwarded-Proto', 'https')
      .send({ email, password })
      .expect(200);
    expect(String(response.headers['set-cookie'])).toMatch(/^__Host-headfast=.*Secure/);
    expect(response.headers['strict-transport-security']).toMatch(/max-age=31536000/);
  });
});
