import { describe, expect, it } from 'vitest';
import { concessionTotal } from '../../../shared/job/decide-failure';
import { planFaults } from '../../../shared/job/plan-faults';
import { reviewPoint } from '../../../shared/job/review';
import { aJob, type TestJob } from '../../support/a-job';
import { aPlan, companyRep, coordinator, helper, welder } from '../../support/a-plan';
import { presentPoint, recordPoint, releasePoint, walkPoint, walkTo } from '../../support/drive';
import { blockers, entry, freshAir, hand, jobAt, reason, reopen, rep } from '../../support/job-steps';

describe('a direction', () => {
  it('that is named again is marked again before the lift', () => {
    const job = jobAt('seal-greased-and-checked');
    job.do('name-direction', { direction: 'mud-tanks', words: null }, job.person('tool_pusher')).minutes(1);
    const marked = entry('direction-marked', 'yes');
    job
      .do('record', { point: 'seal-greased-and-checked', entries: [marked, entry('seal.sound', 'yes')] }, hand(job))
      .minutes(1);
    job.do('name-direction', { direction: 'doghouse', words: null }, job.person('tool_pusher')).minutes(1);
    const lift = { point: 'seal-greased-and-checked', act: 'set-head' };
    expect(blockers(job.try('begin-act', lift, hand(job)))).toEqual(['direction-marked']);
    job.do('record', { point: 'seal-greased-and-checked', entries: [marked] }, hand(job));
    job.do('begin-act', lift, hand(job));
  });

  it('that is none of the known ones comes in words', () => {
    const job = aJob();
    const name = (words: string | null) => ({ direction: 'other' as const, words });
    expect(job.refused('name-direction', name(null), job.person('tool_pusher'))).toBe('direction-without-words');
    job.do('name-direction', name('water tank'), job.person('tool_pusher'));
  });
});

describe('a concession', () => {
  const lowCut = { 'cut.12': '24.1', 'cut.3': '24.1', 'cut.6': '24.1', 'cut.9': '24.1' };
  const presented = (): TestJob => {
    const job = jobAt('final-cut');
    const mark = Number(reviewPoint(job.job, job.point('final-cut')).computed.find((one) => one.key === 'mark')?.value);
    recordPoint(job, 'final-cut', Object.fromEntries(Object.keys(lowCut).map((key) => [key, String(mark + 0.125)])));
    presentPoint(job, 'final-cut');
    return job;
  };
  const items = (job: TestJob) =>
    reviewPoint(job.job, job.point('final-cut')).unconceded.map(({ limit, basis }) => ({ limit, basis, reason }));
  const concede = (job: TestJob, own = items(job)) => ({ point: 'final-cut', items: own, ...job.signing('final-cut') });

  it('is given once', () => {
    const job = presented();
    const twice = items(job);
    expect(job.refused('concede', concede(job, [...twice, ...twice]), rep(job))).toBe('nothing-to-concede');
    job.do('concede', concede(job), rep(job));
    expect(job.refused('concede', concede(job, twice), rep(job))).toBe('nothing-to-concede');
    expect(concessionTotal(job.job)).toBe(1);
  });

  it('is void and not counted once it was read again', () => {
    const job = presented();
    job.do('concede', concede(job), rep(job));
    job.do('withdraw', { point: 'final-cut', reason: null }, hand(job)).minutes(1);
    const again = job.point('final-cut').readings['cut.12']!.at(-1)!.value;
    job.do('record', { point: 'final-cut', entries: [entry('cut.12', again, 'in')] }, hand(job));
    expect(concessionTotal(job.job)).toBe(0);
    presentPoint(job, 'final-cut');
    releasePoint(job, 'final-cut');
    expect(concessionTotal(job.job)).toBe(1);
    expect(job.point('final-cut').concessions).toHaveLength(2);
  });

  it('is void when the limit itself has moved', () => {
    const job = presented();
    job.do('concede', concede(job), rep(job));
    const { terms } = job.job.plan;
    const tighter = {
      ...terms,
      settings: { ...terms.settings, cutLowIn: { value: '0.03125', source: 'job' as const } },
    };
    job.do('change-terms', { terms: tighter, reason, ...job.signingJob() }, rep(job));
    const release = { point: 'final-cut', statements: [], ...job.signing('final-cut') };
    expect(job.refused('release', release, rep(job))).toBe('outside-hold');
  });
});

