import { portsOf } from '../hold-points/ports';
import { sequenceOf } from '../hold-points/sequence';
import type { Times } from './actor';
import type { JobPlan } from './plan';
import { blankPoint, openNext } from './points';
import type { JobState } from './state';

/** What a setting of a head begins with: point 1 open, nothing read on site, and every test port as it came. */
export const beginSetting = (
  plan: JobPlan,
  at: Times,
): Pick<JobState, 'rounds' | 'points' | 'site' | 'custody' | 'headSet'> => ({
  rounds: [],
  points: openNext(sequenceOf(plan.procedure.passes.length, []).map(blankPoint), at),
  site: {},
  custody: portsOf(plan).map((port) => ({ port, out: false, where: null, holder: null, back: null })),
  headSet: false,
});
