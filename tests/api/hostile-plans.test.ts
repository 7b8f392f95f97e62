import { gzipSync } from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Planning } from '../../shared/contracts/jobs';
import { settingNames } from '../../shared/job/plan';
import { browserOf } from '../support/a-job-on';
import { aPlanning } from '../support/a-planning';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

let on: TestApp;
beforeAll(async () => {
  on = await startTestApp();
});
afterAll(() => on.stop());

const plan = async (body: unknown) => (await browserOf(on, 'coordinator')).post('/api/jobs').send(body as object);
const usual = (): Planning => aPlanning(on.clock());

describe('a plan with numbers near their limits', () => {
  it.each(['0', '-0', '-1', '0.000000001', '-999999999.999999999', '999999999.999999999', '000000001', '9.625'])(
    '%s is kept or refused, and the lists can still be read',
    async (value) => {
      const { terms } = usual();
      const named = { odIn: value, weightLbFt: value, grade: 'J55' };
      const strength = { collapsePsi: 1, internalYieldPsi: 100_000, source: 'Mill' };
      const changes: Partial<Planning>[] = [
        { casing: named },
        { casing: { ...named, wallIn: value, ...strength } },
        { casing: { ...named, odIn: '9.625', wallIn: '0.395', ...strength } },
        { casing: { ...named, odIn: '9.625', weightLbFt: '40', wallIn: value, ...strength } },
        { terms: { ...terms, targetHeightIn: value } },
        { terms: { ...terms, standOffIn: value } },
        ...settingNames.map((name) => ({ terms: { ...terms, ownSettings: { [name]: value } } })),
      ];
      for (const change of changes) {
        const answer = await plan({ ...usual(), ...change });
        expect([201, 422], `${JSON.stringify(change)} ${JSON.stringify(answer.body)}`).toContain(answer.status);
      }
      await (await browserOf(on, 'coordinator')).get('/api/jobs').expect(200);
      await (await browserOf(on, 'welder')).get('/api/jobs').expect(200);
    },
  );
});

describe('a plan', () => {
  it.each([
    ['zone', '+25:00'],
    ['zone', 'constructor'],
    ['zone', '../etc/localtime'],
    ['rateCardId', '1'],
    ['id', '01940000-0000-7000-8000-00000000dead'],
    ['people', []],
    ['well', '  '],
    ['casing', { odIn: '9.625', weightLbFt: '40', grade: 'constructor' }],
  ])('with %s as %o is refused', async (field, value) => {
    expect((await plan({ ...usual(), [field]: value })).status).toBe(422);
  });

  it('is asked for under ids in their one spelling', async () => {
    const capitals = '01940000-0000-7000-8000-0000000ABCDE';
    for (const field of ['commandId', 'operatorId', 'headId'])
      expect((await plan({ ...usual(), [field]: capitals })).status).toBe(422);
    const people = [...usual().people, { accountId: capitals, role: 'welder' }];
    const answer = await plan({ ...usual(), people });
    expect([answer.status, answer.body.fields[0].code]).toEqual([422, 'invalid-format']);
  });

  it.each(['gzip', 'deflate', 'br', 'nonsense'])('packed as %s grows no larger than any other', async (encoding) => {
    const packed = gzipSync(Buffer.alloc(40_000_000, ' '));
    const coordinator = await browserOf(on, 'coordinator');
    const answer = await coordinator
      .post('/api/jobs')
      .set({ 'Content-Type': 'application/json', 'Content-Encoding': encoding })
      .serialize((body: Buffer) => body as unknown as string)
      .send(packed);
    expect([400, 413, 415]).toContain(answer.status);
  });
});
