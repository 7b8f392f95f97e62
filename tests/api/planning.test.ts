import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CatalogueItem } from '../../server/entities/catalogue-item';
import { Account } from '../../server/entities/account';
import { AccountRole } from '../../server/entities/account-role';
import type { DemoKey } from '../../server/demo/people';
import type { Planning } from '../../shared/contracts/jobs';
import type { JobPlan } from '../../shared/job/plan';
import { aJobOn, browserOf, sha256 } from '../support/a-job-on';
import { aPlanning } from '../support/a-planning';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

let on: TestApp;
beforeAll(async () => {
  on = await startTestApp();
});
afterAll(() => on.stop());

const plan = async (own: Partial<Planning>) =>
  (await browserOf(on, 'coordinator')).post('/api/jobs').send(aPlanning(on.clock(), own));
const nobody = '01940000-0000-7000-8000-0000000000ff';

describe('a plan', () => {
  it("stands whole in the first event, filled from the server's own tables", async () => {
    const job = await aJobOn(on, { proposedDirection: 'pipe-racks' });
    const { plan: kept } = job.events[0]?.body as unknown as { plan: JobPlan };
    expect(kept.operator.name).toBe('Marrow Creek Resources');
    expect(kept.head).toMatchObject({ nominalSize: '11', seals: 1 });
    expect(kept.procedure.passes).toHaveLength(4);
    expect(kept.casing).toMatchObject({ wallIn: '0.395', collapsePsi: 2570, ownRow: false });
    expect(kept.people.find((one) => one.name === 'W. Calder')?.qualifications[0]?.process).toBe('SMAW');
    expect(kept.terms.settings.touchF).toEqual({ value: '120', source: 'common-practice' });
  });

  it("keeps the operator's own settings beside the defaults", async () => {
    const { terms } = aPlanning(on.clock());
    const job = await aJobOn(on, { terms: { ...terms, ownSettings: { touchF: '110' } } });
    expect(job.state.plan.terms.settings.touchF).toEqual({ value: '110', source: 'job' });
  });

  it("takes a casing of the coordinator's own, its bore and drift worked out", async () => {
    const job = await aJobOn(on, {
      casing: {
        odIn: '9.625',
        weightLbFt: '43.5',
        wallIn: '0.435',
        grade: 'L80',
        collapsePsi: 3810,
        internalYieldPsi: 6330,
        source: 'Mill sheet',
      },
    });
    expect(job.state.plan.casing).toMatchObject({ idIn: '8.755', driftIn: '8.59875', ownRow: true });
  });

  it.each<[string, Partial<Planning>, string, string]>([
    ['operator', { operatorId: nobody }, 'body.operatorId', 'unknown'],
    ['rig of another operator', { rigId: '01940000-0000-7000-8000-000000000202' }, 'body.rigId', 'unknown'],
    ['head', { headId: nobody }, 'body.headId', 'unknown'],
    ['procedure', { procedureId: nobody }, 'body.procedureId', 'unknown'],
    ['instrument', { instrumentIds: [nobody] }, 'body.instrumentIds.0', 'unknown'],
    ['casing', { casing: { odIn: '9.625', weightLbFt: '41', grade: 'J55' } }, 'body.casing', 'unknown'],
    ['zone', { zone: 'Prairie/Nowhere' }, 'body.zone', 'unknown'],
    ['person', { people: [{ accountId: nobody, role: 'welder' }] }, 'body.people.0', 'person-unknown'],
  ])('with an unknown %s is sent back with that field named', async (_what, own, path, code) => {
    const answer = await plan(own);
    expect([answer.status, answer.body.code]).toEqual([422, 'request.invalid']);
    expect(answer.body.fields).toContainEqual(expect.objectContaining({ path, code }));
  });

  it('that cannot work is refused with what stands in its way', async () => {
    const answer = await plan({ casing: { odIn: '13.375', weightLbFt: '68', grade: 'J55' } });
    expect([answer.status, answer.body.refusal.code]).toEqual([422, 'plan-not-workable']);
    expect(answer.body.refusal.blockers[0].limit).toBe('head-for-other-casing');
  });

  it('is not moved by a later change of the catalogue', async () => {
    const job = await aJobOn(on);
    const heads = on.deps.dataSource.getRepository(CatalogueItem);
    const head = await heads.findOneByOrFail({ id: job.state.plan.head.id });
    await heads.update(head.id, { body: JSON.stringify({ ...job.state.plan.head, faceToShoulderIn: '99' }) });
    const again = await (await browserOf(on, 'coordinator')).get(`/api/jobs/${job.id}/events`);
    expect(again.body.events[0].body.plan.head.faceToShoulderIn).toBe('14');
    await heads.update(head.id, { body: head.body });
  });
});

