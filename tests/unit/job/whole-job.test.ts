import { describe, expect, it } from 'vitest';
import { presentPoint, recordPoint, releasePoint, walkPoint, walkTo } from '../../support/drive';
import { foldEvents } from '../../../shared/job/evolve';
import { concessionTotal } from '../../../shared/job/decide-failure';
import { aPlan, type PlanOverrides } from '../../support/a-plan';
import { checkSignatures } from '../../../shared/job/check-signatures';
import { aJob, hash } from '../../support/a-job';

const statuses = (job: ReturnType<typeof aJob>) => job.job.points.map((point) => `${point.place.id} ${point.status}`);

describe('a whole job', () => {
  it('goes from planned to sealed through every hold point in order', async () => {
    const job = aJob();
    walkTo(job, null);
    expect(job.job.points.every((point) => point.status === 'released')).toBe(true);
    job.do('seal', { concessions: concessionTotal(job.job), ...job.signingJob() }, job.person('company_rep'));
    expect(job.job.status).toBe('sealed');
    expect(job.refused('stop-work', { reason: 'too late' }, job.person('welder'))).toBe('not-running');
    expect(foldEvents(job.id, JSON.parse(JSON.stringify(job.events)))).toEqual(job.job);
  });

  const inside = { ...aPlan().procedure.passes[0]!, weld: 'inside' as const };
  it.each<[string, PlanOverrides]>([
    ['one pass', { procedure: { passes: aPlan().procedure.passes.slice(0, 1) } }],
    [
      'twelve passes',
      { procedure: { passes: Array.from({ length: 12 }, (_, n) => aPlan().procedure.passes[n % 4]!) } },
    ],
    [
      'no seal',
      {
        head: { seals: 0, sealAboveBaseIn: [], sealRatedPsi: null, sealRatedF: null, welds: 'outside-and-inside' },
        procedure: { passes: [...aPlan().procedure.passes, inside], insideLegIn: '0.25' },
      },
    ],
    ['two seals and two ports', { head: { seals: 2, sealAboveBaseIn: ['7.75', '6.5'], ports: 2 } }],
    ['the outlet as datum', { terms: { datum: 'outlet', targetHeightIn: '-2' } }],
    ['the base as datum', { terms: { datum: 'base', targetHeightIn: '-18' } }],
    ['nitrogen', { terms: { test: { medium: 'nitrogen', pressurePsi: 1000 } } }],
    ['a surface examination', { procedure: { surfaceExam: 'magnetic-particle' } }],
  ])('is walked to its end with %s', async (_name, own) => {
    const job = aJob(aPlan(own));
    walkTo(job, null);
    expect(job.job.points.every((point) => point.status === 'released')).toBe(true);
  });

  it('is sealed only when every point is released and the concessions are read back right', async () => {
    const job = aJob();
    walkTo(job, 'pressure-test-held');
    const seal = (concessions: number) => ({ concessions, ...job.signingJob() });
    expect(job.refused('seal', seal(0), job.person('company_rep'))).toBe('not-all-released');
    walkPoint(job, 'pressure-test-held');
    expect(job.refused('seal', seal(3), job.person('company_rep'))).toBe('concessions-miscounted');
  });
});

describe('a low cut', () => {
  const low = { 'cut.12': '32 1/16', 'cut.3': '32 1/8', 'cut.6': '32 3/16', 'cut.9': '32 1/16' };

  it('is presented, and released only with a reason for each reading that is outside', async () => {
    const job = aJob();
    walkTo(job, 'final-cut');
    recordPoint(job, 'final-cut', low);
    presentPoint(job, 'final-cut');
    const release = { point: 'final-cut', ...job.signing('final-cut'), statements: [] };
    const decision = job.try('release', release, job.person('company_rep'));
    expect(decision).toMatchObject({ ok: false, refusal: { code: 'outside-hold' } });
    if (decision.ok) throw new Error('released');
    expect(decision.refusal.blockers.map((verdict) => verdict.limit).sort()).toEqual(['cut-low', 'cut-spread']);
    releasePoint(job, 'final-cut');
    expect(job.point('final-cut').status).toBe('released');
    expect(concessionTotal(job.job)).toBe(2);
  });

  it('loses its concession to a new reading', async () => {
    const job = aJob();
    walkTo(job, 'final-cut');
    recordPoint(job, 'final-cut', low);
    presentPoint(job, 'final-cut');
    const items = [{ limit: 'cut-low', basis: [] as string[], reason: 'Accepted by the operator.' }];
    expect(
      job.refused('concede', { point: 'final-cut', items, ...job.signing('final-cut') }, job.person('company_rep')),
    ).toBe('verdict-moved');
  });
});

