import { describe, expect, it } from 'vitest';
import { timesOf } from '../../../shared/job/actor';
import { reviewPoint } from '../../../shared/job/review';
import { aPlan } from '../../support/a-plan';
import { aJob, TestJob } from '../../support/a-job';
import { aPhoto, cleanAir, clearance, presentedClearance, statementsOfClearance } from '../../support/clearance';

const point = 'hot-work-clearance';
const released = (job: TestJob): TestJob =>
  presentedClearance(job).do(
    'release',
    { point, ...job.signing(point), statements: statementsOfClearance },
    job.person('company_rep'),
  );

describe('a planned job', () => {
  it('stands with its first point open and everything after it shut', () => {
    const { points, status } = aJob().job;
    expect(status).toBe('planned');
    expect(points.map((one) => one.status)).toEqual(['open', ...Array(points.length - 1).fill('shut')]);
  });

  it('is running from its first reading', () => {
    const job = aJob();
    job.do('record', { point, entries: cleanAir() }, job.person('welder'));
    expect(job.job.status).toBe('running');
  });

  it('takes nothing at a shut point', () => {
    const job = aJob();
    const entries = [{ field: 'cut.12', typed: '8', unit: 'in', measuredBy: null }];
    expect(job.refused('record', { point: 'final-cut', entries }, job.person('welder'))).toBe('point-shut');
  });

  it('refuses an answer that it does not understand and says which', () => {
    const job = aJob();
    const entries = [{ field: 'gas.cellar.oxygen', typed: '20.9 psi', unit: 'pct', measuredBy: null }];
    const decision = job.try('record', { point, entries }, job.person('welder'));
    expect(decision).toMatchObject({
      ok: false,
      refusal: { code: 'not-understood', missing: ['field:gas.cellar.oxygen'] },
    });
  });
});

