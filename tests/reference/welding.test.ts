import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  carbonEquivalent,
  electrodeExposure,
  exposureLimit,
  filletPlan,
  filletUndersize,
  heatInput,
  preheatAdvice,
  preheatDistance,
  travelSpeedRound,
  travelSpeedRunOut,
  visualLimits,
} from '../../shared/calculations';
import { answer, reason } from './answer';

describe('heat input (ASME IX QW-409.1(a))', () => {
  it('is 17,280 J/in at 24 V, 120 A, 10 in/min', () => {
    const heat = answer(heatInput({ volts: 24, amperes: 120, speedInPerMin: 10 }));
    expect(heat.joulesPerIn).toBe(17_280);
    expect(heat.kilojoulesPerIn).toBe(17.28);
    expect(heat.kilojoulesPerMm).toBeCloseTo(0.680315, 6);
  });
  it('is not the 13.824 kJ/in that a factor of 0.8 would make of it', () =>
    expect(answer(heatInput({ volts: 24, amperes: 120, speedInPerMin: 10 })).kilojoulesPerIn).not.toBeCloseTo(
      13.824,
      3,
    ));
  it('has no answer for a torch that stands still', () =>
    expect(reason(heatInput({ volts: 24, amperes: 120, speedInPerMin: 0 }))).toBe('below-range'));
  it('takes the speed from the round of the casing or from one rod', () => {
    expect(answer(travelSpeedRound({ odIn: 9.625, arcMinutes: 6 })).speedInPerMin).toBeCloseTo(
      (Math.PI * 9.625) / 6,
      12,
    );
    expect(answer(travelSpeedRunOut({ runOutIn: 9, arcMinutes: 1.5 })).speedInPerMin).toBe(6);
  });
});

describe('carbon equivalents (IIW, Pcm, CET)', () => {
  const none = {
    siliconPct: 0,
    chromiumPct: 0,
    molybdenumPct: 0,
    vanadiumPct: 0,
    nickelPct: 0,
    copperPct: 0,
    boronPct: 0,
  };
  it('C.40 Mn.85 Cr.95 Mo.20 has an IIW of 0.772', () => {
    const steel = { ...none, carbonPct: 0.4, manganesePct: 0.85, chromiumPct: 0.95, molybdenumPct: 0.2 };
    expect(answer(carbonEquivalent(steel)).iiwPct).toBeCloseTo(0.7717, 4);
  });
  it('C.16 Mn.90 Cr.05 Mo.02 V.01 Ni.05 Cu.10 has 0.336, .21567 and .26075', () => {
    const alloy = { chromiumPct: 0.05, molybdenumPct: 0.02, vanadiumPct: 0.01, nickelPct: 0.05, copperPct: 0.1 };
    const found = answer(carbonEquivalent({ ...none, carbonPct: 0.16, manganesePct: 0.9, ...alloy }));
    expect(found.iiwPct).toBeCloseTo(0.336, 6);
    expect(found.pcmPct).toBeCloseTo(0.21567, 5);
    expect(found.cetPct).toBeCloseTo(0.26075, 6);
  });
});

describe('preheat advice (EN 1011-2 method B; its range from memory)', () => {
  const advise = (cetPct: number, thicknessMm: number, hydrogenMlPer100g: number, heatInputKjPerMm: number) =>
    preheatAdvice({ cetPct, thicknessMm, hydrogenMlPer100g, heatInputKjPerMm });
  it.each([
    [0.4225, 25.4, 5, 1, 165.05],
    [0.33, 40, 3, 1.5, 101.78],
  ])('CET %d, %d mm, HD %d, Q %d advises %d °C', (cet, d, hd, q, celsius) =>
    expect(answer(advise(cet, d, hd, q)).preheatC).toBeCloseTo(celsius, 2),
  );
  it.each([
    [0.52, 25, 5, 1, 'above-range'],
    [0.19, 25, 5, 1, 'below-range'],
    [0.4, 9, 5, 1, 'below-range'],
    [0.4, 91, 5, 1, 'above-range'],
    [0.4, 25, 0.5, 1, 'below-range'],
    [0.4, 25, 21, 1, 'above-range'],
    [0.4, 25, 5, 0.4, 'below-range'],
    [0.4, 25, 5, 4.1, 'above-range'],
  ])('CET %d, %d mm, HD %d, Q %d is refused', (cet, d, hd, q, why) => expect(reason(advise(cet, d, hd, q))).toBe(why));
  it('still advises at every end of its range', () => {
    expect(advise(0.2, 10, 1, 0.5).ok && advise(0.5, 90, 20, 4).ok).toBe(true);
  });
});

describe('where preheat is measured', () => {
  const at = (thicknessMm: number, rule: 'aws-d1.1' | 'iso-13916') =>
    answer(preheatDistance({ thicknessIn: thicknessMm / 25.4, rule })).distanceMm;
  it('is 76.2 mm for 9.65 mm by AWS D1.1', () => expect(at(9.65, 'aws-d1.1')).toBeCloseTo(76.2, 9));
  it('is 38.6 mm for 9.65 mm by ISO 13916', () => expect(at(9.65, 'iso-13916')).toBeCloseTo(38.6, 9));
  it('is the thickness itself past 3 in by AWS D1.1', () => expect(at(101.6, 'aws-d1.1')).toBeCloseTo(101.6, 9));
  it('stops at 50 mm by ISO 13916', () => expect(at(40, 'iso-13916')).toBeCloseTo(50, 9));
});