describe('a failed test', () => {
  const failed = { 'hold-readings.3.pressure': '1400' };

  it('goes into a repair round whose own points end in another whole test', async () => {
    const job = aJob();
    walkTo(job, 'pressure-test-held');
    recordPoint(job, 'pressure-test-held', failed);
    expect(
      job.refused(
        'open-repair-round',
        { reason: 'Lost 100 psi.', passes: 2, ...job.signingJob() },
        job.person('welder'),
      ),
    ).toBe('not-yours-to-do');
    job.do(
      'open-repair-round',
      { reason: 'Lost 100 psi at the weld.', passes: 2, ...job.signingJob() },
      job.person('company_rep'),
    );
    expect(statuses(job).slice(-6)).toEqual(
      [
        'pressure-test-held shut',
        'test-plug-removed-r1 open',
        'preheat-reached-r1 shut',
        'pass-1-inspected-r1 shut',
        'pass-2-inspected-r1 shut',
        'cooled-to-touch-r1 shut',
        'pressure-test-held-r1 shut',
      ].slice(1),
    );
    walkTo(job, null);
    job.do('seal', { concessions: concessionTotal(job.job), ...job.signingJob() }, job.person('company_rep'));
    expect(job.job.status).toBe('sealed');
    expect(job.point('pressure-test-held')).toMatchObject({ carriedInto: 1, status: 'shut' });
    expect(Object.keys(job.point('pressure-test-held').readings).length).toBeGreaterThan(5);
  });

  it('opens its round under a signature on the job as it was shown', () => {
    const job = aJob();
    walkTo(job, 'pressure-test-held');
    const shownBefore = job.signingJob();
    recordPoint(job, 'pressure-test-held', failed);
    const round = { reason: 'Lost 100 psi at the weld.', passes: 2 };
    expect(job.refused('open-repair-round', { ...round, ...shownBefore }, job.person('company_rep'))).toBe(
      'content-changed',
    );
    const signed = job.signingJob();
    job.do('open-repair-round', { ...round, ...signed }, job.person('company_rep'));
    expect(job.events.at(-1)).toMatchObject({
      type: 'repair-round-opened',
      body: {
        signature: { meaning: 'signature.open-repair-round', role: 'company_rep', contentHash: signed.contentHash },
      },
    });
    expect(checkSignatures(job.id, job.events, hash)?.every((one) => one.bound)).toBe(true);
  });

  it('is not opened before point 10', async () => {
    const job = aJob();
    walkTo(job, 'bevel-prep');
    expect(
      job.refused(
        'open-repair-round',
        { reason: 'too early', passes: 1, ...job.signingJob() },
        job.person('company_rep'),
      ),
    ).toBe('no-round-here');
  });
});

describe('a head that is cut off again', () => {
  it('begins a second setting at point 1 and keeps the first', async () => {
    const job = aJob();
    walkTo(job, 'pass-2-inspected');
    const head = { ...job.job.plan.head, id: 'head-2', name: 'HD-11-3M rev 3' };
    job.do(
      'set-again',
      { reason: 'The seal rolled.', head, targetHeightIn: '5', ...job.signingJob() },
      job.person('company_rep'),
    );
    expect(job.job).toMatchObject({ setting: 2, headSet: false });
    expect(job.job.earlierSettings[0]?.points.filter((point) => point.status === 'released')).toHaveLength(9);
    expect(job.job.points[0]?.status).toBe('open');
    walkTo(job, null);
    expect(job.job.points.every((point) => point.status === 'released')).toBe(true);
  });
});

describe('the valve', () => {
  it('is released by the tool pusher alone, and what is outside is conceded by the company representative first', async () => {
    const job = aJob();
    walkTo(job, 'valve-orientation');
    recordPoint(job, 'valve-orientation', { 'set.offset.b': '32 1/2' });
    presentPoint(job, 'valve-orientation');
    const release = () => ({ point: 'valve-orientation', ...job.signing('valve-orientation'), statements: [] });
    expect(job.refused('release', release(), job.person('company_rep'))).toBe('not-the-owner');
    expect(job.refused('release', release(), job.person('tool_pusher'))).toBe('outside-hold');
    releasePoint(job, 'valve-orientation');
    expect(job.point('valve-orientation').release?.by.role).toBe('tool_pusher');
    expect(job.point('valve-orientation').concessions[0]?.by.role).toBe('company_rep');
  });

  it('is not named any more once the head has been set', async () => {
    const job = aJob();
    walkTo(job, 'valve-orientation');
    expect(job.refused('name-direction', { direction: 'doghouse', words: null }, job.person('tool_pusher'))).toBe(
      'head-already-set',
    );
  });
});

describe('plug custody', () => {
  it('survives the reopening of an earlier point and must close before the test is presented', async () => {
    const job = aJob();
    walkTo(job, 'preheat-reached');
    expect(job.job.custody[0]).toMatchObject({ out: true, holder: 'W. Calder' });
    job.do(
      'reopen',
      { point: 'valve-orientation', reason: 'Measure again.', ...job.signing('valve-orientation') },
      job.person('company_rep'),
    );
    expect(job.job.custody[0]).toMatchObject({ out: true });
    walkTo(job, 'pressure-test-held');
    recordPoint(job, 'pressure-test-held', { 'plug.1.back': 'not-back' });
    const present = { point: 'pressure-test-held', ...job.signing('pressure-test-held') };
    expect(job.refused('present', present, job.person('welder'))).toBe('outside-stop');
  });
});

describe('time', () => {
  it('stops a flame when the air was read too long ago, judged at the act', async () => {
    const job = aJob();
    walkTo(job, 'final-cut');
    job.minutes(90);
    const decision = job.try('begin-act', { point: 'final-cut', act: 'final-cut' }, job.person('welder'));
    expect(decision).toMatchObject({ ok: false, refusal: { code: 'act-not-ready' } });
    if (!decision.ok) expect(decision.refusal.blockers.map((verdict) => verdict.limit)).toContain('gas-fresh');
  });
});
