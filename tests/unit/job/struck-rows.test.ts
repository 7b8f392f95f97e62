import { describe, expect, it } from 'vitest';
import type { RecordEntry } from '../../../shared/contracts/commands';
import { contentOf } from '../../../shared/job/content';
import { foldEvents } from '../../../shared/job/evolve';
import { reviewPoint } from '../../../shared/job/review';
import { storyOf } from '../../../shared/job/story';
import { worthReading } from '../../../shared/job/worth-reading';
import { nextRow } from '../../../shared/hold-points/rows';
import { aJob, type TestJob } from '../../support/a-job';
import { presentPoint, recordPoint, releasePoint, walkTo } from '../../support/drive';

const at = 'pass-1-inspected';
const reason = 'Begun on the wrong rods.';
const entry = (field: string, typed: string, unit: string | null = 'A'): RecordEntry => ({
  field,
  typed,
  unit,
  measuredBy: null,
});
const record = (job: TestJob, ...entries: RecordEntry[]): TestJob =>
  job.do('record', { point: at, entries }, job.person('welder'));
const strike = (row: number, group = 'rods') => ({ point: at, group, row, reason });

/** Pass 1 complete, and beside its own row a second one that was begun by mistake. */
const withRowTwo = (amps = '112'): TestJob => {
  const job = aJob();
  walkTo(job, at);
  recordPoint(job, at);
  return record(job.minutes(1), entry('rods.2.amps', amps));
};
const review = (job: TestJob) => reviewPoint(job.job, job.point(at));

describe('a row that was begun by mistake', () => {
  it('is struck: nothing of it is asked for any more, and its readings stay on record', () => {
    const job = withRowTwo();
    expect(review(job).missing).toContain('field:rods.2.lot');
    job.do('strike-row', strike(2), job.person('welder'));
    expect(review(job).missing).toEqual([]);
    expect(review(job).context.rows('rods')).toEqual([1]);
    expect(review(job).context.read('rods.2.amps')).toBeUndefined();
    expect(job.point(at).readings['rods.2.amps']).toMatchObject([
      { value: '112', struck: { reason, by: { name: 'W. Calder' } } },
    ]);
    expect(foldEvents(job.id, JSON.parse(JSON.stringify(job.events)))).toEqual(job.job);
  });

  it('is worth reading for an outsider', () => {
    const job = withRowTwo().do('strike-row', strike(2), aJob().person('welder'));
    const story = storyOf(job.id, job.events);
    const worth = story && worthReading(story, job.events).find((one) => one.kind === 'rows-struck');
    expect(worth).toMatchObject({ count: 1, items: [{ place: { id: at }, says: reason }] });
  });

  it('is no part of what is signed, and what was shown with it is no longer the content', () => {
    const job = withRowTwo();
    const before = job.signing(at);
    job.do('strike-row', strike(2), job.person('welder'));
    const content = contentOf(job.job, job.point(at), before.shown);
    expect(content.readings.some((reading) => reading.field.startsWith('rods.2.'))).toBe(false);
    expect(job.refused('present', { point: at, ...before }, job.person('welder'))).toBe('content-changed');
  });

  it('takes its verdicts with it, and the concession that bound them', () => {
    const job = withRowTwo('150');
    const lot = [entry('rods.2.class', 'E8018-C3', null), entry('rods.2.lot', '7731', null)];
    const out = entry('rods.2.out-of-oven', new Date(job.now - 10 * 60_000).toISOString(), null);
    const rest = [entry('rods.2.count', '1', null), entry('rods.2.volts', '23', 'V')];
    record(job, ...lot, out, ...rest, entry('rods.2.arc-time', '1', 'min'), entry('rods.2.run-out', '6', 'in'));
    presentPoint(job, at);
    const holds = review(job).unconceded;
    expect(holds.map((one) => one.limit)).toContain('rods.2.amps');
    const items = holds.map(({ limit, basis }) => ({ limit, basis, reason: 'Seen on site.' }));
    job.do('concede', { point: at, items, ...job.signing(at) }, job.person('company_rep'));
    job.do('withdraw', { point: at, reason: null }, job.person('welder'));
    job.do('strike-row', strike(2), job.person('welder'));
    expect(review(job).conceded).toEqual([]);
    expect(review(job).verdicts.some((one) => one.limit.startsWith('rods.2.'))).toBe(false);
    presentPoint(job, at);
    releasePoint(job, at);
    expect(job.point(at).release?.readings).not.toContain(job.point(at).readings['rods.2.amps']?.[0]?.id);
  });

  it('keeps its number: the next row gets another, and nothing more is written into it', () => {
    const job = withRowTwo();
    job.do('strike-row', strike(2), job.person('welder'));
    expect(nextRow(job.point(at).readings, 'rods')).toBe(3);
    const again = { point: at, entries: [entry('rods.2.volts', '23', 'V')] };
    expect(job.refused('record', again, job.person('welder'))).toBe('row-struck');
  });

  it('gives its place to another where the point asks for so many', () => {
    const job = aJob();
    walkTo(job, at);
    record(job, entry('rods.1.amps', '112'));
    job.do('strike-row', strike(1), job.person('welder'));
    const { missing, fields } = review(job);
    expect(new Set(fields.filter((field) => field.group === 'rods').map((field) => field.row))).toEqual(new Set([2]));
    expect(missing).toContain('field:rods.2.amps');
    expect(missing).not.toContain('field:rods.1.amps');
  });

  it.each([
    ['a row that nobody wrote to', strike(9)],
    ['a group without rows', strike(1, 'size')],
    ['a group that is not there', strike(1, 'no-such')],
  ])('is one: %s is none', (_name, body) => {
    const job = withRowTwo();
    expect(job.refused('strike-row', body, job.person('welder'))).toBe('no-such-row');
  });

  it('is struck once, by a recorder, while the point is open', () => {
    const job = withRowTwo();
    expect(job.refused('strike-row', strike(2), job.person('company_rep'))).toBe('not-yours-to-do');
    job.do('strike-row', strike(2), job.person('welder'));
    expect(job.refused('strike-row', strike(2), job.person('welder'))).toBe('no-such-row');
    presentPoint(job, at);
    expect(job.refused('strike-row', strike(1), job.person('welder'))).toBe('point-not-open');
  });
});
