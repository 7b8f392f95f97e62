import { cleanAir } from './clearance';
import { aJob, type TestJob } from './a-job';
import { aPlan } from './a-plan';
import { walkTo } from './drive';

export const reason = 'Because it was so on site.';
/** A job walked to where this hold point is open. */
export const jobAt = (until: string, plan = aPlan()): TestJob => {
  const job = aJob(plan);
  walkTo(job, until);
  return job;
};
export const rep = (job: TestJob) => job.person('company_rep');
export const hand = (job: TestJob) => job.person('welder');
export const entry = (field: string, typed: string, unit: string | null = null) => ({
  field,
  typed,
  unit,
  measuredBy: null,
});
export const reopen = (job: TestJob, point: string) => ({ point, reason, ...job.signing(point) });
/** Reads clean air and tests the meter, now. */
export const freshAir = (job: TestJob): TestJob =>
  job.do('record', { point: 'site', entries: [...cleanAir(), entry('gas.bump-tested', 'yes')] }, hand(job));
/** The stops that a refusal lists; none when it was accepted. */
export const blockers = (decision: ReturnType<TestJob['try']>): string[] =>
  decision.ok ? [] : decision.refusal.blockers.map((verdict) => verdict.limit);
