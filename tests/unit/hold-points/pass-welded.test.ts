import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import type { JobPlan } from '../../../shared/job/plan';
import { allRead, aPass, at, fillets, kind, rods } from '../../support/a-pass';
import { aPlan, helper, welder } from '../../support/a-plan';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';
import { computedOf, judged, judgedBefore, sourceOf, verdictOf } from '../../support/judged';

describe('before the arc is struck', () => {
  const before = (
    readings: ReadingSpecs,
    limit: string,
    when = at('12:00'),
    more: { pass?: number; plan?: JobPlan } = {},
  ) => judgedBefore(aPointContext({ kind, pass: 2, ...more, readings }), 'pass', when, limit);
  const read = (temperature: number): ReadingSpecs => ({ 'temps.head': temperature, 'temps.casing': 300 });

  it('both temperatures have to be there', () => {
    expect(before({ 'temps.head': 300 }, 'temps-fresh')).toBe('stop outside');
  });

  it.each([
    ['12:05', 'stop within'],
    ['12:06', 'stop outside'],
  ])('temperatures read at noon are %2$s at %1$s', (clock, expected) => {
    expect(before(read(300), 'temps-fresh', at(clock))).toBe(expected);
  });

  it('goes by the older of the two', () => {
    const older = { 'temps.head': { value: 300, at: at('11:54') }, 'temps.casing': { value: 300, at: at('12:00') } };
    expect(before(older, 'temps-fresh')).toBe('stop outside');
  });

  it('takes the time that the job’s programme allows', () => {
    const plan = aPlan({ terms: { settings: { passTemperatureMin: '10' } } });
    expect(before(read(300), 'temps-fresh', at('12:10'), { plan })).toBe('stop within');
  });

  it.each([
    [249.9, 'stop outside'],
    [250, 'stop within'],
  ])('metal of %s °F against the minimum is a %s', (temperature, expected) => {
    expect(before(read(temperature), 'temps.head.cold')).toBe(expected);
  });

  it('holds the first pass against the preheat, the others against the interpass minimum', () => {
    const plan = aPlan({ procedure: { passes: fillets({ interpassF: { min: '300', max: '450' } }) } });
    expect(before(read(280), 'temps.head.cold', at('12:00'), { plan, pass: 1 })).toBe('stop within');
    expect(before(read(280), 'temps.head.cold', at('12:00'), { plan, pass: 2 })).toBe('stop outside');
  });

  it.each([
    [450, 'hold within'],
    [450.1, 'hold outside'],
  ])('metal of %s °F against the interpass limit is a %s', (temperature, expected) => {
    expect(before(read(temperature), 'temps.head.hot')).toBe(expected);
  });

  it('does not let somebody strike it who may not use the process', () => {
    expect(before({ ...read(300), welders: helper.accountId }, 'welders-qualified')).toBe('stop outside');
    expect(before(read(300), 'welders-qualified')).toBeUndefined();
  });

  it('asks nothing more of the tacks', () => {
    expect(judgedBefore(aPointContext({ kind, pass: 1 }), 'tacks', at('12:00'), 'temps-fresh')).toBeUndefined();
  });

  it('is not to be conceded twice when the arc was struck on metal that was too hot', () => {
    const context = aPass({ 'temps.head': 460 });
    expect(judged(context, 'temps.head.hot')).toBe('hold outside');
    const begun = definitionOf(kind).beforeAct?.(context, 'pass', at('12:01')) ?? [];
    context.point.acts[0]!.verdicts = begun;
    expect(judged(context, 'temps.head.hot')).toBeUndefined();
    expect(judged(context, 'temps.casing.hot')).toBe('hold within');
  });
});

describe('the welders', () => {
  it('pass when each has used the process within six months', () => {
    expect(judged(aPass(), 'welders-qualified')).toBe('stop within');
    expect(judged(aPass({ welders: 'w. calder' }), 'welders-qualified')).toBe('stop within');
  });

  it('stop the pass when one of them is not qualified or not on the job', () => {
    const both = aPass({ welders: `${welder.accountId}, ${helper.accountId}` });
    expect(judged(both, 'welders-qualified')).toBe('stop outside');
    const verdict = verdictOf(definitionOf(kind).judge(both), 'welders-qualified');
    expect(verdict?.text.params).toMatchObject({ names: 'J. Ostrom', process: 'SMAW' });
    expect(judged(aPass({ welders: 'Somebody Else' }), 'welders-qualified')).toBe('stop outside');
  });

  it.each([
    ['2026-03-14', 'stop within'],
    ['2026-03-13', 'stop outside'],
  ])('last use on %s is on 14 September a %s', (lastUsed, expected) => {
    const people = [{ ...welder, role: 'welder' as const, qualifications: [{ process: 'SMAW', lastUsed }] }];
    expect(judged(aPass({}, { plan: aPlan({ people }) }), 'welders-qualified')).toBe(expected);
  });

  it('go by the site’s calendar in the evening', () => {
    const people = [
      { ...welder, role: 'welder' as const, qualifications: [{ process: 'SMAW', lastUsed: '2026-03-14' }] },
    ];
    const evening = { welders: { value: welder.accountId, at: '2026-09-15T01:30:00.000Z' } };
    expect(judged(aPass(evening, { plan: aPlan({ people }) }), 'welders-qualified')).toBe('stop within');
  });

  it('need the process of this very pass', () => {
    const plan = aPlan({ procedure: { passes: fillets({ process: 'GTAW' }) } });
    expect(judged(aPass({}, { plan }), 'welders-qualified')).toBe('stop outside');
  });
});

