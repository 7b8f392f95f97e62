import type { JobPlan } from '../job/plan';

/** The numbers of the head's test ports: 1, or 1 and 2. */
export const portsOf = (plan: JobPlan): number[] => Array.from({ length: plan.head.ports }, (_, index) => index + 1);
