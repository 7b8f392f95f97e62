import { clockIsDoubtful, minutesBetween } from '../job/actor';
import type { JobState } from '../job/state';
import { contextAsOf, type PointContext } from './context';
import type { GroupDefinition } from './definition';
import { choice, quantity } from './fields';
import { gasGroups, judgeFlame, permitGroup } from './gas';
import { byProcedure, commonPractice, judgeFact, judgeRange } from './judging';
import type { Verdict } from './verdict';

/** The name under which readings of the site are recorded, whichever point is open. */
export const sitePoint = 'site';

const resumeGroup = (): GroupDefinition => ({
  key: 'resume',
  fields: [
    quantity('resume.temperature', 'degF', { site: true, required: false, likely: { min: 30, max: 700 } }),
    choice('resume.cracks', ['none', 'found'], { site: true, required: false }),
  ],
});

/** What may be read at any time while the job runs. */
export const siteGroups = (): GroupDefinition[] => [...gasGroups(), permitGroup(), resumeGroup()];

const released = (state: JobState, kind: string): boolean =>
  state.points.some((point) => point.place.kind === kind && point.status === 'released');

/** Fire has been on the joint and it has not cooled yet: stopping now calls for fresh heat and a look for cracks. */
export const jointIsHot = (state: JobState): boolean => {
  const live = state.points.filter((point) => point.carriedInto === null);
  const round = live.at(-1)?.place.round ?? 0;
  const inRound = live.filter((point) => point.place.round === round);
  const is = (kind: string) => inRound.some((point) => point.place.kind === kind && point.status === 'released');
  return is('preheat-reached') && !is('cooled-to-touch');
};

const since = (context: PointContext, field: string, stoppedAt: string): boolean => {
  const reading = context.read(field);
  // with a clock in doubt nobody can say that it was read after the stop
  return reading !== undefined && !clockIsDoubtful(reading.at) && minutesBetween(stoppedAt, reading.at.corrected) >= 0;
};

/** Heat that was read before the stop says nothing of the joint now. */
const judgeHeat = (context: PointContext, stoppedAt: string): Verdict[] => {
  const frame = {
    limit: 'resume-preheat',
    kind: 'stop' as const,
    about: ['resume.temperature'],
    source: byProcedure(context),
  };
  if (!since(context, 'resume.temperature', stoppedAt))
    return judgeFact(context, { ...frame, says: 'resume-preheat-unread', holds: false });
  const measured = context.number('resume.temperature');
  const min = Number(context.state.plan.procedure.preheatF.min);
  return judgeRange(context, { ...frame, measured, min, unit: 'degF' });
};

const judgeCracks = (context: PointContext, stoppedAt: string): Verdict[] => {
  const looked = since(context, 'resume.cracks', stoppedAt);
  return judgeFact(context, {
    limit: 'resume-cracks',
    kind: 'stop',
    about: ['resume.cracks'],
    source: commonPractice,
    says: looked ? 'resume-cracks' : 'resume-cracks-unread',
    holds: looked && context.value('resume.cracks') === 'none',
  });
};

/**
 * What must hold before stopped work is resumed, judged at `at`: fresh air and permit; on a hot joint fresh preheat
 * and no crack seen since the stop.
 */
export const judgeResume = (state: JobState, at: string): Verdict[] => {
  const current = state.points.find((point) => point.status !== 'released') ?? state.points[0];
  if (!current || !state.stopped) return [];
  const context = contextAsOf(state, current, at);
  const stoppedAt = state.stopped.at.corrected;
  const air = released(state, 'hot-work-clearance') ? judgeFlame(context, at) : [];
  if (!jointIsHot(state)) return air;
  return [...air, ...judgeHeat(context, stoppedAt), ...judgeCracks(context, stoppedAt)];
};
