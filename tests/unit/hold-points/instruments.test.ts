import { describe, expect, it } from 'vitest';
import { generalVerdicts } from '../../../shared/hold-points/general';
import { reviewPoint } from '../../../shared/job/review';
import messages from '../../../shared/locales/en';
import { hasWords } from '../../../shared/locales/say';
import { aPlan } from '../../support/a-plan';
import { aPointContext } from '../../support/a-point';
import { aJob } from '../../support/a-job';
import { walkTo } from '../../support/drive';
import { expectWords, isRequired } from '../../support/judged';
import type { InstrumentKind } from '../../../shared/job/plan';

const instrument = (id: string, kind: InstrumentKind, calibratedUntil = '2026-12-31') => ({
  id,
  kind,
  name: `The ${kind}`,
  serial: id,
  calibratedUntil,
  fullScalePsi: null,
});
const plan = aPlan();
const equipped = {
  ...plan,
  instruments: [
    ...plan.instruments,
    instrument('tape-1', 'tape'),
    instrument('level-1', 'level'),
    instrument('level-2', 'level', '2026-09-13'),
  ],
};

describe('an instrument', () => {
  it.each([
    ['height-takeoff', 'tape.first', true],
    ['height-takeoff', 'tape.second', true],
    ['valve-orientation', 'set.instrument', true],
    ['pass-inspected', 'tacked.instrument', true],
    ['pass-inspected', 'temps.instrument', false],
    ['cooled-to-touch', 'as-built.instrument', true],
    ['cooled-to-touch', 'cooled-instrument', false],
  ] as const)('is named at %s by %s where the job lists one', (kind, field, required) => {
    const listed = aPointContext({ kind, plan: equipped });
    expect(isRequired(listed, field)).toBe(required);
    expectWords(listed);
    const none = aPointContext({ kind, plan: { ...plan, instruments: [] } });
    expect(isRequired(none, field)).toBeUndefined();
  });

  it.each([
    ['level-1', []],
    ['level-2', ['hold calibration.set.instrument']],
    ['tape-1', ['hold listed.set.instrument']],
    ['spirit level', ['hold listed.set.instrument']],
  ])('named %s is held to the list and its calibration', (value, expected) => {
    const job = aJob(equipped);
    walkTo(job, 'valve-orientation');
    const entries = [{ field: 'set.instrument', typed: value, unit: null, measuredBy: null }];
    job.do('record', { point: 'valve-orientation', entries }, job.person('welder'));
    const outside = reviewPoint(job.job, job.point('valve-orientation')).verdicts.filter(
      (one) => one.outcome === 'outside',
    );
    expect(outside.map(({ kind, limit }) => `${kind} ${limit}`)).toEqual(expected);
  });

  it('lets a whole job be walked when every kind is listed', () => {
    const job = aJob(equipped);
    walkTo(job, null);
    expect(job.job.points.every((point) => point.status === 'released')).toBe(true);
  });
});

describe('what is judged at every point', () => {
  it('holds readings and acts whose clock is in doubt, and has words for it', () => {
    const noon = '2026-09-14T12:00:00.000Z';
    const doubtful = aPointContext({
      kind: 'bevel-prep',
      readings: { 'bevel.angle': { value: '30', doubtMs: null }, 'bevel.land': { value: '0.03', doubtMs: 120_001 } },
      acts: [{ act: 'bevel', begun: noon, ended: '2026-09-14T11:50:00.000Z' }],
    });
    const review = reviewPoint(doubtful.state, doubtful.point);
    const verdicts = generalVerdicts(doubtful, review.fields);
    expect(verdicts.map(({ kind, limit, about }) => `${kind} ${limit} ${about.join(' ')}`.trim())).toEqual([
      'hold clock-doubt bevel.angle bevel.land',
      'hold act-times.1',
    ]);
    for (const verdict of verdicts) expect(hasWords(messages, verdict.text.key), verdict.text.key).toBe(true);
  });

  it('does not believe a temperature that no rig has seen', () => {
    const kinds = (value: string) => {
      const cold = aPointContext({ kind: 'cooled-to-touch', readings: { 'cooling.2.temperature': value } });
      return generalVerdicts(cold, reviewPoint(cold.state, cold.point).fields).map((verdict) => verdict.kind);
    };
    expect(kinds('-400')).toEqual(['stop']);
    expect(kinds('-20')).toEqual([]);
  });

  it.each(['act-clock', 'act-times', 'instrument-listed', 'calibration', 'gas-zeroed', 'plug-back-in', 'tacked-first'])(
    'has words for %s',
    (limit) => {
      for (const outcome of ['within', 'outside']) expect(hasWords(messages, `limits.${limit}.${outcome}`)).toBe(true);
    },
  );
});
