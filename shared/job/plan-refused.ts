import { siteDay } from '../hold-points/site-day';
import type { Times } from './actor';
import { refuse, type Decision } from './decision';
import type { JobPlan } from './plan';
import { planFaults } from './plan-faults';

/** The refusal of a plan that cannot work, with the first reason in its sentence; null when it can. */
export const planRefused = (plan: JobPlan, at: Times): Decision | null => {
  const blockers = planFaults(plan, siteDay(plan.zone, at.corrected)).filter(
    (verdict) => verdict.kind === 'stop' && verdict.outcome === 'outside',
  );
  const [first] = blockers;
  return first ? refuse('plan-not-workable', { blockers, params: { why: first.text } }) : null;
};
