import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

describe('the catalogue', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.stop());

  it('holds what a new job is made from', async () => {
    const agent = await test.agentFor('coordinator');
    const { body } = await agent.get('/api/catalogue').expect(200);
    const names = body.operators.map((operator: { name: string }) => operator.name);
    expect(names).toEqual(['Marrow Creek Resources', 'Quillback Ridge Operating']);
    expect(body.operators[0].rigs[0]).toMatchObject({ name: 'Pronghorn 7' });
    expect(body.heads.map((head: { seals: number }) => head.seals).toSorted()).toEqual([0, 1, 2]);
    expect(body.procedures).toHaveLength(2);
    const kinds = new Set(body.instruments.map((each: { kind: string }) => each.kind));
    expect([...kinds].toSorted()).toEqual(['gas-meter', 'gauge', 'level', 'pyrometer', 'recorder', 'tape']);
    const welder = body.people.find((each: { name: string }) => each.name === 'W. Calder');
    expect(welder).toMatchObject({ roles: ['welder'], qualifications: [{ process: 'SMAW' }] });
    expect(JSON.stringify(body)).not.toMatch(/@|argon2/);
  });

  it('adds up: face to shoulder and socket make the height of every head', async () => {
    const agent = await test.agentFor('welder');
    const { body } = await agent.get('/api/catalogue').expect(200);
    for (const head of body.heads) {
      expect(Number(head.faceToShoulderIn) + Number(head.socketDepthIn)).toBe(Number(head.overallHeightIn));
      expect(head.sealAboveBaseIn).toHaveLength(head.seals);
    }
  });

  it('shows its heads, and nothing else, to who may set one again', async () => {
    const agent = await test.agentFor('companyRep');
    const { body } = await agent.get('/api/heads').expect(200);
    expect(Object.keys(body)).toEqual(['heads']);
    const { body: whole } = await (await test.agentFor('coordinator')).get('/api/catalogue');
    expect(body.heads).toEqual(whole.heads);
  });

  it.each(['companyRep', 'toolPusher', 'auditor'] as const)('is not for the %s', async (key) => {
    const agent = await test.agentFor(key);
    await agent.get('/api/catalogue').expect(403);
  });
});
