import { describe, expect, it } from 'vitest';
import { pressureLimitsOf } from '../../../shared/hold-points/pressure-limits';
import { aPlan } from '../../support/a-plan';

describe('the limits of the test pressure', () => {
  it('are the lowest of flange, share of collapse and seal', () => {
    const limits = pressureLimitsOf(aPlan());
    expect(limits).toMatchObject({ flangePsi: 3000, collapsePsi: 2570, collapseSharePsi: 2056, sealPsi: 3000 });
    expect(limits.safe).toMatchObject({ limitPsi: 2056, governedBy: 'collapse' });
    expect(limits.targetOver).toEqual([]);
  });

  it('of 13-3/8 in 54.5 lb/ft J55 are 904 psi', () => {
    expect(pressureLimitsOf(aPlan({ casing: { collapsePsi: 1130 } })).safe?.limitPsi).toBe(904);
  });

  it('leave out a seal that is not there', () => {
    const { sealPsi, safe } = pressureLimitsOf(aPlan({ head: { seals: 0, sealAboveBaseIn: [], sealRatedPsi: 500 } }));
    expect(sealPsi).toBeNull();
    expect(safe?.unknown).toEqual(['seal']);
  });

  it.each([
    [2056, []],
    [2057, ['collapse-share']],
    [2571, ['collapse', 'collapse-share']],
    [3001, ['flange', 'collapse', 'collapse-share', 'seal']],
  ])('say what a target of %s psi is over', (pressurePsi, over) => {
    expect(pressureLimitsOf(aPlan({ terms: { test: { pressurePsi } } })).targetOver).toEqual(over);
  });
});