describe('the rods', () => {
  it.each([
    ['E8018-C3', 'stop within'],
    ['e8018-c3', 'stop within'],
    ['E8018-C3 H4R', 'stop within'],
    ['E8018-C3/H4R', 'stop within'],
    ['E8018-C3R', 'stop within'],
    ['E8018-B2', 'stop outside'],
    ['E7018', 'stop outside'],
  ])('of class %s are a %s', (electrodeClass, expected) => {
    expect(judged(aPass(rods(1, { class: electrodeClass })), 'rods.1.class')).toBe(expected);
  });

  it.each([
    ['amps', 89.9, 'hold outside'],
    ['amps', 90, 'hold within'],
    ['amps', 130, 'hold within'],
    ['amps', 130.1, 'hold outside'],
    ['volts', 19.9, 'hold outside'],
    ['volts', 20, 'hold within'],
    ['volts', 26, 'hold within'],
    ['volts', 26.1, 'hold outside'],
  ])('at %s %s are a %s', (name, value, expected) => {
    expect(judged(aPass(rods(1, { [name]: value })), `rods.1.${name}`)).toBe(expected);
  });

  it('run once round the casing in the arc time of all rows', () => {
    const context = aPass({ ...rods(1, { 'arc-time': 1 }), ...rods(2, { 'arc-time': 2 }) });
    expect(Number(computedOf(context)['travel-speed'])).toBeCloseTo((Math.PI * 9.625) / 3, 5);
    expect(Number(computedOf(context)['heat-input'])).toBeCloseTo((24 * 120 * 60) / ((Math.PI * 9.625) / 3) / 1000, 5);
  });

  it('run round the bore where the pass is inside', () => {
    const passes = fillets();
    passes[1] = { ...passes[1]!, weld: 'inside' };
    const context = aPass({}, { plan: aPlan({ procedure: { passes, insideLegIn: '0.25' } }) });
    expect(Number(computedOf(context)['travel-speed'])).toBeCloseTo((Math.PI * 8.835) / 3, 5);
  });

  it('go by their own run-out where it was measured', () => {
    const context = aPass(rods(1, { 'run-out': 27, 'arc-time': 3 }));
    expect(computedOf(context)).toMatchObject({ 'travel-speed': '9', 'heat-input': '19.2' });
  });

  it.each([
    [10.8, 'hold within'], // 24 V · 120 A · 60 / 5.4 in/min = 32 kJ/in
    [10.7, 'hold outside'],
    [24.6, 'hold within'], // 14.05 kJ/in
    [24.8, 'hold outside'],
  ])('of %s in run-out in 2 min have a heat input that is a %s', (runOut, expected) => {
    expect(judged(aPass(rods(1, { 'run-out': runOut, 'arc-time': 2 })), 'rods.1.heat-input')).toBe(expected);
  });

  it('are not held against a heat input that the procedure does not set', () => {
    const context = aPass({}, { plan: aPlan({ procedure: { passes: fillets({ heatInputKjPerIn: null }) } }) });
    expect(judged(context, 'rods.1.heat-input')).toBeUndefined();
    expect(computedOf(context)['heat-input']).toBeDefined();
  });

  it('stop where no heat input can be worked out from them', () => {
    expect(judged(aPass(rods(1, { 'arc-time': 0 })), 'rods.1.heat-input-usable')).toBe('stop outside');
    expect(
      judged(aPass({ ...rods(1), 'rods.2.amps': 120, 'rods.2.volts': 24 }), 'rods.1.heat-input-usable'),
    ).toBeUndefined();
  });

  it.each([
    ['10:20', 'hold within'], // two hours for E80 to the end of the pass at 12:20
    ['10:19', 'hold outside'],
  ])('out of the oven at %s are a %s', (clock, expected) => {
    const context = aPass(rods(1, { 'out-of-oven': at(clock) }));
    expect(judged(context, 'rods.1.exposure')).toBe(expected);
    expect(sourceOf(context, 'rods.1.exposure')).toBe('standard AWS D1.1');
  });

  it('age until they were written down while the pass is not ended', () => {
    const burning = aPointContext({
      kind,
      pass: 2,
      readings: { ...allRead, ...rods(1, { 'out-of-oven': at('11:00') }) },
      acts: [{ act: 'pass', begun: at('12:02') }],
    });
    expect(computedOf(burning).exposure).toBe('60');
  });

  it('cannot have left the oven after the pass was over', () => {
    expect(judged(aPass(rods(1, { 'out-of-oven': at('12:21') })), 'rods.1.out-of-oven')).toBe('hold outside');
    expect(judged(aPass(), 'rods.1.out-of-oven')).toBe('hold within');
  });
});