describe('terms', () => {
  const changed = (job: TestJob, own: object) => ({
    terms: { ...job.job.plan.terms, ...own },
    reason,
    ...job.signingJob(),
  });

  it('that cannot work are not put in force', () => {
    const job = aJob();
    const test = { ...job.job.plan.terms.test, pressurePsi: 2900 };
    expect(job.refused('change-terms', changed(job, { test }), rep(job))).toBe('plan-not-workable');
    const settings = { ...job.job.plan.terms.settings, gasFreshMin: { value: '9999', source: 'job' as const } };
    expect(job.refused('change-terms', changed(job, { settings }), rep(job))).toBe('plan-not-workable');
  });

  it('of the air become stricter at any time and laxer only where no flame has used them', () => {
    const job = jobAt('bevel-prep');
    const fresh = (value: string) => {
      const settings = { ...job.job.plan.terms.settings, gasFreshMin: { value, source: 'job' as const } };
      return changed(job, { settings });
    };
    expect(job.refused('change-terms', fresh('90'), rep(job))).toBe('terms-in-use');
    job.do('change-terms', fresh('30'), rep(job));
    freshAir(job).minutes(31);
    expect(blockers(job.try('begin-act', { point: 'bevel-prep', act: 'bevel' }, hand(job)))).toEqual(['gas-fresh']);
  });

  it('do not pass for common practice with another value', () => {
    const job = aJob();
    const settings = {
      ...job.job.plan.terms.settings,
      rotationDeg: { value: '2', source: 'common-practice' as const },
    };
    job.do('change-terms', changed(job, { settings }), rep(job));
    expect(job.job.plan.terms.settings.rotationDeg).toEqual({ value: '2', source: 'job' });
  });

  it('that change while a point is presented are not released unseen', () => {
    const job = jobAt('final-cut');
    recordPoint(job, 'final-cut');
    presentPoint(job, 'final-cut');
    const seen = job.signing('final-cut');
    const settings = { ...job.job.plan.terms.settings, cutSpreadIn: { value: '0.02', source: 'job' as const } };
    job.do('change-terms', changed(job, { settings }), rep(job));
    expect(job.refused('release', { point: 'final-cut', statements: [], ...seen }, rep(job))).toBe('content-changed');
  });
});

describe('a head that is set again', () => {
  const again = (job: TestJob, own = {}) => ({
    reason,
    head: { ...job.job.plan.head, ...own },
    targetHeightIn: '5',
    ...job.signingJob(),
  });

  it('has to fit the casing and the procedure', () => {
    const job = jobAt('test-plug-removed');
    expect(job.refused('set-again', again(job, { casingOdIn: '13.375' }), rep(job))).toBe('plan-not-workable');
  });

  it('leaves work stopped and the old air behind', () => {
    const job = jobAt('test-plug-removed');
    job.do('stop-work', { reason }, hand(job));
    job.do('set-again', again(job), rep(job));
    expect(job.job.stopped).not.toBeNull();
    expect(job.job.site).toEqual({});
    expect(job.job.earlierSettings[0]?.site['gas.cellar.oxygen']).toHaveLength(1);
    job.do('resume-work', { note: reason, ...job.signingJob() }, rep(job));
    walkPoint(job, 'hot-work-clearance');
  });

  it('takes nothing that was captured for the first setting', () => {
    const job = jobAt('test-plug-removed').minutes(10);
    job.do('set-again', again(job), rep(job));
    job.minutes(-5);
    const entries = [entry('fire-watch', 'P. Lind')];
    expect(job.refused('record', { point: 'hot-work-clearance', entries }, hand(job))).toBe('of-earlier-setting');
    job.minutes(6).do('record', { point: 'hot-work-clearance', entries }, hand(job));
  });
});

