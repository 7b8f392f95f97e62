import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { allRoutes } from '../../shared/contracts';
import { aRelay } from '../support/a-relay';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

describe('health and description of the server', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());

  it('is up and ready', async () => {
    await test.guest().get('/healthz').expect(200, { status: 'up' });
    await test.guest().get('/readyz').expect(200, { status: 'ready' });
  });

  it('describes every route of the contracts', async () => {
    const { body } = await test.guest().get('/api/openapi.json').expect(200);
    expect(body.openapi).toBe('3.1.0');
    for (const route of allRoutes) expect(body.paths[route.path]?.[route.method], route.path).toBeDefined();
    expect(
      body.paths['/api/session'].post.requestBody.content['application/json'].schema.properties.email,
    ).toBeDefined();
  });

  it('has every route of the contracts in place', async () => {
    for (const route of allRoutes.filter((each) => each.permission !== 'public')) {
      const response = await test.guest()[route.method](route.path.replaceAll(/\{\w+\}/g, 'x'));
      expect(`${route.method} ${route.path} ${response.status}`).toBe(`${route.method} ${route.path} 401`);
    }
  });

  it('tells its time to somebody signed in', async () => {
    const agent = await test.agentFor('welder');
    await agent.get('/api/clock').expect(200, { now: test.clock().toISOString() });
  });

  it('stays up, asks to come again while the database is away, and recovers by itself', async () => {
    const relay = await aRelay(test.database.config.database.port);
    const away = await startTestApp({}, relay.port);
    const agent = await away.agentFor('welder');
    await relay.cut();
    await away.guest().get('/healthz').expect(200);
    const ready = await away.guest().get('/readyz').expect(503);
    expect(ready.headers['retry-after']).toBe('2');
    const answer = await agent.get('/api/session').expect(503);
    expect(answer.body.code).toBe('server.unavailable');
    expect(answer.headers['retry-after']).toBe('2');
    await relay.mend();
    await agent.get('/api/session').expect(200);
    await away.stop();
    await relay.cut();
  });
});
