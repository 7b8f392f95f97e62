import { describe, expect, it } from 'vitest';
import type { Instrument } from '../../../shared/job/plan';
import { reviewPoint } from '../../../shared/job/review';
import { aJob, type TestJob } from '../../support/a-job';
import { aPlan } from '../../support/a-plan';
import { walkTo } from '../../support/drive';

const spare: Instrument = {
  id: 'meter-spare',
  kind: 'gas-meter',
  name: 'Gas meter 7',
  serial: 'GM-2310',
  calibratedUntil: '2026-12-31',
  fullScalePsi: null,
};
const readWith = (job: TestJob, meter: string) => {
  const entries = [{ field: 'gas.meter', typed: meter, unit: null, measuredBy: null }];
  return job.do('record', { point: 'site', entries }, job.person('welder'));
};
const meterStops = (job: TestJob) => {
  const first = job.point('hot-work-clearance');
  const verdicts = reviewPoint(job.job, { ...first, release: null }).stops;
  return verdicts.map((one) => one.limit).filter((limit) => limit.endsWith('gas.meter'));
};

describe('an instrument added to a running job', () => {
  it('may be used from then on', () => {
    const job = aJob();
    walkTo(job, 'final-cut');
    expect(meterStops(readWith(job, spare.id))).toEqual(['listed.gas.meter']);
    job.do('add-instrument', { instrument: spare }, job.person('welder'));
    expect(meterStops(job)).toEqual([]);
    expect(job.job.plan.instruments.at(-1)).toEqual(spare);
    expect(job.plan.instruments).not.toContain(spare);
  });

  it('is held against its calibration like any other', () => {
    const job = aJob();
    walkTo(job, 'final-cut');
    job.do('add-instrument', { instrument: { ...spare, calibratedUntil: '2026-09-13' } }, job.person('coordinator'));
    expect(meterStops(readWith(job, spare.id))).toEqual(['calibration.gas.meter']);
  });

  it('is added once, and never by a guest', () => {
    const job = aJob();
    const body = { instrument: spare };
    expect(job.refused('add-instrument', body, job.person('company_rep'))).toBe('not-yours-to-do');
    job.do('add-instrument', body, job.person('welder'));
    expect(job.refused('add-instrument', body, job.person('welder'))).toBe('instrument-already-listed');
  });

  it('is one of forty at most', () => {
    const instruments = Array.from({ length: 40 }, (_, n) => ({ ...aPlan().instruments[n % 3]!, id: `one-${n}` }));
    const job = aJob({ ...aPlan(), instruments });
    expect(job.refused('add-instrument', { instrument: spare }, job.person('welder'))).toBe('instruments-full');
  });
});