describe('a repair round', () => {
  it('is gone when a point before it is reopened, and the next one has a new name', () => {
    const job = jobAt('pressure-test-held');
    job.do('open-repair-round', { reason, passes: 1, ...job.signingJob() }, rep(job));
    walkPoint(job, 'test-plug-removed-r1');
    expect(job.refused('record', { point: 'pressure-test-held', entries: [entry('leak', 'none')] }, hand(job))).toBe(
      'point-shut',
    );
    job.do('reopen', reopen(job, 'pass-4-inspected'), rep(job));
    expect(job.point('pressure-test-held').carriedInto).toBeNull();
    expect(
      job.refused('record', { point: 'preheat-reached-r1', entries: [entry('joint-dry', 'yes')] }, hand(job)),
    ).toBe('point-shut');
    walkTo(job, 'pressure-test-held');
    job.do('open-repair-round', { reason, passes: 1, ...job.signingJob() }, rep(job));
    expect(job.job.points.find((point) => point.status === 'open')?.place.id).toBe('test-plug-removed-r2');
    walkTo(job, null);
    job.do('seal', { concessions: concessionTotal(job.job), ...job.signingJob() }, rep(job));
  });
});

describe('a stop while a point is presented', () => {
  it('holds the release until work is resumed on fresh air, and on a hot joint on fresh heat and a look', () => {
    const job = jobAt('pass-2-inspected');
    recordPoint(job, 'pass-2-inspected');
    presentPoint(job, 'pass-2-inspected');
    job.do('stop-work', { reason }, job.person('tool_pusher'));
    const release = () => ({ point: 'pass-2-inspected', statements: [], ...job.signing('pass-2-inspected') });
    expect(job.refused('release', release(), rep(job))).toBe('work-stopped');
    job.minutes(70);
    const resume = () => ({ note: reason, ...job.signingJob() });
    expect(blockers(job.try('resume-work', resume(), rep(job))).sort()).toEqual([
      'gas-fresh',
      'resume-cracks',
      'resume-preheat',
    ]);
    freshAir(job);
    job.do(
      'record',
      { point: 'site', entries: [entry('resume.temperature', '300', 'degF'), entry('resume.cracks', 'none')] },
      hand(job),
    );
    job.do('resume-work', resume(), rep(job));
    releasePoint(job, 'pass-2-inspected');
  });
});

describe('people', () => {
  it('stand on one side of a job', () => {
    const job = aJob();
    const person = (account: typeof welder, role: 'welder' | 'company_rep' | 'coordinator') => ({
      person: { ...account, role, qualifications: [] },
    });
    const office = { ...coordinator, roles: ['coordinator' as const] };
    expect(job.refused('assign-person', person(welder, 'company_rep'), office)).toBe('roles-not-together');
    expect(job.refused('assign-person', person(companyRep, 'welder'), office)).toBe('roles-not-together');
    job.do('assign-person', person(coordinator, 'welder'), office);
    const plan = aPlan();
    const both = { ...plan, people: [...plan.people, { ...welder, role: 'tool_pusher' as const, qualifications: [] }] };
    expect(planFaults(both, '2026-09-14').map((fault) => fault.limit)).toContain('on-both-sides');
  });

  it('may be welder and coordinator in one, and are qualified as the welder that they are', () => {
    const plan = aPlan();
    const people = [{ ...welder, role: 'coordinator' as const, qualifications: [] }, ...plan.people];
    const job = aJob({ ...plan, people });
    walkTo(job, null);
    expect(job.job.points.every((point) => point.status === 'released')).toBe(true);
  });

  it('measure under the name that the job knows, and only when they are on it', () => {
    const job = aJob();
    const by = (accountId: string) => ({
      point: 'hot-work-clearance',
      entries: [{ ...entry('fire-watch', 'P. Lind'), measuredBy: { accountId, name: 'Somebody Else' } }],
    });
    expect(job.refused('record', by('0b1f6c1e-3c5a-4d1f-9a51-6a0c9a3f1fff'), hand(job))).toBe('measurer-not-on-job');
    job.do('record', by(helper.accountId), hand(job));
    expect(job.point('hot-work-clearance').readings['fire-watch']?.[0]?.measuredBy).toEqual(helper);
  });
});
