import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import type { PointKind } from '../../../shared/hold-points/points';
import limits from '../../../shared/locales/en/limits';
import fitUp from '../../../shared/locales/en/limits/fit-up';
import stub from '../../../shared/locales/en/limits/stub';
import points from '../../../shared/locales/en/points';
import { hasWords, say, type Formatters } from '../../../shared/locales/say';
import { aPlan, type PlanOverrides } from '../../support/a-plan';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';

const messages = { limits, points };
const plainly: Formatters = {
  quantity: (value, unit) => `${value} ${unit}`,
  instant: (iso) => iso,
  day: (date) => date,
  number: (value) => String(value),
};

const kinds: PointKind[] = [
  'height-takeoff',
  'final-cut',
  'bevel-prep',
  'seal-greased-and-checked',
  'valve-orientation',
];
const plans: PlanOverrides[] = [
  {},
  { terms: { datum: 'base' } },
  { terms: { datum: 'outlet' }, head: { seals: 0, sealAboveBaseIn: [] } },
  { head: { seals: 2, sealAboveBaseIn: ['7.75', '6'], welds: 'outside-and-inside', ports: 2 } },
];

/** Every field answered: numbers with one figure, checks and choices with their first or last answer. */
const filled = (kind: PointKind, plan: PlanOverrides, figure: string, last: boolean): ReadingSpecs => {
  const empty = aPointContext({ kind, plan: aPlan(plan) });
  const fields = definitionOf(kind)
    .groups(empty)
    .flatMap((group) => group.fields);
  return Object.fromEntries(
    fields.map(({ key, of }): [string, string] => {
      if (of.type === 'check') return [key, last ? 'no' : 'yes'];
      if (of.type === 'choice') return [key, (last ? of.choices.at(-1) : of.choices[0]) ?? ''];
      return [key, of.type === 'quantity' ? figure : 'H-4471'];
    }),
  );
};

const takeoff = { kind: 'height-takeoff' as const, readings: filled('height-takeoff', {}, '2', false) };
const contexts = kinds.flatMap((kind) =>
  plans.flatMap((plan) =>
    (['0', '3', '20000'] as const).flatMap((figure) =>
      [false, true].map((last) =>
        aPointContext({
          kind,
          plan: aPlan(plan),
          readings: filled(kind, plan, figure, last),
          earlier: kind === 'height-takeoff' ? [] : [takeoff],
        }),
      ),
    ),
  ),
);

describe('the words of points 2 to 6', () => {
  it('name every group, field, choice, photo, act, caution and computed value', () => {
    const missing = new Set<string>();
    for (const context of contexts) {
      const { kind } = context.point.place;
      const definition = definitionOf(kind);
      const groups = definition.groups(context);
      const fields = groups.flatMap((group) => group.fields);
      const keys = [
        'title',
        'lead',
        ...groups.map((group) => `groups.${group.key}`),
        ...fields.map((field) => `fields.${field.key}`),
        ...fields.flatMap(({ key, of }) =>
          of.type === 'choice' ? of.choices.map((one) => `choices.${key}.${one}`) : [],
        ),
        ...definition.shots(context).map((shot) => `shots.${shot.key}`),
        ...definition.acts(context).map((act) => `acts.${act.key}`),
        ...definition.cautions(context).map((caution) => `cautions.${caution}`),
        ...definition.compute(context).map((one) => `computed.${one.key}`),
      ];
      for (const key of keys) if (!hasWords(messages, `points.${kind}.${key}`)) missing.add(`${kind}.${key}`);
    }
    expect([...missing]).toEqual([]);
  });

  it('say every verdict, inside and outside, with nothing left in braces', () => {
    const unsaid = new Set<string>();
    for (const context of contexts) {
      const definition = definitionOf(context.point.place.kind);
      const before = definition
        .acts(context)
        .flatMap((act) => definition.beforeAct?.(context, act.key, '2026-09-14T12:00:00.000Z') ?? []);
      for (const { text } of [...definition.judge(context), ...before]) {
        for (const outcome of ['within', 'outside']) {
          const key = text.key.replace(/\.(within|outside)$/, `.${outcome}`);
          const said = say(messages, { ...text, key }, plainly);
          if (said === key || /[{}]/.test(said)) unsaid.add(`${key}: ${said}`);
        }
      }
    }
    expect([...unsaid]).toEqual([]);
  });

  it('give every limit of a point its own name', () => {
    for (const context of contexts) {
      const names = definitionOf(context.point.place.kind)
        .judge(context)
        .map((verdict) => verdict.limit);
      expect(new Set(names).size).toBe(names.length);
      for (const name of names) expect(name).toMatch(/^[a-z0-9.-]+$/);
    }
  });

  it('do not overwrite the words of another area', () => {
    for (const [key, words] of Object.entries({ ...stub, ...fitUp })) {
      expect(limits[key as keyof typeof limits]).toBe(words);
    }
  });

  it('never advise to cut more when the cut is low', () => {
    for (const key of ['cut-low', 'no-second-cut'] as const) expect(stub[key].outside).toContain('Do not cut more.');
  });
});
