import { describe, expect, it } from 'vitest';
import { decide } from '../../../shared/job/decide';
import { evolve } from '../../../shared/job/evolve';
import { reviewPoint } from '../../../shared/job/review';
import { hash, type TestJob } from '../../support/a-job';
import { aPlan } from '../../support/a-plan';
import { cleanAir } from '../../support/clearance';
import { recordPoint, releasePoint } from '../../support/drive';
import { blockers, entry, freshAir, hand, jobAt, reason, reopen, rep } from '../../support/job-steps';

describe('while an act runs', () => {
  const burning = (): TestJob => {
    const job = freshAir(jobAt('bevel-prep'));
    return job.do('begin-act', { point: 'bevel-prep', act: 'bevel' }, hand(job));
  };

  it('the same act is not begun again and its point is not presented', () => {
    const job = burning();
    expect(job.refused('begin-act', { point: 'bevel-prep', act: 'bevel' }, hand(job))).toBe('act-running');
    expect(reviewPoint(job.job, job.point('bevel-prep')).missing).toContain('act-end:bevel');
    expect(job.refused('present', { point: 'bevel-prep', ...job.signing('bevel-prep') }, hand(job))).toBe(
      'not-complete',
    );
  });

  it('no earlier point is reopened under the flame', () => {
    const job = burning();
    expect(job.refused('reopen', reopen(job, 'final-cut'), rep(job))).toBe('act-running');
    job.do('end-act', { point: 'bevel-prep', act: 'bevel' }, hand(job));
    job.do('reopen', reopen(job, 'final-cut'), rep(job));
    expect(job.point('bevel-prep').superseded).toHaveLength(1);
  });

  it('the head is not set again', () => {
    const job = freshAir(jobAt('preheat-reached'));
    job.do('begin-act', { point: 'preheat-reached', act: 'preheat' }, hand(job));
    const again = { reason, head: job.job.plan.head, targetHeightIn: '5', ...job.signingJob() };
    expect(job.refused('set-again', again, rep(job))).toBe('act-running');
  });

  it('work may be stopped and the act ended, yet nothing is begun', () => {
    const job = burning();
    job.do('stop-work', { reason }, job.person('tool_pusher'));
    job.do('end-act', { point: 'bevel-prep', act: 'bevel' }, hand(job));
    expect(job.refused('begin-act', { point: 'bevel-prep', act: 'bevel' }, hand(job))).toBe('work-stopped');
  });
});

describe('before fire is lit', () => {
  const light = (job: TestJob, minutes = 0, doubtMs: number | null = 200) => {
    const time = new Date(job.now + minutes * 60_000).toISOString();
    const times = { device: time, corrected: time, received: new Date(job.now).toISOString(), doubtMs };
    return decide(job.job, job.command('begin-act', { point: 'final-cut', act: 'final-cut' }), hand(job), times, hash);
  };

  it('the clock is sure', () => {
    const job = freshAir(jobAt('final-cut'));
    expect(blockers(light(job, 0, null))).toEqual(['act-clock']);
    expect(blockers(light(job, 0, 120_001))).toEqual(['act-clock']);
    expect(light(job, 0, 120_000).ok).toBe(true);
  });

  it('air that was read after the flame began does not count', () => {
    const job = jobAt('final-cut');
    job.minutes(90);
    freshAir(job);
    expect(light(job, -60).ok).toBe(true);
    expect(blockers(light(job, -20))).toContain('gas-fresh');
    expect(light(job, 1).ok).toBe(true);
  });

  it('a site reading whose clock is in doubt stops it, also after point 1 was released', () => {
    const job = freshAir(jobAt('final-cut'));
    const time = new Date(job.now).toISOString();
    const times = { device: time, corrected: time, received: time, doubtMs: null };
    const command = job.command('record', { point: 'site', entries: [entry('gas.cellar.oxygen', '20.9', 'pct')] });
    const decision = decide(job.job, command, hand(job), times, hash);
    if (!decision.ok) throw new Error(decision.refusal.code);
    decision.events.forEach((event) => (job.state = evolve(job.id, job.state, event)));
    expect(blockers(light(job))).toContain('gas-clock');
  });

  it.each([
    ['a meter out of calibration', 'meter-old', 'calibration.gas.meter'],
    ['a meter that is no gas meter', 'pyrometer-1', 'listed.gas.meter'],
    ['a meter that nobody knows', 'my own', 'listed.gas.meter'],
  ])('%s stops it', (_name, meter, limit) => {
    const plan = aPlan();
    const old = { ...plan.instruments[0]!, id: 'meter-old', calibratedUntil: '2026-09-13' };
    const job = freshAir(jobAt('final-cut', { ...plan, instruments: [...plan.instruments, old] }));
    job.do('record', { point: 'site', entries: [entry('gas.meter', meter)] }, hand(job));
    expect(blockers(light(job))).toContain(limit);
  });

  it('yesterday’s bump test stops it', () => {
    const job = jobAt('final-cut');
    job.minutes(24 * 60);
    const entries = [...cleanAir(), entry('permit.expires', new Date(job.now + 3_600_000).toISOString())];
    job.do('record', { point: 'site', entries }, hand(job));
    expect(blockers(light(job))).toEqual(['gas.bump-tested']);
    job.do('record', { point: 'site', entries: [entry('gas.bump-tested', 'yes')] }, hand(job));
    expect(light(job).ok).toBe(true);
  });

  it.each(['gas.bore.flammable', 'gas.cellar.h2s', 'gas.annulus.co'])('less than nothing of %s stops it', (field) => {
    const job = freshAir(jobAt('final-cut'));
    job.do(
      'record',
      { point: 'site', entries: [entry(field, '-1', field.endsWith('flammable') ? 'pct' : 'ppm')] },
      hand(job),
    );
    expect(blockers(light(job))).toEqual([`${field}.zeroed`]);
  });
});

describe('a plug that the test put back', () => {
  it('keeps fire off the joint until it is out again', () => {
    const job = jobAt('pressure-test-held');
    recordPoint(job, 'pressure-test-held');
    expect(job.job.custody[0]).toMatchObject({ out: false, back: 'same' });
    job.do('reopen', reopen(job, 'pass-4-inspected'), rep(job));
    freshAir(job);
    const struck = job.try('begin-act', { point: 'pass-4-inspected', act: 'pass' }, hand(job));
    expect(blockers(struck)).toContain('plug.1.back-in');
    job.do('reopen', reopen(job, 'test-plug-removed'), rep(job));
    expect(job.refused('present', { point: 'test-plug-removed', ...job.signing('test-plug-removed') }, hand(job))).toBe(
      'outside-stop',
    );
    job.do('record', { point: 'test-plug-removed', entries: [entry('plug.1.out', 'yes')] }, hand(job));
    job.do('present', { point: 'test-plug-removed', ...job.signing('test-plug-removed') }, hand(job));
    releasePoint(job, 'test-plug-removed');
    freshAir(job);
    expect(job.try('begin-act', { point: 'preheat-reached', act: 'preheat' }, hand(job)).ok).toBe(true);
  });
});

describe('the root pass', () => {
  it('is not struck before the head is tacked', () => {
    const job = freshAir(jobAt('pass-1-inspected'));
    expect(blockers(job.try('begin-act', { point: 'pass-1-inspected', act: 'pass' }, hand(job)))).toContain(
      'tacked-first',
    );
  });
});