describe('hot work clearance', () => {
  it('is not presented while a reading, the photo or a name is missing', () => {
    const job = aJob();
    job.do('record', { point, entries: clearance(job).slice(1) }, job.person('welder'));
    const decision = job.try('present', { point, ...job.signing(point) }, job.person('welder'));
    expect(decision).toMatchObject({
      ok: false,
      refusal: { code: 'not-complete', missing: ['field:gas.cellar.oxygen', 'shot:meter-at-cellar'] },
    });
  });

  it.each([
    ['gas.cellar.oxygen', '19.4'],
    ['gas.bore.oxygen', '23.6'],
    ['gas.annulus.flammable', '1'],
    ['gas.cellar.h2s', '10'],
    ['gas.bore.co', '35'],
    ['gas.bump-tested', 'no'],
    ['gas.monitor', 'no'],
  ])('is not presented with %s at %s, and nobody can concede it', (field, typed) => {
    const job = aJob();
    job.do('record', { point, entries: clearance(job, { [field]: typed }) }, job.person('welder'));
    job.do('add-photo', { point, ...aPhoto('meter-at-cellar') }, job.person('welder'));
    expect(job.refused('present', { point, ...job.signing(point) }, job.person('welder'))).toBe('outside-stop');
  });

  it('is released by the company representative with his statements, and the next point opens', () => {
    const job = released(aJob());
    expect(job.point(point).status).toBe('released');
    expect(job.point('height-takeoff').status).toBe('open');
    expect(job.point(point).release).toMatchObject({
      signature: { printedName: 'O. Brandt', role: 'company_rep', meaning: 'signature.release' },
      statements: statementsOfClearance,
    });
  });

  it('is not released without a statement', () => {
    const job = presentedClearance(aJob());
    const body = { point, ...job.signing(point), statements: statementsOfClearance.slice(1) };
    expect(job.refused('release', body, job.person('company_rep'))).toBe('statements-missing');
  });

  it('is not the tool pusher’s to release, nor the welder’s', () => {
    const job = presentedClearance(aJob());
    const body = { point, ...job.signing(point), statements: statementsOfClearance };
    expect(job.refused('release', body, job.person('tool_pusher'))).toBe('not-the-owner');
    expect(job.refused('release', body, job.person('welder'))).toBe('not-yours-to-do');
  });

  it('is not released by the account that measured it, whatever roles it holds', () => {
    const job = aJob();
    const rep = job.person('company_rep');
    const entries = clearance(job).map((one) => ({ ...one, measuredBy: { accountId: rep.accountId, name: rep.name } }));
    job.do('record', { point, entries }, job.person('welder'));
    job.do('add-photo', { point, ...aPhoto('meter-at-cellar') }, job.person('welder'));
    job.do('present', { point, ...job.signing(point) }, job.person('welder'));
    const body = { point, ...job.signing(point), statements: statementsOfClearance };
    expect(job.refused('release', body, rep)).toBe('own-evidence');
  });

  it('is sent back with its reason on top and is open again', () => {
    const job = presentedClearance(aJob());
    const contentHash = job.point(point).presentation!.contentHash;
    job.do('send-back', { point, reason: 'The display cannot be read.', contentHash }, job.person('company_rep'));
    expect(job.point(point)).toMatchObject({ status: 'open', sentBack: [{ reason: 'The display cannot be read.' }] });
  });

  it('is released once: the loser hears who was faster and when', () => {
    const job = released(aJob());
    const decision = job.try(
      'release',
      { point, ...job.signing(point), statements: statementsOfClearance },
      job.person('company_rep'),
    );
    expect(decision).toMatchObject({
      ok: false,
      refusal: { code: 'point-already-released', kind: 'conflict', since: { by: { name: 'O. Brandt' } } },
    });
  });

  it('is not released when the content moved since it was looked at', () => {
    const job = presentedClearance(aJob());
    const looked = job.signing(point);
    job.do('record', { point: 'site', entries: cleanAir({ 'gas.cellar.co': '9' }) }, job.person('welder'));
    const decision = job.try(
      'release',
      { point, ...looked, statements: statementsOfClearance },
      job.person('company_rep'),
    );
    expect(decision).toMatchObject({
      ok: false,
      refusal: { code: 'content-changed', since: { by: { name: 'W. Calder' } } },
    });
  });

  it('keeps the air that it was released on when the air is read again later', () => {
    const job = released(aJob()).minutes(50);
    job.do('record', { point: 'site', entries: cleanAir({ 'gas.cellar.oxygen': '20.1' }) }, job.person('welder'));
    expect(reviewPoint(job.job, job.point(point)).context.value('gas.cellar.oxygen')).toBe('20.9');
    expect(job.job.site['gas.cellar.oxygen']).toHaveLength(2);
  });

  it('is taken back by its recorder before the release, not after it', () => {
    const job = presentedClearance(aJob());
    job.do('withdraw', { point, reason: null }, job.person('welder'));
    expect(job.point(point).status).toBe('open');
    const done = released(aJob());
    expect(done.refused('withdraw', { point, reason: null }, done.person('welder'))).toBe('point-already-released');
  });
});

describe('evidence that arrives late', () => {
  const water = [{ field: 'water-level', typed: 'dry', unit: null, measuredBy: null }];

  it('withdraws the presentation when it was captured before it', () => {
    const job = presentedClearance(aJob());
    job.minutes(-1).do('record', { point, entries: water }, job.person('welder', 1));
    expect(job.point(point).status).toBe('open');
    expect(job.events.at(-2)).toMatchObject({ type: 'presentation-withdrawn', body: { cause: 'late-evidence' } });
  });

  it('stands flagged after the release and changes nothing of it', () => {
    const job = released(aJob());
    job.minutes(-1).do('record', { point, entries: water }, job.person('welder', 1));
    expect(job.point(point)).toMatchObject({ status: 'released', readings: { 'water-level': [{ late: true }] } });
    expect(reviewPoint(job.job, job.point(point)).context.value('water-level')).toBeUndefined();
  });

  it('is refused when it was captured after the presentation', () => {
    const job = presentedClearance(aJob()).minutes(5);
    expect(job.refused('record', { point, entries: water }, job.person('welder'))).toBe('point-presented');
  });
});

