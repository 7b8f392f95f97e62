import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import type { JobPlan, ProcedurePass } from '../../../shared/job/plan';
import { aPlan, helper, welder } from '../../support/a-plan';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';
import {
  computedOf,
  expectPlainLimits,
  expectWords,
  fieldsOf,
  isRequired,
  judged,
  judgedBefore,
  sourceOf,
  verdictOf,
} from '../../support/judged';

const kind = 'pass-inspected' as const;
const at = (clock: string): string => `2026-09-14T${clock}:00.000Z`;
const looked = (own: ReadingSpecs = {}): ReadingSpecs => ({
  ...Object.fromEntries(
    ['porosity', 'slag', 'overlap', 'arc-strike', 'crack'].map((one) => [`look.${one}.state`, 'none']),
  ),
  ...own,
});
/** 9.625 in round: 30.238 in of weld; 3 min of arc make 10.079 in/min, at 24 V and 120 A 17.144 kJ/in. */
const rods = (row: number, own: Record<string, string | number> = {}): ReadingSpecs =>
  Object.fromEntries(
    Object.entries({
      class: 'E8018-C3',
      lot: 'L-204',
      'out-of-oven': at('11:30'),
      count: 6,
      amps: 120,
      volts: 24,
      'arc-time': 3,
      ...own,
    }).map(([name, value]) => [`rods.${row}.${name}`, value]),
  );
const allRead: ReadingSpecs = {
  'temps.head': 300,
  'temps.casing': 310,
  welders: welder.accountId,
  ...rods(1),
  ...looked(),
  undercut: 0,
};
const struck = [{ act: 'pass', begun: at('12:02'), ended: at('12:20') }];
const aPass = (own: ReadingSpecs = {}, more: { pass?: number; round?: number; plan?: JobPlan } = {}) =>
  aPointContext({ kind, pass: 2, ...more, readings: { ...allRead, ...own }, acts: struck });
const fillets = (own: Partial<ProcedurePass> = {}): ProcedurePass[] =>
  aPlan().procedure.passes.map((pass) => ({ ...pass, ...own }));

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
