import { describe, expect, it } from 'vitest';
import type { CommandOf } from '../../../shared/contracts/commands';
import { ownerOf } from '../../../shared/hold-points/points';
import { concessionTotal } from '../../../shared/job/decide-failure';
import type { JobPlan } from '../../../shared/job/plan';
import { currentPoint } from '../../../shared/job/points';
import { reviewPoint } from '../../../shared/job/review';
import { demoHeads } from '../../../server/demo/heads';
import { demoProcedures } from '../../../server/demo/procedures';
import { casingOf } from '../../../server/services/casing-of';
import { aJob, hash, type TestJob } from '../../support/a-job';
import { aPlan } from '../../support/a-plan';
import { nextStep } from '../../support/good-readings';

const welder = (job: TestJob) => job.person('welder');

function workOnPoint(job: TestJob): void {
  for (let steps = 0; steps < 60; steps += 1) {
    const point = currentPoint(job.job);
    const step = point && nextStep(job.job, point, job.times().corrected);
    if (!point || !step) return;
    const id = point.place.id;
    if (step.do === 'record') job.do('record', { point: step.point, entries: step.entries }, welder(job));
    else if (step.do === 'add-photo') {
      const photo = { previewSha256: null, width: 64, height: 48, takenAt: null };
      job.do('add-photo', { point: id, shot: step.shot, sha256: hash(step.shot), ...photo }, welder(job));
    } else job.do(step.do, { point: id, act: step.act } as CommandOf<'begin-act'>['body'], welder(job));
    job.minutes(step.minutes);
  }
  throw new Error('the point never became complete');
}

function walkToTheEnd(plan: JobPlan): TestJob {
  const job = aJob(plan);
  job.do('name-direction', { direction: 'mud-tanks', words: null }, job.person('tool_pusher'));
  for (let point = currentPoint(job.job); point; point = currentPoint(job.job)) {
    workOnPoint(job);
    const id = point.place.id;
    const review = reviewPoint(job.job, job.point(id));
    expect([...review.stops, ...review.holds], id).toEqual([]);
    job.do('present', { point: id, ...job.signing(id) }, welder(job)).minutes(3);
    const statements = [...review.statements];
    job.do('release', { point: id, ...job.signing(id), statements }, job.person(ownerOf[point.place.kind]));
  }
  return job;
}

describe('good readings', () => {
  it('carry the invented job from the first point to the last without a concession', () => {
    const job = walkToTheEnd(aPlan());
    job.do('seal', { concessions: 0, ...job.signingJob() }, job.person('company_rep'));
    expect(job.job.status).toBe('sealed');
    expect(concessionTotal(job.job)).toBe(0);
  });

  it.each([
    ['two seals and two ports', 1, 0, '68'],
    ['no seal, welded on both sides', 2, 1, '32'],
  ])('carry a head with %s', (_name, head, procedure, weightLbFt) => {
    const odIn = demoHeads[head]?.casingOdIn ?? '';
    const casing = casingOf({ odIn, weightLbFt, grade: 'J55' }) ?? {};
    const plan = aPlan({ head: demoHeads[head], procedure: demoProcedures[procedure], casing });
    expect(walkToTheEnd(plan).job.points.every((point) => point.status === 'released')).toBe(true);
  });
});
