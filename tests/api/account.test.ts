import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

describe('the own account', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());
  beforeEach(() => test.database.app.query('DELETE FROM attempt_throttles'));

  it.each([
    ['fourteen chars', 'password.too-short'],
    ['x'.repeat(201), 'password.too-long'],
    ['passwordpassword', 'password.common'],
    ['Password1234Password', 'password.common'],
    ['ababababababababab', 'password.too-simple'],
    ['abcdefghijklmnopqrst', 'password.too-simple'],
    ['the truck of Calder is red', 'password.contains-you'],
  ])('refuses the password %s', async (next, code) => {
    const agent = await test.agentFor('welder');
    const { password } = test.person('welder');
    const response = await agent.put('/api/account/password').send({ current: password, next }).expect(422);
    expect(response.body.code).toBe(code);
  });

  it('changes a password only for somebody who knows the old one', async () => {
    const agent = await test.agentFor('welder');
    const answer = await agent
      .put('/api/account/password')
      .send({ current: 'not the password at all', next: 'nine bolts in a bucket' })
      .expect(403);
    expect(answer.body.code).toBe('password.wrong');
  });

  it('signs every other device out when the password changes, and keeps this one under a new id', async () => {
    const [phone, tablet] = [await test.agentFor('secondWelder'), await test.agentFor('secondWelder')];
    const { email, password } = test.person('secondWelder');
    const next = 'nine bolts in a bucket';
    const changed = await phone.put('/api/account/password').send({ current: password, next }).expect(204);
    expect(String(changed.headers['set-cookie'])).toMatch(/headfast=/);
    await phone.get('/api/session').expect(200);
    await tablet.get('/api/session').expect(401);
    await test.guest().post('/api/session').send({ email, password }).expect(401);
    await test.guest().post('/api/session').send({ email, password: next }).expect(200);
  });

  it.each([
    ['12a456', 'pin.not-digits'],
    ['83910', 'pin.too-short'],
    ['8391027465839', 'pin.too-long'],
    ['777777', 'pin.repeats'],
    ['272727', 'pin.repeats'],
    ['385385', 'pin.repeats'],
    ['345678', 'pin.sequence'],
    ['987654', 'pin.sequence'],
    ['890123', 'pin.sequence'],
  ])('refuses the PIN %s', async (pin, code) => {
    const agent = await test.agentFor('companyRep');
    const { password } = test.person('companyRep');
    const response = await agent.put('/api/account/pin').send({ password, pin }).expect(422);
    expect(response.body.code).toBe(code);
  });

  it('sets a PIN under the password', async () => {
    const agent = await test.agentFor('companyRep');
    const { password } = test.person('companyRep');
    await agent.put('/api/account/pin').send({ password: 'not the password at all', pin: '839102' }).expect(403);
    await agent.put('/api/account/pin').send({ password, pin: '839102' }).expect(204);
  });

  it('keeps language, units and theme', async () => {
    const agent = await test.agentFor('auditor');
    const wanted = { language: 'es', units: 'metric', theme: 'night' };
    await agent.put('/api/account/preferences').send(wanted).expect(200, wanted);
    const { body } = await agent.get('/api/session');
    expect(body.preferences).toEqual(wanted);
  });
});