describe('reopening', () => {
  it('shuts every later point and keeps what was recorded there as superseded', () => {
    const job = released(aJob());
    job.do(
      'record',
      { point: 'height-takeoff', entries: [{ field: 'string.a', typed: '3', unit: 'in', measuredBy: null }] },
      job.person('welder'),
    );
    job.do(
      'reopen',
      { point, reason: 'The float was not looked at.', ...job.signing(point) },
      job.person('company_rep'),
    );
    expect(job.point(point)).toMatchObject({
      status: 'open',
      release: null,
      reopened: [{ reason: 'The float was not looked at.' }],
    });
    expect(job.point(point).superseded).toHaveLength(1);
    expect(job.point('height-takeoff')).toMatchObject({ status: 'shut', readings: {} });
    expect(job.point('height-takeoff').superseded[0]?.readings['string.a']).toHaveLength(1);
  });
});

describe('stopped work', () => {
  it('is stopped by anyone on the job, with a reason, and nothing is lit, presented or released', () => {
    const job = presentedClearance(aJob());
    job.do('stop-work', { reason: 'Lightning within five miles.' }, job.person('tool_pusher'));
    const body = { point, ...job.signing(point), statements: statementsOfClearance };
    expect(job.refused('release', body, job.person('company_rep'))).toBe('work-stopped');
  });

  it('is resumed by the company representative alone, and only with fresh air', () => {
    const job = released(aJob());
    job.do('stop-work', { reason: 'Lightning within five miles.' }, job.person('welder')).minutes(70);
    const resume = () => ({ note: 'The storm has passed.', ...job.signingJob() });
    expect(job.refused('resume-work', resume(), job.person('company_rep'))).toBe('not-ready-to-resume');
    job.do('record', { point: 'site', entries: cleanAir() }, job.person('welder'));
    expect(job.refused('resume-work', resume(), job.person('welder'))).toBe('not-yours-to-do');
    job.do('resume-work', resume(), job.person('company_rep'));
    expect(job.job.stopped).toBeNull();
  });
});

describe('a device whose clock was not checked', () => {
  it('cannot present the air', () => {
    const job = new TestJob(aPlan()).planned();
    const times = job.times.bind(job);
    job.times = () => ({ ...times(), doubtMs: null });
    job.do('record', { point, entries: clearance(job) }, job.person('welder'));
    job.do('add-photo', { point, ...aPhoto('meter-at-cellar') }, job.person('welder'));
    expect(job.refused('present', { point, ...job.signing(point) }, job.person('welder'))).toBe('outside-stop');
  });
});

describe('the plan', () => {
  it('may still be mended by the coordinator before point 1 is released, and by signature after that', () => {
    const job = aJob();
    const terms = { ...job.job.plan.terms, targetHeightIn: '7' };
    const change = () => ({ terms, reason: 'Operator’s letter of today.', ...job.signingJob() });
    job.do('change-terms', change(), job.person('coordinator'));
    released(job);
    expect(job.refused('change-terms', change(), job.person('coordinator'))).toBe('terms-need-signature');
    job.do('change-terms', { ...change(), terms: { ...terms, targetHeightIn: '8' } }, job.person('company_rep'));
    expect(job.job.termsChanges.map((one) => one.signature?.printedName ?? null)).toEqual([null, 'O. Brandt']);
  });

  it('keeps a gas setting that a released point was judged by', () => {
    const job = released(aJob());
    const terms = structuredClone(job.job.plan.terms);
    terms.settings.lelMaxPct = { value: '5', source: 'job' };
    const body = { terms, reason: 'Site rule.', ...job.signingJob() };
    expect(job.refused('change-terms', body, job.person('company_rep'))).toBe('terms-in-use');
  });
});

describe('a command’s times', () => {
  const clock = { deviceAt: '2026-09-14T06:00:00.000Z', offsetMs: 60_000, doubtMs: 300 };

  it('are the device’s own, moved by its offset, and the server’s', () => {
    expect(timesOf(clock, '2026-09-14T09:00:00.000Z')).toEqual({
      device: '2026-09-14T06:00:00.000Z',
      corrected: '2026-09-14T06:01:00.000Z',
      received: '2026-09-14T09:00:00.000Z',
      doubtMs: 300,
    });
  });

  it('are in doubt by as much as a command seems to arrive before it was made', () => {
    expect(timesOf(clock, '2026-09-14T05:51:00.000Z').doubtMs).toBe(600_000);
    expect(timesOf({ ...clock, offsetMs: null }, '2026-09-14T09:00:00.000Z').doubtMs).toBeNull();
  });
});