describe('electrode exposure (AWS D1.1; E80 to E110 and the R suffix from memory)', () => {
  it.each([
    [239, 'pass'],
    [240, 'pass'],
    [241, 'fail'],
  ])('E7018 after %d minutes: %s', (exposedMinutes, verdict) =>
    expect(answer(electrodeExposure({ electrodeClass: 'E7018', exposedMinutes })).verdict).toBe(verdict),
  );
  it.each([
    ['E7018-1 H4R', 540],
    ['e7018-1', 240],
    // the ways it is stamped and written: none may leave a rod without its limit
    ['E7018/H4R', 540],
    ['E-7018', 240],
    ['E7018 H4', 240],
    ['E7018R', 540],
    ['E7018M', 240],
    ['E10018M', 30],
    ['E7016-1', 240],
    ['E8018-C3', 120],
    // from memory: the longer time of the moisture-resistant suffix stands in the table for E70 rods alone
    ['E8018-C3 H4R', 120],
    ['E9018-B3', 60],
    ['E10018-D2', 30],
    ['E11018-M', 30],
    ['E6010', null],
    ['E7010-P1', null],
  ])('%s has %s minutes', (electrodeClass, minutes) =>
    expect(answer(exposureLimit(electrodeClass)).limitMinutes).toBe(minutes),
  );
  it.each(['', '7018', 'E71T-1', 'E12018', 'E70188888x!', 'stick'])('does not know "%s"', (electrodeClass) =>
    expect(reason(exposureLimit(electrodeClass))).toBe('electrode-class-unknown'),
  );
});

describe('the fillet plan (geometry, Pappus)', () => {
  const plan = {
    side: 'outside',
    surfaceDiameterIn: 9.625,
    planLegIn: 0.5,
    gapIn: 0,
    rodDiameterIn: 1 / 8,
    rodLengthIn: 14,
    stubIn: 2,
    efficiencyPct: 65,
  } as const;
  it('by hand: 1/8 in² along 2π(4.8125 + 1/6) in = 3.9106 in³, 1.109 lb, 41 rods of 0.02715 lb', () => {
    const fillet = answer(filletPlan(plan));
    expect(fillet.volumeIn3).toBeCloseTo(3.9106, 3);
    expect(fillet.throatIn).toBeCloseTo(0.35355, 5);
    expect(fillet.massLb).toBeCloseTo(1.109, 3);
    expect(fillet.depositPerRodLb).toBeCloseTo(0.02715, 5);
    expect(fillet.rods).toBe(41);
  });
  it('adds the gap to the leg', () => expect(answer(filletPlan({ ...plan, gapIn: 0.125 })).legIn).toBe(0.625));
  it('grows with the square of the leg', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 1, noNaN: true }), (planLegIn) => {
        const one = answer(filletPlan({ ...plan, planLegIn }));
        const two = answer(filletPlan({ ...plan, planLegIn: 2 * planLegIn }));
        expect(two.areaIn2 / one.areaIn2).toBeCloseTo(4, 9);
        expect(two.volumeIn3 / one.volumeIn3).toBeGreaterThan(4);
      }),
    );
  });
  it('needs less metal inside than outside', () =>
    expect(answer(filletPlan({ ...plan, side: 'inside' })).volumeIn3).toBeLessThan(answer(filletPlan(plan)).volumeIn3));
  it('does not fit a bore smaller than itself', () =>
    expect(reason(filletPlan({ ...plan, side: 'inside', surfaceDiameterIn: 1, planLegIn: 2 }))).toBe(
      'bore-not-smaller',
    ));
  it('may run short by size on a tenth of its length (AWS D1.1, from memory)', () => {
    const judge = (planLegIn: number, measuredLegIn: number, undersizeSharePct: number) =>
      answer(filletUndersize({ planLegIn, measuredLegIn, undersizeSharePct })).verdict;
    expect(judge(0.5, 0.5, 0)).toBe('full');
    expect(judge(0.5, 0.375, 10)).toBe('tolerable');
    expect(judge(0.5, 0.375, 11)).toBe('too-small');
    expect(judge(0.5, 0.37, 5)).toBe('too-small');
    expect(judge(0.1875, 0.125, 10)).toBe('tolerable');
    expect(judge(0.1875, 0.12, 10)).toBe('too-small');
    expect(judge(0.25, 0.15625, 10)).toBe('tolerable');
    expect(judge(0.25, 0.15, 10)).toBe('too-small');
    expect(judge(0.3125, 0.1875, 10)).toBe('tolerable');
  });
  it('gets the smaller allowance between two sizes, however the leg was typed', () => {
    const allowed = (planLegIn: number) =>
      answer(filletUndersize({ planLegIn, measuredLegIn: planLegIn, undersizeSharePct: 0 })).allowedUnderIn;
    expect([0.2, 4.7625 / 25.4, 0.3, 7.9375 / 25.4].map(allowed)).toEqual([1 / 16, 1 / 16, 3 / 32, 1 / 8]);
  });
});

describe('what the eye finds (AWS D1.1; 1 in and thicker from memory)', () => {
  const judge = (undercutIn: number, thicknessIn: number, crackPresent = false) =>
    answer(visualLimits({ undercutIn, thicknessIn, crackPresent })).verdict;
  it('passes undercut of 1/32 in and holds more', () =>
    expect([judge(1 / 32, 0.4), judge(1 / 32 + 0.001, 0.4)]).toEqual(['pass', 'hold']));
  it('allows 1/16 in from 1 in of thickness', () =>
    expect([judge(1 / 16, 1), judge(1 / 16, 0.999)]).toEqual(['pass', 'hold']));
  it('stops at any crack', () => expect(judge(0, 0.4, true)).toBe('stop'));
});
