import { expect } from 'vitest';
import type { PointContext } from '../../shared/hold-points/context';
import { definitionOf } from '../../shared/hold-points/definitions';
import type { FieldDefinition } from '../../shared/hold-points/definition';
import type { Verdict } from '../../shared/hold-points/verdict';
import limits from '../../shared/locales/en/limits';
import points from '../../shared/locales/en/points';
import { hasWords } from '../../shared/locales/say';

/** The one verdict of that limit; undefined where nothing is said yet. A limit that is judged twice is a mistake. */
export const verdictOf = (verdicts: Verdict[], limit: string): Verdict | undefined => {
  const found = verdicts.filter((verdict) => verdict.limit === limit);
  expect(found.length, `verdicts named ${limit}`).toBeLessThan(2);
  return found[0];
};

const judge = (context: PointContext): Verdict[] => definitionOf(context.point.place.kind).judge(context);

/** `stop outside`, `hold within`, ...: the kind and the outcome of one limit, or undefined. */
export const judged = (context: PointContext, limit: string): string | undefined => {
  const verdict = verdictOf(judge(context), limit);
  return verdict && `${verdict.kind} ${verdict.outcome}`;
};

/** The same before an act begins. */
export const judgedBefore = (context: PointContext, act: string, at: string, limit: string): string | undefined => {
  const verdict = verdictOf(definitionOf(context.point.place.kind).beforeAct?.(context, act, at) ?? [], limit);
  return verdict && `${verdict.kind} ${verdict.outcome}`;
};

/** Source of one limit's verdict, as `standard AWS D1.1`. */
export const sourceOf = (context: PointContext, limit: string): string | undefined => {
  const source = verdictOf(judge(context), limit)?.source;
  return source && [source.kind, source.ref].filter(Boolean).join(' ');
};

export const computedOf = (context: PointContext): Record<string, string> =>
  Object.fromEntries(
    definitionOf(context.point.place.kind)
      .compute(context)
      .map((one) => [one.key, one.value]),
  );

export const fieldsOf = (context: PointContext): FieldDefinition[] =>
  definitionOf(context.point.place.kind)
    .groups(context)
    .flatMap((group) => group.fields);

export const isRequired = (context: PointContext, key: string): boolean | undefined =>
  fieldsOf(context).find((field) => field.key === key)?.required;

const sentence = (key: string): string => {
  let at: unknown = { points, limits };
  for (const name of key.split('.')) at = (at as Record<string, unknown>)[name];
  return String(at);
};

const expectSaid = (verdict: Verdict): void => {
  for (const outcome of ['within', 'outside']) {
    const key = verdict.text.key.replace(/(within|outside)$/, outcome);
    expect(hasWords({ points, limits }, key), key).toBe(true);
    for (const [, name] of sentence(key).matchAll(/\{(\w+)\}/g)) {
      expect(Object.keys(verdict.text.params ?? {}), `${key} needs ${name}`).toContain(name);
    }
  }
};

/** Everything that the point can show has words, and every param of a verdict's sentence is given. */
export const expectWords = (context: PointContext): void => {
  const { kind } = context.point.place;
  const definition = definitionOf(kind);
  const has = (key: string) => expect(hasWords({ points, limits }, `points.${kind}.${key}`), key).toBe(true);
  ['title', 'lead'].forEach(has);
  for (const group of definition.groups(context)) {
    has(`groups.${group.key}`);
    for (const field of group.fields) {
      const key = field.key.replace('.#.', '.');
      has(`fields.${key}`);
      if (field.of.type === 'choice') field.of.choices.forEach((choice) => has(`choices.${key}.${choice}`));
    }
  }
  definition.shots(context).forEach((shot) => has(`shots.${shot.key}`));
  definition.acts(context).forEach((act) => has(`acts.${act.key}`));
  definition.statements.forEach((statement) => has(`statements.${statement}`));
  definition.cautions(context).forEach((caution) => has(`cautions.${caution}`));
  definition.compute(context).forEach((one) => has(`computed.${one.key}`));
  definition.judge(context).forEach(expectSaid);
};

/** Names of limits are unique within a point and plain enough for an address. */
export const expectPlainLimits = (context: PointContext): void => {
  const names = judge(context).map((verdict) => verdict.limit);
  expect(new Set(names).size).toBe(names.length);
  for (const name of names) expect(name).toMatch(/^[a-z0-9.-]+$/);
};
