import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CatalogueItem } from '../../server/entities/catalogue-item';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

describe('answers that are not a success', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());

  const expectProblem = (
    response: { status: number; headers: Record<string, unknown>; body: unknown },
    status: number,
    code: string,
  ) => {
    expect(response.status).toBe(status);
    expect(response.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(response.body).toMatchObject({ type: `urn:headfast:problem:${code}`, status, code });
    const { detail, title } = response.body as { detail: string; title: string };
    expect(detail).not.toContain('errors.');
    expect(title.length).toBeGreaterThan(0);
    expect(JSON.stringify(response.body)).not.toMatch(/node_modules|\.ts|\.js|SELECT|at \w+ \(/);
  };
  const post = () => test.guest().post('/api/session').set('Content-Type', 'application/json');
  const nested = (depth: number) => `${'{"a":'.repeat(depth)}1${'}'.repeat(depth)}`;

  it('401 without a session', async () => {
    expectProblem(await test.guest().get('/api/session'), 401, 'session.needed');
  });

  it('403 for a role without the permission', async () => {
    const agent = await test.agentFor('auditor');
    expectProblem(await agent.get('/api/catalogue'), 403, 'permission.forbidden');
  });

  it('404 for an address that is none', async () => {
    expectProblem(await test.guest().get('/api/nothing-here'), 404, 'request.unknown-route');
    expectProblem(await test.guest().get('/nothing.png'), 404, 'request.unknown-route');
  });

  it('405 with the methods that there are', async () => {
    const response = await test.guest().put('/api/session').send({});
    expectProblem(response, 405, 'request.wrong-method');
    expect(response.headers['allow']).toBe('POST, GET, DELETE');
  });

  it('400 for JSON that is none', async () => {
    expectProblem(await post().send('{"email":'), 400, 'request.malformed');
  });

  it('400 for an address that cannot be decoded', async () => {
    expectProblem(await test.guest().get('/api/%E0%A4%A'), 404, 'request.unknown-route');
  });

  it('400 for JSON that is nested too deep or reaches for a prototype', async () => {
    expectProblem(await post().send(nested(40)), 400, 'request.too-deep');
    expectProblem(await post().send(nested(30_000)), 400, 'request.too-deep');
    expectProblem(await post().send('{"__proto__":{"roles":["coordinator"]}}'), 400, 'request.too-deep');
  });

  it('413 for more than 256 kB', async () => {
    expectProblem(await post().send(JSON.stringify({ email: 'x'.repeat(270_000) })), 413, 'request.too-large');
  });

  it('415 for another type than JSON', async () => {
    const response = await test.guest().post('/api/session').type('form').send('email=a&password=b');
    expectProblem(response, 415, 'request.wrong-type');
  });

  it('422 naming the fields that were not understood', async () => {
    const response = await test.guest().post('/api/session').send({ email: 5, extra: true });
    expectProblem(response, 422, 'request.invalid');
    expect(response.body.fields).toEqual([
      expect.objectContaining({ path: 'body.email', code: 'invalid-type' }),
      expect.objectContaining({ path: 'body.password', code: 'missing' }),
      expect.objectContaining({ path: 'body', code: 'unrecognized-keys' }),
    ]);
    expectProblem(await test.guest().post('/api/session'), 422, 'request.invalid');
  });

  it('500 without a word of what broke, which stands in the log', async () => {
    const agent = await test.agentFor('coordinator');
    const items = test.database.app.getRepository(CatalogueItem);
    const { id, body } = await items.findOneByOrFail({ kind: 'head' });
    await items.update({ id }, { body: 'not what it should be' });
    const response = await agent.get('/api/catalogue');
    await items.update({ id }, { body });
    expectProblem(response, 500, 'server.failed');
    expect(test.logged.join()).toContain('SyntaxError');
  });

  it('a log without passwords, cookies and query strings', async () => {
    const agent = await test.agentFor('welder');
    await agent.get('/api/clock?token=tell-nobody').expect(200);
    const lines = test.logged.join();
    expect(lines).toContain('"path":"/api/clock"');
    expect(lines).toContain(test.person('welder').id);
    expect(lines).not.toContain('tell-nobody');
    expect(lines).not.toContain(test.person('welder').password);
    expect(lines).not.toMatch(/cookie|headfast=/i);
  });
});
