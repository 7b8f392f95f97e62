import { describe, expect, it } from 'vitest';
import type { JobPlan } from '../../../shared/job/plan';
import { noon, type ReadingSpecs } from '../../support/a-point';
import { held, planOf, tested } from '../../support/a-pressure-test';
import { computedOf, isRequired, judged, judgedBefore, sourceOf } from '../../support/judged';

describe('what may be pumped', () => {
  it.each([
    [3000, 'stop within'],
    [3001, 'stop outside'],
  ])('a target of %s psi against the flange is a %s', (pressurePsi, expected) => {
    const context = tested({}, planOf({ pressurePsi }, { casing: { collapsePsi: 9000 } }));
    expect(judged(context, 'target-over-flange')).toBe(expected);
    expect(judgedBefore(context, 'pressure-test', noon, 'target-over-flange')).toBe(expected);
    expect(sourceOf(context, 'target-over-flange')).toBe('standard API 6A');
  });

  it.each([
    [2570, 'stop within'],
    [2571, 'stop outside'],
  ])('a target of %s psi against the casing’s collapse is a %s', (pressurePsi, expected) => {
    const context = tested({}, planOf({ pressurePsi }));
    expect(judged(context, 'target-over-collapse')).toBe(expected);
    expect(judgedBefore(context, 'pressure-test', noon, 'target-over-collapse')).toBe(expected);
    expect(sourceOf(context, 'target-over-collapse')).toBe('standard API TR 5C3');
  });

  it.each([
    [1500, 2056, 'hold within'],
    [1500, 2057, 'hold outside'],
    [2056, undefined, 'hold within'],
    [2057, undefined, 'hold outside'],
  ])(
    'a target of %s psi and a highest of %s psi against 80 %% of collapse is a %s',
    (pressurePsi, highest, expected) => {
      const context = tested(highest === undefined ? {} : { highest }, planOf({ pressurePsi }));
      expect(judged(context, 'over-collapse-share')).toBe(expected);
    },
  );

  it('takes the share of collapse that the programme sets', () => {
    const plan = planOf({ pressurePsi: 1500 }, { terms: { settings: { collapseSharePct: '50' } } });
    expect(judged(tested({}, plan), 'over-collapse-share')).toBe('hold outside');
    expect(sourceOf(tested({}, plan), 'over-collapse-share')).toBe('job collapseSharePct');
    expect(sourceOf(tested(), 'over-collapse-share')).toBe('common-practice collapseSharePct');
  });

  it.each([
    [1600, 'hold within'],
    [1601, 'hold outside'],
  ])('a highest pressure of %s psi against a seal of 1600 psi is a %s', (highest, expected) => {
    expect(judged(tested({ highest }, planOf({}, { head: { sealRatedPsi: 1600 } })), 'over-seal')).toBe(expected);
  });

  it('holds nothing against a seal that is not rated or not there', () => {
    expect(
      judged(tested({ highest: 2000 }, planOf({}, { head: { sealRatedPsi: null } })), 'over-seal'),
    ).toBeUndefined();
    const noSeal = planOf({}, { head: { seals: 0, sealAboveBaseIn: [], sealRatedPsi: 500 } });
    expect(judged(tested({ highest: 2000 }, noSeal), 'over-seal')).toBeUndefined();
  });

  it('stops at collapse itself until the bore is gauged, and stays a hold then', () => {
    expect(judged(tested({ highest: 2569 }), 'highest-collapse')).toBe('stop within');
    const reached = tested({ highest: 2570 });
    expect(judged(reached, 'highest-collapse')).toBe('stop outside');
    expect(isRequired(reached, 'bore-gauged')).toBe(true);
    expect(isRequired(tested({ highest: 2569 }), 'bore-gauged')).toBe(false);
    expect(judged(tested({ highest: 2570, 'bore-gauged': 'no' }), 'highest-collapse')).toBe('stop outside');
    const gauged = tested({ highest: 2570, 'bore-gauged': 'yes' });
    expect(judged(gauged, 'highest-collapse')).toBeUndefined();
    expect(judged(gauged, 'bore-gauged')).toBe('stop within');
    expect(judged(gauged, 'over-collapse-share')).toBe('hold outside');
  });

  it('counts a peak during the hold even when the highest pressure says less', () => {
    const peak = tested({ ...held(['12:00', 2600], ['12:08', 1545], ['12:15', 1540]), highest: 1600 });
    expect(judged(peak, 'highest-collapse')).toBe('stop outside');
  });

  it('names the lowest limit and what sets it', () => {
    expect(computedOf(tested())['safe-limit-collapse']).toBe('2056');
    expect(computedOf(tested({}, planOf({}, { head: { sealRatedPsi: 1000 } })))['safe-limit-seal']).toBe('1000');
    expect(
      computedOf(tested({}, planOf({}, { casing: { collapsePsi: 9000 }, head: { sealRatedPsi: null } }))),
    ).toMatchObject({
      'safe-limit-flange': '3000',
    });
  });
});

describe('before pressure', () => {
  const before = (limit: string, readings: ReadingSpecs, plan?: JobPlan) =>
    judgedBefore(tested(readings, plan), 'pressure-test', noon, limit);

  it.each(['port-probed', 'fitting-in'])('stops until %s is answered with yes', (field) => {
    expect(before(field, {})).toBe('stop outside');
    expect(before(field, { [field]: 'no' })).toBe('stop outside');
    expect(before(field, { [field]: 'yes' })).toBe('stop within');
  });

  it('wants the volume before nitrogen goes in, for the distance follows from it', () => {
    const nitrogen = planOf({ medium: 'nitrogen' });
    expect(before('volume-before-nitrogen', {}, nitrogen)).toBe('stop outside');
    expect(before('volume-before-nitrogen', { volume: 0 }, nitrogen)).toBe('stop outside');
    expect(before('volume-before-nitrogen', { volume: 120 }, nitrogen)).toBe('stop within');
    expect(before('volume-before-nitrogen', {})).toBeUndefined();
  });

  it('wants an exclusion zone for nitrogen; with oil it only advises one', () => {
    const nitrogen = planOf({ medium: 'nitrogen' });
    expect(before('exclusion', {}, nitrogen)).toBe('stop outside');
    expect(before('exclusion', { exclusion: 'yes' }, nitrogen)).toBe('stop within');
    expect(before('exclusion', {})).toBeUndefined();
    expect(judged(tested({ exclusion: 'no' }, nitrogen), 'exclusion')).toBe('stop outside');
    expect(judged(tested({ exclusion: 'no' }), 'exclusion')).toBe('advice outside');
  });
});
