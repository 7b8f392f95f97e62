import { describe, expect, it } from 'vitest';
import type { RecordEntry } from '../../../shared/contracts/commands';
import { decide } from '../../../shared/job/decide';
import { evolve } from '../../../shared/job/evolve';
import { reviewPoint } from '../../../shared/job/review';
import { understand } from '../../../shared/job/understand';
import { quantity } from '../../../shared/hold-points/fields';
import { helper, welder } from '../../support/a-plan';
import { aPointContext } from '../../support/a-point';
import { aJob, hash, type TestJob } from '../../support/a-job';
import { walkTo } from '../../support/drive';
import { ruling } from '../../support/verdicts';

const entry = (
  field: string,
  typed: string,
  unit: string | null = null,
  measuredBy: RecordEntry['measuredBy'] = null,
): RecordEntry => ({
  field,
  typed,
  unit,
  measuredBy,
});
const inches = (field: string, typed: string, measuredBy: RecordEntry['measuredBy'] = null) =>
  entry(field, typed, 'in', measuredBy);

/** Records with a clock of its own: minutes before (negative) or after now, and how sure it is. */
const recordAt = (
  job: TestJob,
  point: string,
  entries: RecordEntry[],
  minutes: number,
  doubtMs: number | null = 200,
): void => {
  const at = new Date(job.now + minutes * 60_000).toISOString();
  const times = { device: at, corrected: at, received: new Date(job.now).toISOString(), doubtMs };
  const decision = decide(job.job, job.command('record', { point, entries }), job.person('welder'), times, hash);
  if (!decision.ok) throw new Error(decision.refusal.code);
  for (const event of decision.events) job.state = evolve(job.id, job.state, event);
};
const counts = (job: TestJob, point: string, field: string) =>
  reviewPoint(job.job, job.point(point)).context.value(field);

describe('of two readings of one field', () => {
  const at = 'height-takeoff';
  const job = (): TestJob => {
    const one = aJob();
    walkTo(one, at);
    return one;
  };

  it('the one taken last counts, whichever device sends first', () => {
    const one = job();
    recordAt(one, at, [inches('stub-top', '4')], -5);
    recordAt(one, at, [inches('stub-top', '-9')], -30);
    expect(counts(one, at, 'stub-top')).toBe('4');
    expect(one.point(at).readings['stub-top']).toHaveLength(2);
  });

  it('the one that arrives last counts where a clock is in doubt', () => {
    const one = job();
    recordAt(one, at, [inches('stub-top', '4')], 900, null);
    recordAt(one, at, [inches('stub-top', '5')], 0);
    expect(counts(one, at, 'stub-top')).toBe('5');
  });
});

describe('two persons', () => {
  const at = 'height-takeoff';
  const start = (): TestJob => {
    const job = aJob();
    walkTo(job, at);
    return job.do(
      'record',
      { point: at, entries: [inches('mark.first', '8', welder), inches('mark.second', '8', helper)] },
      job.person('welder'),
    );
  };

  it('stay two when the first is measured again', () => {
    const job = start();
    const again = (measuredBy: RecordEntry['measuredBy']) => ({
      point: at,
      entries: [inches('mark.first', '8 1/4', measuredBy)],
    });
    expect(job.refused('record', again(helper), job.person('welder'))).toBe('same-person-measured');
    job.do('record', again(welder), job.person('welder'));
  });

  it('stay two when one command names the same field twice', () => {
    const job = aJob();
    walkTo(job, at);
    const entries = [
      inches('mark.first', '8', welder),
      inches('mark.first', '8', helper),
      inches('mark.second', '8', helper),
    ];
    expect(job.refused('record', { point: at, entries }, job.person('welder'))).toBe('same-person-measured');
  });

  it('come first and second, and a hand named in words is the account of that name', () => {
    const job = aJob();
    walkTo(job, at);
    const second = (measuredBy: RecordEntry['measuredBy']) => ({
      point: at,
      entries: [inches('mark.second', '8', measuredBy)],
    });
    expect(job.refused('record', second(helper), job.person('welder'))).toBe('first-measurement-missing');
    job.do('record', { point: at, entries: [inches('mark.first', '8', welder)] }, job.person('welder'));
    expect(job.refused('record', second({ accountId: null, name: ' w. calder ' }), job.person('welder'))).toBe(
      'same-person-measured',
    );
    job.do('record', second({ ...helper, name: welder.name }), job.person('welder'));
  });

  it.each([
    ['the first hand alone', '14.25', '14', '14.25', welder, 'outside hold'],
    ['the first hand with the second', '14.25', '14', '14.03125', welder, 'within hold'],
    ['the second hand alone', '14.25', '14', '14', helper, 'outside hold'],
    ['a third hand', '14.25', '14', '14.25', { accountId: null, name: 'P. Lind' }, 'within hold'],
  ])('are not settled by one hand twice: %s', (_name, first, second, third, hand, expected) => {
    const context = aPointContext({
      kind: 'height-takeoff',
      readings: {
        'takeoff.first': first,
        'takeoff.second': second,
        'takeoff.third': { value: third, measuredBy: hand },
      },
    });
    expect(ruling(context, 'takeoff.agree')).toBe(expected);
  });
});

describe('what is typed', () => {
  const psi = quantity('highest', 'psi');
  it.each([
    ['10', 'furlong', 'quantity-unit-unknown'],
    ['10', 'toString', 'quantity-unit-unknown'],
    ['10', 'in', 'quantity-unit-of-another-kind'],
    ['NaN', 'psi', 'quantity-not-finite'],
    ['Infinity', 'psi', 'quantity-not-finite'],
    ['1e3', 'psi', 'quantity-exponent'],
    ['99999999999', 'psi', 'quantity-too-many-digits'],
    ['   ', 'psi', 'answer-empty'],
  ])('%s in %s is not taken', (typed, unit, reason) => {
    expect(understand(psi, typed, unit)).toEqual({ ok: false, reason });
  });

  it('keeps its value in the field’s own unit', () => {
    expect(understand(psi, '100', 'bar')).toEqual({ ok: true, value: expect.stringMatching(/^1450\.37/) as string });
    expect(understand(psi, '-5', null)).toEqual({ ok: true, value: '-5' });
  });
});

describe('rows', () => {
  const at = 'pass-1-inspected';
  const rod = (field: string) => entry(field, '112', 'A');

  it('may leave numbers out, and a row that was begun has to be finished', () => {
    const job = aJob();
    walkTo(job, at);
    job.do('record', { point: at, entries: [rod('rods.7.amps')] }, job.person('welder'));
    const { missing, fields } = reviewPoint(job.job, job.point(at));
    expect(missing).toContain('field:rods.7.lot');
    expect(missing).toContain('field:rods.1.amps');
    expect(fields.some((field) => field.key.startsWith('rods.2.'))).toBe(false);
  });

  it.each(['rods.0.amps', 'rods.007.amps', 'rods.61.amps', 'rods.1.1.amps'])(
    'have one name each: %s is none',
    (field) => {
      const job = aJob();
      walkTo(job, at);
      expect(job.refused('record', { point: at, entries: [rod(field)] }, job.person('welder'))).toBe('no-such-field');
    },
  );

  it('that only a late reading names are not asked for', () => {
    const context = aPointContext({
      kind: 'pass-inspected',
      readings: { 'rods.4.amps': { value: '112', late: true }, 'rods.1.amps': '112' },
    });
    expect(context.rows('rods')).toEqual([1]);
  });
});
