import type { Verdict } from '../hold-points/verdict';
import type { JobPlan } from './plan';

/** What cannot work, or should be looked at, about a plan. */
export const planFaults = (_plan: JobPlan): Verdict[] => [];