describe('putting somebody on a job', () => {
  const assign = async (accountId: string, role: 'welder' | 'company_rep' | 'tool_pusher') => {
    const job = await aJobOn(on, { people: aPlanning(on.clock()).people.slice(0, 5) });
    const claimed = {
      accountId,
      name: 'Somebody Else',
      role,
      qualifications: [{ process: 'GTAW', lastUsed: '2020-01-01' }],
    };
    return { job, answer: await job.send('coordinator', 'assign-person', { person: claimed }) };
  };
  const idOf = (key: DemoKey) => on.person(key).id;

  it('takes name and qualifications from the account, not from the caller', async () => {
    const { job, answer } = await assign(idOf('oneManFirm'), 'welder');
    expect(answer.status).toBe(200);
    expect(job.state.people.at(-1)).toMatchObject({ name: 'J. Tamblyn', qualifications: [{ process: 'SMAW' }] });
    expect(answer.body.events[0].body.person.name).toBe('J. Tamblyn');
  });

  it('is refused in a role that the account does not hold', async () => {
    const { answer } = await assign(idOf('companyRep'), 'welder');
    expect([answer.status, answer.body.code]).toEqual([422, 'command.person-without-role']);
  });

  it('is refused for an account that is closed', async () => {
    const accounts = on.deps.dataSource.getRepository(Account);
    await accounts.update(idOf('secondToolPusher'), { deactivatedAt: on.clock() });
    const { answer } = await assign(idOf('secondToolPusher'), 'tool_pusher');
    expect([answer.status, answer.body.code]).toEqual([422, 'command.person-unknown']);
    await accounts.update(idOf('secondToolPusher'), { deactivatedAt: null });
  });

  it('is refused for an account that is of the firm and a guest at once', async () => {
    const roles = on.deps.dataSource.getRepository(AccountRole);
    await roles.insert({ accountId: idOf('secondToolPusher'), role: 'welder' });
    const { answer } = await assign(idOf('secondToolPusher'), 'tool_pusher');
    expect([answer.status, answer.body.code]).toEqual([422, 'command.person-on-both-sides']);
    await roles.delete({ accountId: idOf('secondToolPusher'), role: 'welder' });
  });
});

describe('a photo', () => {
  it('is taken only from the one who sent the file to this job', async () => {
    const job = await aJobOn(on);
    const file = { previewSha256: null, width: 1, height: 1, takenAt: null, sha256: await job.upload('secondWelder') };
    const body = { point: 'hot-work-clearance', shot: 'meter-at-cellar', ...file };
    const command = job.command('add-photo', body);
    const early = await job.post('welder', command);
    expect([early.status, early.body.code]).toEqual([422, 'command.file-not-sent']);
    expect((await job.send('secondWelder', 'add-photo', body)).status).toBe(200);
    const elsewhere = await (await aJobOn(on)).send('secondWelder', 'add-photo', body);
    expect([elsewhere.status, elsewhere.body.code]).toEqual([422, 'command.file-not-sent']);
  });

  it('must have a preview from the same hand', async () => {
    const job = await aJobOn(on);
    const [sha256, previewSha256] = [await job.upload('welder'), await job.upload('secondWelder')];
    const body = {
      point: 'hot-work-clearance',
      shot: 'meter-at-cellar',
      sha256,
      previewSha256,
      width: 1,
      height: 1,
      takenAt: null,
    };
    const answer = await job.send('welder', 'add-photo', body);
    expect([answer.status, answer.body.code]).toEqual([422, 'command.file-not-sent']);
  });
});

