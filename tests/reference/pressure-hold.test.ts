import { describe, expect, it } from 'vitest';
import { nitrogenPressureAt, nitrogenStoredEnergy, pressureHold, type HoldSample } from '../../shared/calculations';
import { nitrogenDensity } from '../../shared/calculations/nitrogen-equation';
import { answer, reason } from './answer';

describe('nitrogen as a real gas (Span and others 2000)', () => {
  // kg/m³ reckoned with an independent implementation of the same reference equation.
  it.each([
    [90, 1000, 77.10637522807691],
    [60, 500, 41.70326273469556],
    [120, 3000, 202.20712996311823],
    [20, 1500, 134.8781191465243],
    [70, 5000, 333.1348265028594],
    [-20, 2000, 200.14642643705974],
  ])('at %d °F and %d psig weighs %d kg/m³', (fahrenheit, psig, kgM3) => {
    const density = nitrogenDensity((psig + 14.696) * 6894.757293168361, ((fahrenheit - 32) * 5) / 9 + 273.15);
    expect((density ?? 0) * 0.02801348).toBeCloseTo(kgM3, 3);
  });

  it('reads 936 psig at 60 °F after 1000 psig at 90 °F, not the ideal gas’s 945', () => {
    const { expectedPsig } = answer(nitrogenPressureAt({ pressurePsig: 1000, temperatureF: 90, newTemperatureF: 60 }));
    expect(expectedPsig).toBeCloseTo(936.26, 1);
    const ideal = (1014.696 * 519.67) / 549.67 - 14.696;
    expect(ideal).toBeCloseTo(944.6, 1);
    expect(Math.abs(expectedPsig - ideal)).toBeGreaterThan(8);
  });

  it('goes there and back to where it was', () => {
    const there = answer(nitrogenPressureAt({ pressurePsig: 2500, temperatureF: 30, newTemperatureF: 150 }));
    const back = nitrogenPressureAt({ pressurePsig: there.expectedPsig, temperatureF: 150, newTemperatureF: 30 });
    expect(answer(back).expectedPsig).toBeCloseTo(2500, 5);
  });
});

const sample = (minute: number, pressurePsig: number, temperatureF?: number): HoldSample =>
  temperatureF === undefined
    ? { timeS: minute * 60, pressurePsig }
    : { timeS: minute * 60, pressurePsig, temperatureF };

const hold = (samples: readonly HoldSample[], more: Partial<Parameters<typeof pressureHold>[0]> = {}) =>
  pressureHold({
    samples,
    medium: 'nitrogen',
    targetPsig: 900,
    holdS: 900,
    allowedDropPsi: 10,
    holdStartS: 0,
    holdEndS: 900,
    toleranceS: 30,
    ...more,
  });

