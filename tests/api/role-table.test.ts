import type { Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { DemoKey } from '../../server/demo/people';
import { allRoutes } from '../../shared/contracts';
import type { RouteContract } from '../../shared/contracts/contract';
import { pathWith } from '../../shared/contracts/contract';
import { commandTypes } from '../../shared/contracts/commands';
import { roles } from '../../shared/permissions';
import type { Role } from '../../shared/permissions';
import { aJobOn, browserOf, sha256 } from '../support/a-job-on';
import type { JobOn } from '../support/a-job-on';
import { strangers } from '../support/a-planning';
import { commandBodies } from '../support/command-bodies';
import { aJpeg } from '../support/images/make';
import { startTestApp } from '../support/test-app';
import type { Agent, TestApp } from '../support/test-app';
import { auditorOnPacket, commandAddress, commandTable, houseTable, jobTable } from './role-table';

const keyOf: Record<Role, DemoKey> = {
  welder: 'welder',
  company_rep: 'companyRep',
  tool_pusher: 'toolPusher',
  auditor: 'auditor',
  coordinator: 'coordinator',
};

const nameOf = ({ method, path }: RouteContract): string => `${method} ${path}`;
const photo = aJpeg(50, 40);

let on: TestApp;
let [own, other, ownPacket, otherPacket]: JobOn[] = [];

/** A packet with one photo in it, called off by its own company representative. */
async function aPacket(planning: Parameters<typeof aJobOn>[1], welder: DemoKey, rep: DemoKey): Promise<JobOn> {
  const job = await aJobOn(on, planning);
  await putPhoto(await browserOf(on, welder), job.id);
  return job.do(rep, 'call-off', { reason: 'The well was plugged', ...job.signingJob() });
}

const putPhoto = (agent: Agent, id: string): Promise<Response> =>
  Promise.resolve(
    agent
      .put(`/api/jobs/${id}/files/${sha256(photo)}`)
      .set('Content-Type', 'image/jpeg')
      .send(photo),
  );

beforeAll(async () => {
  on = await startTestApp();
  own = await aJobOn(on);
  other = await aJobOn(on, strangers());
  await putPhoto(await browserOf(on, 'welder'), own.id);
  await putPhoto(await browserOf(on, 'secondWelder'), other.id);
  ownPacket = await aPacket({}, 'welder', 'companyRep');
  otherPacket = await aPacket(strangers(), 'secondWelder', 'secondCompanyRep');
});
afterAll(() => on.stop());

async function call(agent: Agent, route: RouteContract, job: JobOn | undefined): Promise<number> {
  if (nameOf(route) === 'put /api/jobs/{id}/files/{sha256}') return (await putPhoto(agent, job?.id ?? '')).status;
  const path = pathWith(route.path, { id: job?.id ?? '', sha256: sha256(photo) });
  const sent = agent[route.method](path);
  return (await (route.request === undefined ? sent : sent.send({}))).status;
}

describe('every route has its row', () => {
  it('and every row its route', () => {
    const rows = [...Object.keys(houseTable), ...Object.keys(jobTable), commandAddress];
    expect(allRoutes.map(nameOf).sort()).toEqual(rows.sort());
  });

  it('and every command too', () => {
    expect(Object.keys(commandTable).sort()).toEqual([...commandTypes].sort());
  });
});

describe.each(allRoutes.filter((route) => nameOf(route) in jobTable))('$method $path', (route) => {
  const row = jobTable[nameOf(route)];
  const jobs = () => (route.path.startsWith('/api/packets') ? [ownPacket, otherPacket] : [own, other]);

  it('answers somebody who is not signed in as the table says', async () => {
    expect(await call(on.guest(), route, jobs()[0])).toBe(row?.nobody);
  });

  it.each([...roles])('answers a %s as the table says', async (role) => {
    const agent = await on.agentFor(keyOf[role]);
    const [mine, foreign] = jobs();
    expect({ own: await call(agent, route, mine), other: await call(agent, route, foreign) }).toEqual({
      own: row?.own[role],
      other: row?.other[role],
    });
  });

  it('knows no job of an id that nobody gave', async () => {
    const agent = await on.agentFor('coordinator');
    const nowhere = { id: '01940000-0000-7000-8000-00000000dead' } as JobOn;
    expect(await call(agent, route, nowhere)).toBe(404);
  });
});

describe('commands', () => {
  it('are taken from nobody who is not signed in', async () => {
    const command = own?.command('stop-work', { reason: 'Gas' });
    await on.guest().post(`/api/jobs/${own?.id}/commands`).send({ command }).expect(401);
  });

  it.each([...roles])('of every type are answered to a %s as the table says', async (role) => {
    const found: Record<string, { own: number; other: number }> = {};
    const [mine, foreign] = [await aJobOn(on), await aJobOn(on, strangers())];
    for (const type of commandTypes) {
      const send = async (job: JobOn) => (await job.send(keyOf[role], type, commandBodies[type])).status;
      found[type] = { own: await send(mine), other: await send(foreign) };
    }
    const expected = commandTypes.map((type) => [
      type,
      { own: commandTable[type].own[role], other: commandTable[type].other[role] },
    ]);
    expect(found).toEqual(Object.fromEntries(expected));
  });

  it("of no type are an auditor's on a packet that he may read", async () => {
    for (const type of commandTypes) {
      const answer = await ownPacket?.send('auditor', type, commandBodies[type]);
      expect([type, answer?.status]).toEqual([type, auditorOnPacket]);
    }
  });

  it('of no type reach a job that does not exist', async () => {
    const agent = await browserOf(on, 'coordinator');
    for (const type of commandTypes) {
      const command = own?.command(type, commandBodies[type]);
      const signing = { pin: on.person('coordinator').pin };
      const answer = await agent
        .post('/api/jobs/01940000-0000-7000-8000-00000000dead/commands')
        .send({ command, signing });
      expect([type, answer.status]).toEqual([type, 404]);
    }
  });
});

// The last ones, for signing out everywhere ends the sessions that the tests before them share.
describe.each(allRoutes.filter((route) => nameOf(route) in houseTable))('$method $path', (route) => {
  const row = houseTable[nameOf(route)];

  it('answers somebody who is not signed in as the table says', async () => {
    expect(await call(on.guest(), route, undefined)).toBe(row?.nobody);
  });

  it.each([...roles])('answers a %s as the table says', async (role) => {
    expect(await call(await on.agentFor(keyOf[role]), route, undefined)).toBe(row?.each[role]);
  });
});