describe('a recorder’s file', () => {
  it('is no photo, and is said to be none', async () => {
    const job = await aJobOn(on);
    const bytes = Buffer.from('time,pressure\n12:00,1500\n12:05,1499\n');
    const agent = await browserOf(on, 'welder');
    const address = `/api/jobs/${job.id}/files/${sha256(bytes)}`;
    await agent.put(address).set('Content-Type', 'text/csv').send(bytes).expect(200);
    const photo = await job.upload('welder');
    const size = { width: 1, height: 1, takenAt: null };
    const named = { point: 'hot-work-clearance', shot: 'meter-at-cellar', ...size };
    for (const files of [
      { sha256: sha256(bytes), previewSha256: null },
      { sha256: photo, previewSha256: sha256(bytes) },
    ]) {
      const answer = await job.send('welder', 'add-photo', { ...named, ...files });
      expect([answer.status, answer.body.code]).toEqual([422, 'command.file-no-photo']);
    }
  });
});

describe('the times of a command', () => {
  it("are the device's, the same moved by its offset, and the server's own", async () => {
    const job = await aJobOn(on);
    const clock = { deviceAt: '2026-03-01T10:00:00-06:00', offsetMs: 90_000, doubtMs: 400 };
    const command = { ...job.command('stop-work', { reason: 'Lightning' }), clock };
    expect((await job.post('welder', command)).status).toBe(200);
    expect(job.state.stopped?.at).toEqual({
      device: '2026-03-01T16:00:00.000Z',
      corrected: '2026-03-01T16:01:30.000Z',
      received: on.clock().toISOString(),
      doubtMs: 400,
    });
  });
});

describe('what a caller claims', () => {
  it('of a name gives way to the name of the account', async () => {
    const job = await aJobOn(on);
    const measuredBy = { accountId: on.person('secondWelder').id, name: 'O. Brandt' };
    const entries = [{ field: 'gas.bore.co', typed: '3', unit: 'ppm', measuredBy }];
    await job.do('welder', 'record', { point: 'hot-work-clearance', entries });
    expect(job.state.site['gas.bore.co']?.at(-1)?.measuredBy).toEqual({ ...measuredBy, name: 'L. Amaro' });
  });

  it('of an account that does not exist is refused', async () => {
    const measuredBy = { accountId: nobody, name: 'Nobody' };
    const entries = [{ field: 'gas.bore.co', typed: '3', unit: 'ppm', measuredBy }];
    const answer = await (await aJobOn(on)).send('welder', 'record', { point: 'hot-work-clearance', entries });
    expect([answer.status, answer.body.code]).toEqual([422, 'command.person-unknown']);
  });

  it("of a changed setting does not make it common practice: it is the operator's", async () => {
    const job = await aJobOn(on);
    const { terms } = job.state.plan;
    const settings = { ...terms.settings, tiltDeg: { value: '0.4', source: 'common-practice' as const } };
    await job.do('companyRep', 'change-terms', {
      terms: { ...terms, settings },
      reason: 'Programme rev 2',
      ...job.signingJob(),
    });
    expect(job.state.plan.terms.settings.tiltDeg).toEqual({ value: '0.4', source: 'job' });
    expect(job.state.plan.terms.settings.touchF.source).toBe('common-practice');
  });

  it('of a head gives way to the head of the set-up', async () => {
    const job = await (await aJobOn(on)).walkTo('valve-orientation');
    const head = { ...job.state.plan.head, faceToShoulderIn: '99', ratedPressurePsi: 15000 };
    await job.do('companyRep', 'set-again', { reason: 'Seal rolled', head, targetHeightIn: '5', ...job.signingJob() });
    expect(job.state.plan.head).toMatchObject({ faceToShoulderIn: '14', ratedPressurePsi: 3000 });
    const unknown = { ...head, id: nobody };
    const answer = await job.send('companyRep', 'set-again', {
      reason: 'Again',
      head: unknown,
      targetHeightIn: '5',
      ...job.signingJob(),
    });
    expect([answer.status, answer.body.code]).toEqual([422, 'command.head-unknown']);
  });
});
