import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

describe('what goes out with every answer', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());

  it('is a content security policy that lets scripts come from here alone', async () => {
    const { headers } = await test.guest().get('/healthz').expect(200);
    const policy = String(headers['content-security-policy']);
    const directives = Object.fromEntries(
      policy.split(';').map((each) => [each.trim().split(' ')[0], each.trim().split(' ').slice(1)]),
    );
    expect(directives['script-src']).toEqual(["'self'"]);
    expect(directives['script-src-attr']).toEqual(["'none'"]);
    expect(directives['default-src']).toEqual(["'self'"]);
    expect(directives['frame-ancestors']).toEqual(["'none'"]);
    expect(directives['object-src']).toEqual(["'none'"]);
    expect(policy).not.toContain('unsafe-eval');
    expect(policy).not.toContain('http:');
  });

  it('says nosniff, no referrer, no frame, and names no software', async () => {
    const { headers } = await test.guest().get('/api/session');
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['referrer-policy']).toBe('no-referrer');
    expect(headers['x-frame-options']).toBe('DENY');
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['cache-control']).toBe('no-store');
    expect(headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/);
  });
});

describe('writes from elsewhere', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());

  const attempt = (headers: Record<string, string>) =>
    test
      .guest()
      .post('/api/session')
      .set({ Host: '127.0.0.1:4180', ...headers })
      .send({ email: 'nobody@headfast.example', password: 'not the password at all' });

  it.each([
    [{ Origin: 'https://elsewhere.example' }],
    [{ Origin: 'http://127.0.0.1:9999' }],
    [{ Origin: 'null' }],
    [{ 'Sec-Fetch-Site': 'cross-site' }],
    [{ 'Sec-Fetch-Site': 'same-site' }],
    [{ Origin: 'http://127.0.0.1:4180', 'Sec-Fetch-Site': 'cross-site' }],
  ])('are refused: %o', async (headers) => {
    const response = await attempt(headers).expect(403);
    expect(response.body.code).toBe('request.cross-site');
  });

  it.each([
    [{}],
    [{ Origin: 'http://127.0.0.1:4180', 'Sec-Fetch-Site': 'same-origin' }],
    [{ 'Sec-Fetch-Site': 'none' }],
  ])('are none: %o', async (headers) => {
    await attempt(headers).expect(401);
  });

  it('are not taken under a name that is not of this machine', async () => {
    const response = await attempt({ Host: 'rebound.example' }).expect(400);
    expect(response.body.code).toBe('request.wrong-host');
  });

  it('do not keep a page of another site from linking here', async () => {
    await test.guest().get('/healthz').set({ 'Sec-Fetch-Site': 'cross-site' }).expect(200);
  });
});
