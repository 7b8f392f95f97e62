import request from 'supertest';
import type { Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createApp } from '../../server/app';
import { makeDataSource, openDataSource } from '../../server/data-source';
import { demoInstruments } from '../../server/demo/instruments';
import { demoHeads } from '../../server/demo/heads';
import type { DemoKey } from '../../server/demo/people';
import { commandTypes } from '../../shared/contracts/commands';
import type { Command } from '../../shared/contracts/commands';
import type { Head, Instrument } from '../../shared/job/plan';
import { aJobOn, JobOn } from '../support/a-job-on';
import { startTestApp } from '../support/test-app';
import type { Agent, TestApp } from '../support/test-app';

interface Sent {
  key: DemoKey;
  jobId: string;
  command: Command;
  events: unknown;
  seq: number;
}

/** Sends the first command of every type five times at once, and holds the answers against each other. */
class FiveTimes extends JobOn {
  constructor(
    app: TestApp,
    id: string,
    readonly sent: Map<string, Sent>,
  ) {
    super(app, id);
  }

  override async post(key: DemoKey, command: Command, signing?: { pin: string } | null): Promise<Response> {
    if (this.sent.has(command.type)) return super.post(key, command, signing);
    const copies = Array.from({ length: 5 }, () => super.post(key, command, signing));
    const answers = await Promise.all(copies);
    expect([command.type, ...answers.map((answer) => answer.status)]).toEqual([command.type, 200, 200, 200, 200, 200]);
    const bodies = answers.map((answer) => answer.body as { events: unknown; seq: number; replayed: boolean });
    expect(bodies.filter((body) => !body.replayed)).toHaveLength(1);
    expect(new Set(bodies.map((body) => JSON.stringify([body.events, body.seq]))).size).toBe(1);
    const { events, seq } = bodies[0] ?? { events: [], seq: 0 };
    this.sent.set(command.type, { key, jobId: this.id, command, events, seq });
    return answers[0] as Response;
  }
}

let on: TestApp;
const sent = new Map<string, Sent>();
const first = 'hot-work-clearance';

beforeAll(async () => {
  on = await startTestApp();
});
afterAll(() => on.stop());

/** The last instrument of the set-up stays on the truck: it is added to the job later. */
const aFiveTimes = async () => {
  const instrumentIds = demoInstruments(on.clock()).map((one) => one.id);
  const job = await aJobOn(on, { instrumentIds: instrumentIds.slice(0, -1) });
  return (await new FiveTimes(on, job.id, sent).refresh()) as FiveTimes;
};
const reason = 'As agreed on site';

async function peopleAndDirection(job: JobOn): Promise<void> {
  const person = {
    accountId: on.person('secondToolPusher').id,
    name: '-',
    role: 'tool_pusher' as const,
    qualifications: [],
  };
  await job.do('coordinator', 'assign-person', { person });
  await job.do('coordinator', 'remove-person', { accountId: person.accountId, role: person.role, reason });
  const instrument = demoInstruments(on.clock()).at(-1) as Instrument;
  // what its calibration is, the server knows better than who asks for it
  await job.do('welder', 'add-instrument', { instrument: { ...instrument, calibratedUntil: '2099-01-01' } });
  expect(job.state.plan.instruments.at(-1)).toEqual(instrument);
  await job.do('coordinator', 'propose-direction', { direction: 'v-door' });
  await job.do('toolPusher', 'name-direction', { direction: 'mud-tanks', words: null });
  await job.do('welder', 'hand-over', { line: 'All set for the night', to: 'L. Amaro' });
}

async function backAndForth(job: JobOn): Promise<void> {
  await job.fill();
  await job.do('welder', 'set-photo-aside', { point: first, photo: job.point(first).photos[0]?.id ?? '', reason });
  await (await job.fill()).present();
  await job.do('welder', 'withdraw', { point: first, reason: null });
  await job.present();
  const { contentHash } = job.signing(first);
  await job.do('companyRep', 'send-back', { point: first, reason, contentHash });
  await (await job.present()).release();
  await job.do('welder', 'stop-work', { reason: 'Lightning' });
  await job.do('companyRep', 'resume-work', { note: 'Storm has passed', ...job.signingJob() });
  const { terms } = job.state.plan;
  const longer = { ...terms, test: { ...terms.test, holdMin: 20 } };
  await job.do('companyRep', 'change-terms', { terms: longer, reason, ...job.signingJob() });
  await job.do('companyRep', 'reopen', { point: first, reason, ...job.signing(first) });
}

async function concedeAtBevel(job: JobOn): Promise<void> {
  await (await job.walkTo('bevel-prep')).fill();
  const entries = [{ field: 'clean.outside', typed: '5', unit: 'in', measuredBy: null }];
  await job.do('welder', 'record', { point: 'bevel-prep', entries });
  await job.present();
  const verdict = job.point('bevel-prep').presentation?.judged.verdicts.find((one) => one.limit === 'clean.outside');
  const items = [{ limit: 'clean.outside', basis: verdict?.basis ?? [], reason }];
  await job.do('companyRep', 'concede', { point: 'bevel-prep', items, ...job.signing('bevel-prep') });
}

describe('every command', () => {
  it('sent five times at once is carried out once', async () => {
    const job = await aFiveTimes();
    await peopleAndDirection(job);
    await backAndForth(job);
    await concedeAtBevel(job);
    await job.walkTo('valve-orientation');
    const head = demoHeads[0] as Head;
    await job.do('companyRep', 'set-again', { reason, head, targetHeightIn: '5', ...job.signingJob() });
    await job.walkTo('cooled-to-touch');
    const begun = { field: 'cooling.9.temperature', typed: '180', unit: 'degF', measuredBy: null };
    await job.do('welder', 'record', { point: 'cooled-to-touch', entries: [begun] });
    await job.do('welder', 'strike-row', { point: 'cooled-to-touch', group: 'cooling', row: 9, reason });
    const round = { reason: "Porosity at 4 o'clock", passes: 1, ...job.signingJob() };
    await job.do('companyRep', 'open-repair-round', round);
    await (await job.walkTo(null)).seal();
    expect(job.state).toMatchObject({ status: 'sealed', setting: 2, rounds: [{ round: 1, passes: 1 }] });

    const other = await aFiveTimes();
    await other.do('companyRep', 'call-off', { reason, ...other.signingJob() });
    // planning has its own address and its own test
    expect([...sent.keys(), 'plan-job'].sort()).toEqual([...commandTypes].sort());
  });

  it('sent again after a restart, without its PIN, gets the answer that it got', async () => {
    const dataSource = await openDataSource(makeDataSource(on.database.config));
    const count = async () => (await dataSource.query<[{ n: string }]>('SELECT COUNT(*) AS n FROM job_events'))[0].n;
    const before = await count();
    try {
      const app = createApp({ ...on.deps, dataSource });
      const agents = new Map<DemoKey, Agent>();
      for (const { key, jobId, command, events, seq } of sent.values()) {
        const agent = agents.get(key) ?? request.agent(app);
        if (!agents.has(key)) {
          const { email, password } = on.person(key);
          await agent.post('/api/session').send({ email, password }).expect(200);
          agents.set(key, agent);
        }
        const again = await agent.post(`/api/jobs/${jobId}/commands`).send({ command });
        expect([command.type, again.status, again.body]).toEqual([command.type, 200, { events, seq, replayed: true }]);
      }
      expect(await count()).toBe(before);
    } finally {
      await dataSource.destroy();
    }
  });
});
