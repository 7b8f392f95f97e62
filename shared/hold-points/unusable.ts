import type { PointContext } from './context';
import { commonPractice, judgeFact } from './judging';
import type { Verdict } from './verdict';

/**
 * Readings that are all there but from which nothing can be worked out, such as a length of ten thousand inches: a
 * stop, so that no limit is passed only because it could not be held against anything.
 */
export const judgeUsable = (context: PointContext, limit: string, fields: string[], found: boolean): Verdict[] =>
  judgeFact(context, {
    limit,
    kind: 'stop',
    about: fields,
    source: commonPractice,
    says: 'readings-usable',
    holds: fields.every((field) => context.number(field) !== undefined) ? found : undefined,
  }).filter((verdict) => verdict.outcome === 'outside');
