import type { Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Refusal } from '../../shared/job/refusal';
import { currentPoint } from '../../shared/job/points';
import { aJobOn } from '../support/a-job-on';
import type { JobOn } from '../support/a-job-on';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

let on: TestApp;
beforeAll(async () => {
  on = await startTestApp();
});
afterAll(() => on.stop());

const clearance = 'hot-work-clearance';
const refusalOf = (answer: Response): Refusal => (answer.body as { refusal: Refusal }).refusal;

async function presented(): Promise<JobOn> {
  const job = await aJobOn(on);
  return (await job.fill()).present();
}

/** Exactly one of them was recorded; the others. */
function losersOf(answers: Response[]): Response[] {
  expect(answers.map((answer) => answer.status).sort()).toEqual([200, ...answers.slice(1).map(() => 409)]);
  return answers.filter((answer) => answer.status !== 200);
}

describe('when two act at once', () => {
  it('one release wins and the other hears who was faster and when', async () => {
    const job = await presented();
    const [first, second] = [
      job.command('release', job.releaseBody(clearance)),
      job.command('release', job.releaseBody(clearance)),
    ];
    const answers = await Promise.all([job.post('companyRep', first), job.post('secondCompanyRep', second)]);
    const [loser] = losersOf(answers);
    const winner = answers[0]?.status === 200 ? 'O. Brandt' : 'N. Ekberg';
    expect(loser?.headers['content-type']).toMatch('application/problem+json');
    expect(loser && refusalOf(loser)).toMatchObject({
      code: 'point-already-released',
      since: { by: { name: winner } },
    });
    expect(loser && refusalOf(loser).since?.at.received).toBe(on.clock().toISOString());
    await job.refresh();
    expect(job.events.filter((event) => event.type === 'point-released')).toHaveLength(1);
  });

  it('a release and a send-back have one winner', async () => {
    const job = await presented();
    const { contentHash } = job.signing(clearance);
    const answers = await Promise.all([
      job.send('companyRep', 'release', job.releaseBody(clearance)),
      job.send('secondCompanyRep', 'send-back', { point: clearance, reason: 'Read the bore again', contentHash }),
    ]);
    const [loser] = losersOf(answers);
    expect(loser && refusalOf(loser).since?.by.role).toBe('company_rep');
    await job.refresh();
    const outcomes = job.events.filter((event) => event.type === 'point-released' || event.type === 'point-sent-back');
    expect(outcomes).toHaveLength(1);
  });

  it('a release of content that has changed since it was shown is refused with who changed it', async () => {
    const job = await presented();
    const shownBefore = job.releaseBody(clearance);
    await job.do('welder', 'withdraw', { point: clearance, reason: null });
    const entry = { field: 'gas.bore.co', typed: '6', unit: 'ppm', measuredBy: null };
    await job.do('secondWelder', 'record', { point: clearance, entries: [entry] });
    await job.present();
    const answer = await job.send('companyRep', 'release', shownBefore);
    expect(answer.status).toBe(409);
    expect(refusalOf(answer)).toMatchObject({ code: 'content-changed', since: { by: { name: 'W. Calder' } } });
    expect((await job.send('companyRep', 'release', job.releaseBody(clearance))).status).toBe(200);
  });

  it('a release and the recorder who takes the point back have one winner', async () => {
    const job = await presented();
    losersOf(
      await Promise.all([
        job.send('companyRep', 'release', job.releaseBody(clearance)),
        job.send('welder', 'withdraw', { point: clearance, reason: 'Meter drifted' }),
      ]),
    );
  });

  it('twelve recorders on one job lose nothing and keep one unbroken chain', async () => {
    const job = await aJobOn(on);
    const send = (index: number) =>
      job.send(index % 2 ? 'welder' : 'secondWelder', 'record', {
        point: clearance,
        entries: [{ field: 'gas.bore.co', typed: String(index), unit: 'ppm', measuredBy: null }],
      });
    const answers = await Promise.all(Array.from({ length: 12 }, (_, index) => send(index)));
    expect(answers.map((answer) => answer.status)).toEqual(Array(12).fill(200));
    const chain = await on.deps.dataSource.query<{ seq: number }[]>('SELECT seq FROM job_events WHERE job_id = ?', [
      job.id,
    ]);
    expect(chain.map((row) => Number(row.seq))).toEqual(Array.from({ length: 13 }, (_, index) => index + 1));
    await job.refresh();
    expect(currentPoint(job.state)?.readings['gas.bore.co'] ?? job.state.site['gas.bore.co']).toHaveLength(12);
  });
});
