import { describe, expect, it } from 'vitest';
import type { Command } from '../../../shared/contracts/commands';
import { evolve } from '../../../shared/job/evolve';
import { expectedState } from '../../../src/offline/expected-state';
import type { OutboxEntry } from '../../../src/offline/outbox-entry';
import { aJob, type TestJob } from '../../support/a-job';

const waiting = (command: Command, place = 1): OutboxEntry => ({
  kind: 'command',
  body: command,
  id: command.id,
  place,
  accountId: 'me',
  jobId: 'job',
  createdAt: '2026-09-14T06:00:00.000Z',
  state: 'waiting',
  refused: null,
});

const oxygen = (job: TestJob, typed: string): Command =>
  job.command('record', {
    point: 'hot-work-clearance',
    entries: [{ field: 'gas.cellar.oxygen', typed, unit: 'pct', measuredBy: null }],
  });

describe('a job with commands in line', () => {
  it('stands as the server will make it of them, ids included', () => {
    const job = aJob();
    const command = oxygen(job, '20.8');
    const expected = expectedState(job.job, [waiting(command)], () => job.person('welder'));
    const reading = expected.site['gas.cellar.oxygen']?.[0];
    expect(reading).toMatchObject({ id: `${command.id}:0`, value: '20.8' });
    expect(expected.status).toBe('running');
  });

  it('leaves the confirmed state untouched', () => {
    const job = aJob();
    const before = JSON.stringify(job.job);
    expectedState(job.job, [waiting(oxygen(job, '20.8'))], () => job.person('welder'));
    expect(JSON.stringify(job.job)).toBe(before);
  });

  it('leaves out what a rule refuses and what the server refused', () => {
    const job = aJob();
    const entries: OutboxEntry[] = [
      waiting(oxygen(job, 'plenty')),
      { ...waiting(oxygen(job, '20.8'), 2), state: 'refused' },
    ];
    expect(expectedState(job.job, entries, () => job.person('welder'))).toEqual(job.job);
  });

  it('changes nothing any more once the server’s own events have arrived', () => {
    const job = aJob();
    const command = oxygen(job, '20.8');
    const expected = expectedState(job.job, [waiting(command)], () => job.person('welder'));
    job.do('record', command.body as never, job.person('welder'));
    const event = job.events.at(-1)!;
    const same = evolve(job.id, aJob().job, {
      ...event,
      body: { ...event.body, commandId: command.id },
    } as typeof event);
    expect(Object.keys(expected.site)).toEqual(Object.keys(same.site));
  });
});
