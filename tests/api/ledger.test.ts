import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { JobHead } from '../../server/entities/job-head';
import { appendEvents } from '../../server/ledger/append-events';
import { readLinks } from '../../server/ledger/read-links';
import { upcast } from '../../server/ledger/upcast';
import { verifyJob } from '../../server/services/read-packet';
import type { JobEvent } from '../../shared/job/events';
import { verifyChain } from '../../shared/ledger/chain';
import { aJobOn, sha256 } from '../support/a-job-on';
import type { JobOn } from '../support/a-job-on';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

let on: TestApp;
let job: JobOn;
beforeAll(async () => {
  on = await startTestApp();
});
afterAll(() => on.stop());
beforeEach(async () => {
  job = await aJobOn(on);
  for (const line of ['Night shift', 'Day shift', 'Night shift again']) {
    await job.do('welder', 'hand-over', { line, to: null });
  }
});

const verify = () => verifyJob(on.deps, job.id);

/** What somebody with every right to the database can do: the triggers go first. */
async function tamper(sql: string, values: unknown[]): Promise<void> {
  const { owner } = on.database;
  await owner.query('DROP TRIGGER IF EXISTS job_events_no_update');
  await owner.query('DROP TRIGGER IF EXISTS job_events_no_delete');
  await owner.query(sql, values);
}

describe('the application', () => {
  it.each([
    ['change', 'UPDATE job_events SET type = type'],
    ['delete', 'DELETE FROM job_events'],
    ['empty', 'TRUNCATE TABLE job_events'],
    ['drop', 'DROP TABLE job_events'],
  ])('may not %s the events', async (_deed, sql) => {
    await expect(on.deps.dataSource.query(sql)).rejects.toMatchObject({
      code: expect.stringMatching(/ER_(TABLEACCESS|DBACCESS)_DENIED_ERROR/) as string,
    });
  });
});

describe('the owner of the tables', () => {
  it('is stopped by the triggers', async () => {
    const { owner } = on.database;
    for (const sql of ['UPDATE job_events SET type = type', 'DELETE FROM job_events']) {
      await expect(owner.query(sql)).rejects.toMatchObject({ sqlState: '45000' });
    }
  });
});

describe('a chain', () => {
  it('holds as it was written, each link on the one before', async () => {
    const links = await readLinks(on.deps.dataSource.manager, job.id);
    expect(links.map((link) => link.type)).toEqual(['job-planned', ...Array(3).fill('shift-handed-over')]);
    expect(links[0]?.prevHash).toBe(sha256(job.id));
    expect(links[2]?.prevHash).toBe(links[1]?.hash);
    expect(await verify()).toEqual({ holds: true, links: 4, head: links[3]?.hash });
  });

  it.each([
    [
      'a letter of a body',
      'UPDATE job_events SET body = REPLACE(body, "Day", "Dry") WHERE job_id = ? AND seq = 3',
      3,
      'hash',
    ],
    ['a type', 'UPDATE job_events SET type = "work-stopped" WHERE job_id = ? AND seq = 2', 2, 'hash'],
    ['a command', 'UPDATE job_events SET command_id = UUID() WHERE job_id = ? AND seq = 4', 4, 'hash'],
    ['a hash', 'UPDATE job_events SET hash = REPEAT("0", 64) WHERE job_id = ? AND seq = 2', 2, 'hash'],
    [
      'a link to the one before',
      'UPDATE job_events SET prev_hash = REPEAT("0", 64) WHERE job_id = ? AND seq = 3',
      3,
      'prev',
    ],
    ['a body to what is no JSON', 'UPDATE job_events SET body = "{" WHERE job_id = ? AND seq = 3', 3, 'unreadable'],
    [
      'the spelling of a body',
      'UPDATE job_events SET body = CONCAT(body, " ") WHERE job_id = ? AND seq = 3',
      3,
      'hash',
    ],
  ])('with %s changed is broken right there', async (_what, sql, seq, why) => {
    await tamper(sql, [job.id]);
    expect(await verify()).toEqual({ holds: false, seq, why });
  });

  it('with a link taken out has a gap there', async () => {
    await tamper('DELETE FROM job_events WHERE job_id = ? AND seq = 2', [job.id]);
    expect(await verify()).toEqual({ holds: false, seq: 2, why: 'gap' });
  });

  it('with its end cut off is too short for its head', async () => {
    await tamper('DELETE FROM job_events WHERE job_id = ? AND seq = 4', [job.id]);
    expect(await verify()).toEqual({ holds: false, seq: 4, why: 'cut-short' });
  });

  it('with two links in the other order is broken at the first of them', async () => {
    await tamper('UPDATE job_events SET seq = seq + 100 WHERE job_id = ? AND seq IN (2, 3) ORDER BY seq DESC', [
      job.id,
    ]);
    await tamper('UPDATE job_events SET seq = IF(seq = 102, 3, 2) WHERE job_id = ? AND seq > 100', [job.id]);
    expect(await verify()).toEqual({ holds: false, seq: 2, why: 'prev' });
  });

  it('moved under another job does not hold there', async () => {
    const links = await readLinks(on.deps.dataSource.manager, job.id);
    expect(verifyChain('0b1f6c1e-3c5a-4d1f-9a51-6a0c9a3f0000', links, sha256)).toMatchObject({ holds: false, seq: 1 });
  });
});

describe('an event', () => {
  const event = (body: unknown): JobEvent => ({ type: 'work-stopped', schema: 1, body }) as unknown as JobEvent;

  it('with a float in it is not inserted', async () => {
    const append = on.deps.dataSource.transaction(async (manager) => {
      const head = await manager.findOneByOrFail(JobHead, { jobId: job.id });
      await appendEvents(manager, head, 'none', [event({ reason: { deep: [1, 2.5] } })]);
    });
    await expect(append).rejects.toThrow('body.reason.deep.1 holds 2.5');
    expect(await verify()).toMatchObject({ holds: true, links: 4 });
  });

  it('of a form that this program does not know is not guessed at', async () => {
    const [link] = await readLinks(on.deps.dataSource.manager, job.id);
    expect(link && upcast(link).type).toBe('job-planned');
    expect(() => link && upcast({ ...link, schema: 2 })).toThrow('unknown form job-planned/2');
  });
});
