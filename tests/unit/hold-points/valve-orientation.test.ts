import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import { gapToAddIn } from '../../../shared/hold-points/fit-up-gaps';
import { computeOrientation, judgeOrientation, orientationGroups } from '../../../shared/hold-points/orientation';
import type { JobState } from '../../../shared/job/state';
import { aPlan, type PlanOverrides } from '../../support/a-plan';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';
import { computedAs, fieldKeys, ruling, verdictOn } from '../../support/verdicts';

const point = (readings: ReadingSpecs, own: { plan?: PlanOverrides; state?: Partial<JobState> } = {}) =>
  aPointContext({ kind: 'valve-orientation', readings, plan: aPlan(own.plan), state: own.state });

describe('two-hole', () => {
  const offsets = (a: number, b: number, length = 48) =>
    point({ 'set.offset.a': a, 'set.offset.b': b, 'set.length': length });

  it('reads an eighth over four feet as 0.15 degrees', () => {
    expect(computedAs(offsets(31.375, 31.5), 'set.rotation')).toBeCloseTo(-0.1492, 4);
    expect(ruling(offsets(31.375, 31.5), 'set.rotation')).toBe('within hold');
  });

  it('passes half a degree either way and holds more', () => {
    const half = Math.tan((0.5 * Math.PI) / 180) * 48;
    for (const side of [half, -half]) expect(ruling(offsets(31 + side, 31), 'set.rotation')).toBe('within hold');
    for (const side of [half, -half])
      expect(ruling(offsets(31 + side * 1.001, 31), 'set.rotation')).toBe('outside hold');
  });

  it('gives the miss at the valve by the outlet’s reach', () => {
    const context = point(
      { 'set.offset.a': 31 + Math.tan((0.5 * Math.PI) / 180) * 48, 'set.offset.b': 31, 'set.length': 48 },
      { plan: { head: { outletReachIn: '21' } } },
    );
    expect(computedAs(context, 'set.at-valve')).toBeCloseTo(0.18326, 4);
  });

  it('stops on a length of nothing, for no rotation can be worked out', () => {
    expect(ruling(offsets(31, 31, 0), 'set.two-hole-usable')).toBe('outside stop');
    expect(ruling(offsets(31, 31, 0), 'set.rotation')).toBe('silent');
  });
});

describe('level and height', () => {
  it('passes a resultant of a quarter degree and holds more', () => {
    expect(ruling(point({ 'set.level.x': '0.25', 'set.level.y': '0' }), 'set.tilt')).toBe('within hold');
    expect(ruling(point({ 'set.level.x': '0.251', 'set.level.y': '0' }), 'set.tilt')).toBe('outside hold');
    expect(ruling(point({ 'set.level.x': '0.2', 'set.level.y': '0.2' }), 'set.tilt')).toBe('outside hold');
  });

  it('names the low side: 6 o’clock when 12 is high', () => {
    expect(computedAs(point({ 'set.level.x': '0.2', 'set.level.y': '0' }), 'set.low-side')).toBeCloseTo(180, 6);
  });

  it('passes a datum within a quarter inch of its target', () => {
    for (const height of ['5.75', '6.25'])
      expect(ruling(point({ 'set.height': height }), 'set.datum-height')).toBe('within hold');
    for (const height of ['5.74', '6.26'])
      expect(ruling(point({ 'set.height': height }), 'set.datum-height')).toBe('outside hold');
    expect(computedAs(point({ 'set.height': '5.9375' }), 'set.datum-miss')).toBe(-0.0625);
  });

  it('is the same group after the tacks and as built, under its own prefix', () => {
    const tacked = aPointContext({
      kind: 'pass-inspected',
      readings: { 'tacked.level.x': '0.3', 'tacked.level.y': '0', 'tacked.height': '6' },
    });
    expect(judgeOrientation(tacked, 'tacked').map((verdict) => `${verdict.limit} ${verdict.outcome}`)).toEqual([
      'tacked.tilt outside',
      'tacked.datum-height within',
    ]);
    expect(judgeOrientation(tacked, 'tacked')[0]?.text.key).toBe('limits.tilt.outside');
    expect(computeOrientation(tacked, 'tacked').map((one) => one.key)).toContain('tacked.tilt');
    expect(orientationGroups(tacked, 'as-built').flatMap((group) => group.fields.map((field) => field.key))).toEqual([
      'as-built.holes',
      'as-built.offset.a',
      'as-built.offset.b',
      'as-built.length',
      'as-built.level.x',
      'as-built.level.y',
      'as-built.height',
    ]);
  });
});

describe('valve orientation', () => {
  it('stops unless the valve faces the direction that was named', () => {
    expect(ruling(point({ faces: 'yes' }), 'faces')).toBe('within stop');
    expect(ruling(point({ faces: 'no' }), 'faces')).toBe('outside stop');
    expect(ruling(point({ faces: 'yes' }, { state: { direction: null } }), 'faces')).toBe('outside stop');
  });

  it('says a direction of his own in the tool pusher’s words', () => {
    const base = point({}).state.direction!;
    const own = { state: { direction: { ...base, direction: 'other', words: 'the reserve pit' } } };
    expect(verdictOn(point({ faces: 'yes' }, own), 'faces')?.text.params).toEqual({ direction: 'the reserve pit' });
  });

  it('adds the largest gap to the leg once it is over a sixteenth', () => {
    const gaps = (largest: string) => point({ 'gap.12': '0', 'gap.3': largest, 'gap.6': '0.03', 'gap.9': '0' });
    expect(ruling(gaps('0.0625'), 'gap.3')).toBe('within advice');
    expect(gapToAddIn(gaps('0.0625'))).toBe(0);
    expect(ruling(gaps('0.09375'), 'gap.3')).toBe('outside advice');
    expect(computedAs(gaps('0.09375'), 'gap-to-add')).toBe(0.09375);
  });

  it('tells a later pass what the gap adds', () => {
    const earlier = [
      { kind: 'valve-orientation' as const, readings: { 'gap.12': '0.1', 'gap.3': '0', 'gap.6': '0', 'gap.9': '0' } },
    ];
    expect(gapToAddIn(aPointContext({ kind: 'pass-inspected', pass: 4, earlier }))).toBe(0.1);
  });

  it('stops on a seal that was not looked at again or is not sound', () => {
    expect(ruling(point({ 'seal-again': 'sound' }), 'seal-again')).toBe('within stop');
    expect(ruling(point({ 'seal-again': 'not-done' }), 'seal-again')).toBe('outside stop');
    expect(ruling(point({ 'seal-again': 'not-sound' }), 'seal-again')).toBe('outside stop');
  });

  it('asks nothing of a seal on a head without one', () => {
    const context = point({}, { plan: { head: { seals: 0, sealAboveBaseIn: [] } } });
    expect(fieldKeys(context)).not.toContain('seal-again');
    expect(definitionOf('valve-orientation').cautions(context)).toEqual(['suspended-head']);
  });
});
