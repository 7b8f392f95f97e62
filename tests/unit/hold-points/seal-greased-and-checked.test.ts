import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import type { JobState } from '../../../shared/job/state';
import { aPlan, type PlanOverrides } from '../../support/a-plan';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';
import { barring, fieldKeys, ruling, verdictOn } from '../../support/verdicts';

const point = (readings: ReadingSpecs, own: { plan?: PlanOverrides; state?: Partial<JobState> } = {}) =>
  aPointContext({ kind: 'seal-greased-and-checked', readings, plan: aPlan(own.plan), state: own.state });
const withoutSeal: PlanOverrides = { head: { seals: 0, sealAboveBaseIn: [] } };
const definition = definitionOf('seal-greased-and-checked');

describe('before the head is lifted', () => {
  const ready = { 'direction-marked': 'yes', 'seal.sound': 'yes' };

  it('is free to lift once the direction is named and marked and the seal was sound', () => {
    expect(barring(point(ready), 'set-head')).toEqual([]);
  });

  it('stops while the tool pusher has not named the direction, also when the coordinator proposed one', () => {
    const unnamed = { state: { direction: null, proposedDirection: 'mud tanks' } };
    expect(barring(point(ready, unnamed), 'set-head')).toEqual(['direction-named']);
    expect(ruling(point(ready, unnamed), 'direction-named')).toBe('outside stop');
  });

  it('stops while the mark is not made or the seal was not found sound', () => {
    expect(barring(point({}), 'set-head')).toEqual(['direction-marked', 'seal.sound']);
    expect(barring(point({ ...ready, 'direction-marked': 'no' }), 'set-head')).toEqual(['direction-marked']);
    expect(barring(point({ ...ready, 'seal.sound': 'no' }), 'set-head')).toEqual(['seal.sound']);
  });

  it('asks nothing of a seal on a head without one', () => {
    expect(barring(point({ 'direction-marked': 'yes' }, { plan: withoutSeal }), 'set-head')).toEqual([]);
  });

  it('lights no fire', () => {
    expect(definition.acts(point({}))).toEqual([{ key: 'set-head', flame: false, required: true }]);
  });
});

describe('seal greased and checked', () => {
  it('names the direction in words that can be said', () => {
    expect(verdictOn(point({}), 'direction-named')?.text.params).toEqual({
      direction: { key: 'points.valve-orientation.choices.direction.mud-tanks' },
    });
  });

  it('stops on a rolled or cut seal and holds one that could not be seen', () => {
    expect(ruling(point({ 'seal.state-after': 'sound' }), 'seal.state-after')).toBe('within stop');
    expect(ruling(point({ 'seal.state-after': 'rolled-or-cut' }), 'seal.state-after')).toBe('outside stop');
    expect(ruling(point({ 'seal.sight': 'seen' }), 'seal.sight')).toBe('within hold');
    expect(ruling(point({ 'seal.sight': 'felt' }), 'seal.sight')).toBe('within hold');
    expect(ruling(point({ 'seal.sight': 'not-seen' }), 'seal.sight')).toBe('outside hold');
  });

  it('asks for no state and no photo of a seal that could not be seen', () => {
    const required = (sight: string) => {
      const context = point({ 'seal.sight': sight });
      const fields = definition.groups(context).flatMap((group) => group.fields);
      return [
        fields.find((field) => field.key === 'seal.state-after')?.required,
        definition.shots(context).find((shot) => shot.key === 'seal-after')?.required,
      ];
    };
    expect(required('seen')).toEqual([true, true]);
    expect(required('not-seen')).toEqual([false, false]);
  });

  it('holds grease nearer than an inch to the weld, and a dry casing or bore', () => {
    expect(ruling(point({ 'grease.clear': '1' }), 'grease.clear')).toBe('within hold');
    expect(ruling(point({ 'grease.clear': '0.99' }), 'grease.clear')).toBe('outside hold');
    expect(ruling(point({ 'greased.casing': 'no' }), 'greased.casing')).toBe('outside hold');
    expect(ruling(point({ 'greased.head': 'no' }), 'greased.head')).toBe('outside hold');
  });

  it('leaves only the direction on a head without a seal', () => {
    const context = point({}, { plan: withoutSeal });
    expect(fieldKeys(context)).toEqual(['direction-marked']);
    expect(definition.shots(context)).toEqual([]);
    expect(definition.judge(context).map((verdict) => verdict.limit)).toEqual(['direction-named']);
  });
});
