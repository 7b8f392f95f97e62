import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import type { JobPlan } from '../../../shared/job/plan';
import { allRead, aPass, fillets, kind, looked, rods, struck } from '../../support/a-pass';
import { aPlan } from '../../support/a-plan';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';
import {
  computedOf,
  expectPlainLimits,
  expectWords,
  fieldsOf,
  isRequired,
  judged,
  sourceOf,
} from '../../support/judged';

describe('the look', () => {
  it.each([
    ['none', 'stop within'],
    ['present', 'stop outside'],
    ['repaired', 'hold outside'],
  ])('with a crack %s is a %s', (state, expected) => {
    expect(judged(aPass(looked({ 'look.crack.state': state, 'look.crack.clock': '4' })), 'look.crack.state')).toBe(
      expected,
    );
  });

  it.each(['porosity', 'slag', 'overlap', 'arc-strike'])('holds %s that is left in', (found) => {
    const field = `look.${found}.state`;
    expect(judged(aPass({ [field]: 'present' }), field)).toBe('hold outside');
    expect(judged(aPass({ [field]: 'repaired' }), field)).toBe('hold within');
    expect(judged(aPass(), field)).toBe('hold within');
  });

  it('asks where it is, and how it was repaired, only when there is something to tell', () => {
    expect(isRequired(aPass(), 'look.slag.clock')).toBe(false);
    expect(isRequired(aPass({ 'look.slag.state': 'present' }), 'look.slag.clock')).toBe(true);
    expect(isRequired(aPass({ 'look.slag.state': 'present' }), 'look.slag.how')).toBe(false);
    expect(isRequired(aPass({ 'look.slag.state': 'repaired' }), 'look.slag.how')).toBe(true);
  });

  it.each([
    [0.03125, 'hold within'],
    [0.0313, 'hold outside'],
  ])('takes undercut of %s in as a %s', (undercut, expected) => {
    expect(judged(aPass({ undercut }), 'undercut')).toBe(expected);
    expect(sourceOf(aPass({ undercut }), 'undercut')).toBe('standard AWS D1.1');
  });
});

describe('the fillet leg', () => {
  const cap = (leg: number, own: { gap?: number; plan?: JobPlan; pass?: number } = {}) =>
    aPointContext({
      kind,
      pass: own.pass ?? 4,
      plan: own.plan ?? aPlan(),
      readings: { ...allRead, 'fillet-leg': leg },
      acts: struck,
      earlier:
        own.gap === undefined
          ? []
          : [
              {
                kind: 'valve-orientation',
                readings: { 'gap.12': 0, 'gap.3': own.gap, 'gap.6': 0.03125, 'gap.9': 0.03125 },
              },
            ],
    });

  it.each([
    [0.4999, 'hold outside'],
    [0.5, 'hold within'],
  ])('of %s in is a %s at the last pass', (leg, expected) => {
    expect(judged(cap(leg), 'fillet-leg')).toBe(expected);
  });

  it('is longer by a gap over 1/16 in, and not by a smaller one', () => {
    expect(judged(cap(0.5, { gap: 0.0625 }), 'fillet-leg')).toBe('hold within');
    expect(judged(cap(0.5, { gap: 0.125 }), 'fillet-leg')).toBe('hold outside');
  });

  it('is measured at the last pass of each side only', () => {
    const passes = fillets();
    passes[3] = { ...passes[3]!, weld: 'inside' };
    const plan = aPlan({ procedure: { passes, insideLegIn: '0.25' } });
    const asks = (pass: number) => fieldsOf(cap(0.25, { plan, pass })).some((field) => field.key === 'fillet-leg');
    expect([1, 2, 3, 4].map(asks)).toEqual([false, false, true, true]);
    expect(judged(cap(0.25, { plan, pass: 4 }), 'fillet-leg')).toBe('hold within');
    expect(judged(cap(0.25, { plan, pass: 3 }), 'fillet-leg')).toBe('hold outside');
  });

  it('is measured at the last repair pass', () => {
    const asks = (pass: number) => fieldsOf(aPass({}, { pass, round: 1 })).some((field) => field.key === 'fillet-leg');
    expect([1, 2].map(asks)).toEqual([false, true]);
  });
});

describe('the tacks', () => {
  const tacked: ReadingSpecs = {
    'tacked.holes': '1 and 2',
    'tacked.offset.a': 36.2,
    'tacked.offset.b': 36,
    'tacked.length': 12,
    'tacked.level.x': 0.3,
    'tacked.level.y': 0,
    'tacked.height': 6.5,
  };

  it('stand before the first pass of the first go, with level, two-hole and height again', () => {
    const acts = (pass: number, round: number) =>
      definitionOf(kind)
        .acts(aPass({}, { pass, round }))
        .map((act) => act.key);
    expect(acts(1, 0)).toEqual(['tacks', 'pass']);
    expect(acts(2, 0)).toEqual(['pass']);
    expect(acts(1, 1)).toEqual(['pass']);
    const first = aPass(tacked, { pass: 1 });
    expect(judged(first, 'tacked.rotation')).toBe('hold outside');
    expect(judged(first, 'tacked.tilt')).toBe('hold outside');
    expect(judged(first, 'tacked.datum-height')).toBe('hold outside');
    expect(judged(aPass(tacked), 'tacked.rotation')).toBeUndefined();
  });
});

describe('what a pass comes to', () => {
  it('counts the passes laid and weighs the metal against the plan', () => {
    const context = aPointContext({
      kind,
      pass: 2,
      readings: allRead,
      acts: struck,
      earlier: [{ kind, pass: 1, readings: rods(1, { count: 4 }), acts: struck }],
    });
    const { beads, 'weld-metal': metal, 'weld-metal-plan': plan } = computedOf(context);
    expect(beads).toBe('2');
    // ten rods of 1/8 in: 10 · π/4 · 0.125² · 12 · 0.2836 · 0.9
    expect(Number(metal)).toBeCloseTo(0.3759, 3);
    // leg 1/2 in round 9.625 in: 0.125 in² · 2π · (4.8125 + 0.1667) in · 0.2836
    expect(Number(plan)).toBeCloseTo(1.109, 3);
  });

  it('has words for all that it shows', () => {
    const outside = looked({ 'look.crack.state': 'repaired', 'look.crack.clock': '4', 'look.slag.state': 'present' });
    for (const context of [aPass({}, { pass: 1 }), aPass(outside, { pass: 4 }), aPass({}, { pass: 2, round: 1 })]) {
      expectWords(context);
      expectPlainLimits(context);
    }
  });
});