describe('the pressure hold', () => {
  it('held: level, covered, on the clock', () => {
    const verdict = answer(hold([sample(0, 1000), sample(5, 998), sample(15, 997)]));
    expect(verdict).toMatchObject({
      held: true,
      findings: [],
      lowestPsig: 997,
      dropPsi: 3,
      judgedBy: 'as-read',
      longestGapS: 600,
    });
    expect(verdict.ratePsiPerMin).toBeCloseTo(0.2, 12);
  });

  it('does not call 1000 → 936 psig a leak when it cooled from 90 to 60 °F', () => {
    const verdict = answer(hold([sample(0, 1000, 90), sample(15, 936, 60)]));
    expect(verdict).toMatchObject({ held: true, judgedBy: 'temperature-corrected', dropPsi: 64 });
    expect(verdict.correctedDropPsi).toBeCloseTo(0.26, 1);
  });

  it('calls the same fall a drop when it stayed as warm, or nobody took the temperature', () => {
    expect(answer(hold([sample(0, 1000, 90), sample(15, 936, 90)])).findings).toEqual(['drop-over-allowed']);
    expect(answer(hold([sample(0, 1000), sample(15, 936)])).findings).toEqual(['drop-over-allowed']);
  });

  it('does not let warming hide a leak', () => {
    const verdict = answer(hold([sample(0, 936, 60), sample(15, 936, 90)]));
    expect(verdict.dropPsi).toBe(0);
    expect(verdict.findings).toEqual(['drop-over-allowed']);
    expect(verdict.correctedDropPsi).toBeGreaterThan(60);
  });

  it('does not let a reading without a temperature hide a dip that was pumped up again', () => {
    const dip = answer(hold([sample(0, 1000, 70), sample(7, 930), sample(15, 1000, 70)]));
    expect(dip.findings).toEqual(['drop-over-allowed']);
    expect(dip.correctedDropPsi).toBeCloseTo(70, 6);
  });

  it('takes the temperature of a reading without one from the line between its neighbours', () => {
    const cooled = (inBetween: number) => hold([sample(0, 1000, 90), sample(5, inBetween), sample(15, 936.26, 60)]);
    const { expectedPsig } = answer(nitrogenPressureAt({ pressurePsig: 1000, temperatureF: 90, newTemperatureF: 80 }));
    expect(answer(cooled(expectedPsig - 10)).held).toBe(true);
    expect(answer(cooled(expectedPsig - 10.01)).findings).toEqual(['drop-over-allowed']);
  });

  it('judges as read where a temperature is missing at either end', () => {
    for (const readings of [
      [sample(0, 1000), sample(7, 990, 70), sample(15, 960, 60)],
      [sample(0, 1000, 90), sample(7, 990, 70), sample(15, 960)],
    ])
      expect(answer(hold(readings))).toMatchObject({ judgedBy: 'as-read', findings: ['drop-over-allowed'] });
  });

  it('takes readings in any order, and the worst of two at one time', () => {
    expect(answer(hold([sample(15, 1000), sample(0, 1005), sample(7, 1002)]))).toMatchObject({
      held: true,
      dropPsi: 5,
    });
    expect(answer(hold([sample(0, 1000), sample(15, 950), sample(15, 1000)])).findings).toEqual(['drop-over-allowed']);
  });

  it('does not correct oil', () =>
    expect(answer(hold([sample(0, 1000, 90), sample(15, 999, 60)], { medium: 'oil' })).correctedDropPsi).toBeNull());

  it('sees a dip below target that recovers', () =>
    expect(answer(hold([sample(0, 905), sample(7, 899), sample(15, 905)])).findings).toEqual(['below-target']));

  it('passes on target and on the allowed drop exactly', () =>
    expect(answer(hold([sample(0, 910), sample(15, 900)])).held).toBe(true));

  it('asks for both ends and the whole clock', () => {
    expect(answer(hold([sample(1, 1000), sample(15, 1000)])).findings).toEqual(['start-not-covered']);
    expect(answer(hold([sample(0, 1000), sample(14, 1000)])).findings).toEqual(['end-not-covered']);
    expect(answer(hold([sample(0, 1000), sample(14.9, 1000)], { holdEndS: 894 })).findings).toEqual(['clock-short']);
  });

  it('ignores pressuring up and bleeding off', () =>
    expect(answer(hold([sample(-5, 0), sample(0, 1000), sample(15, 1000), sample(16, 0)])).held).toBe(true));

  it('takes a recorder’s whole day, a reading a second', () => {
    const day = Array.from({ length: 86_401 }, (_, timeS) => ({ timeS, pressurePsig: 1000, temperatureF: 70 }));
    const verdict = answer(hold(day, { holdS: 86_400, holdEndS: 86_400 }));
    expect(verdict).toMatchObject({ held: true, longestGapS: 1, judgedBy: 'temperature-corrected' });
  });

  it('has no verdict on fewer than two readings or on no numbers', () => {
    expect(reason(hold([sample(0, 1000)]))).toBe('too-few-readings');
    expect(reason(hold([sample(0, NaN), sample(15, 1000)]))).toBe('not-a-number');
  });
});

describe('energy stored in nitrogen (ASME PCC-2 article 501)', () => {
  it('1 L at 1000 psig: 12,284.8 J, 0.002879 kg of TNT, 3.585 m, so 30 m stands', () => {
    const stored = answer(nitrogenStoredEnergy({ volumeL: 1, pressurePsig: 1000 }));
    expect(stored.energyJ).toBeCloseTo(12_284.8, 1);
    expect(stored.tntKg).toBeCloseTo(0.002879, 6);
    expect(stored.formulaM).toBeCloseTo(3.585, 3);
    expect(stored.standOffM).toBe(30);
    expect(stored.standOffFt).toBeCloseTo(98.425, 3);
  });
  it('goes by the formula above 135.5 MJ: 82 m for 12,000 L at 1000 psig, worked by hand', () =>
    expect(answer(nitrogenStoredEnergy({ volumeL: 12_000, pressurePsig: 1000 })).standOffM).toBeCloseTo(82.07, 2));
});
