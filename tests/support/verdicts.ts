import type { PointContext } from '../../shared/hold-points/context';
import { definitionOf } from '../../shared/hold-points/definitions';
import type { Verdict } from '../../shared/hold-points/verdict';

const judged = (context: PointContext): Verdict[] => definitionOf(context.point.place.kind).judge(context);

/** The verdict on one limit of a point; undefined while nothing is said about it. */
export const verdictOn = (context: PointContext, limit: string): Verdict | undefined =>
  judged(context).find((verdict) => verdict.limit === limit);

/** `within hold`, `outside stop`, ... or `silent`. */
export const ruling = (context: PointContext, limit: string): string => {
  const verdict = verdictOn(context, limit);
  return verdict ? `${verdict.outcome} ${verdict.kind}` : 'silent';
};

/** What stands in the way of beginning an act, by limit. */
export const barring = (context: PointContext, act: string): string[] =>
  (definitionOf(context.point.place.kind).beforeAct?.(context, act, '2026-09-14T12:00:00.000Z') ?? [])
    .filter((verdict) => verdict.outcome === 'outside' && verdict.kind === 'stop')
    .map((verdict) => verdict.limit);

/** One computed value as a number; undefined while it cannot be worked out. */
export const computedAs = (context: PointContext, key: string): number | undefined => {
  const found = definitionOf(context.point.place.kind)
    .compute(context)
    .find((one) => one.key === key);
  return found === undefined ? undefined : Number(found.value);
};

/** The keys of every field that is asked for. */
export const fieldKeys = (context: PointContext): string[] =>
  definitionOf(context.point.place.kind)
    .groups(context)
    .flatMap((group) => group.fields.map((field) => field.key));
