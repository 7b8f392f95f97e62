import { describe, expect, it } from 'vitest';
import type { JobPlan, TestTerms } from '../../../shared/job/plan';
import { aPlan, type PlanOverrides } from '../../support/a-plan';
import { aPointContext, noon, type ReadingSpecs } from '../../support/a-point';
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
import { definitionOf } from '../../../shared/hold-points/definitions';

const kind = 'pressure-test-held' as const;
const at = (clock: string): string => `2026-09-14T${clock}:00.000Z`;

type HoldReading = [clock: string, pressure: number, temperature?: number];
const held = (...readings: HoldReading[]): ReadingSpecs => ({
  'hold.start': at('12:00'),
  'hold.end': at('12:15'),
  ...(Object.fromEntries(
    readings.flatMap(([clock, pressure, temperature], index) => [
      [`hold-readings.${index + 1}.at`, at(clock)],
      [`hold-readings.${index + 1}.pressure`, pressure],
      ...(temperature === undefined ? [] : [[`hold-readings.${index + 1}.temperature`, temperature]]),
    ]),
  ) as ReadingSpecs),
});
const steady = held(['12:00', 1550], ['12:08', 1545], ['12:15', 1540]);

/** A test at so many psi on casing that collapses at 2570 psi, under a flange and a seal of 3000 psi. */
const planOf = (test: Partial<TestTerms> = {}, own: PlanOverrides = {}): JobPlan =>
  aPlan({ ...own, terms: { ...own.terms, test } });
const tested = (readings: ReadingSpecs = {}, plan: JobPlan = planOf()) => aPointContext({ kind, plan, readings });

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

describe('the hold', () => {
  it('is silent until start, end and three readings are there', () => {
    expect(judged(tested(held(['12:00', 1400], ['12:15', 1400])), 'hold-lowest')).toBeUndefined();
    expect(judged(tested(steady), 'hold-lowest')).toBe('hold within');
  });

  it.each([
    [1500, 'hold within'],
    [1499, 'hold outside'],
  ])('a lowest pressure of %s psi is a %s', (lowest, expected) => {
    expect(judged(tested(held(['12:00', 1550], ['12:08', lowest], ['12:15', 1540])), 'hold-lowest')).toBe(expected);
  });

  it.each([
    [1525, 'hold within'],
    [1524, 'hold outside'],
  ])('from 1600 to %s psi with 75 psi allowed is a %s', (end, expected) => {
    expect(judged(tested(held(['12:00', 1600], ['12:08', 1590], ['12:15', end])), 'hold-drop')).toBe(expected);
  });

  it.each([
    ['12:15', 'hold within'],
    ['12:14', 'hold outside'],
  ])('to %s with 15 minutes asked is a %s', (end, expected) => {
    const context = tested({ ...held(['12:00', 1550], ['12:08', 1545], ['12:14', 1540]), 'hold.end': at(end) });
    expect(judged(context, 'hold-time')).toBe(expected);
  });

  it.each([
    ['12:01', '12:14', 'hold within'],
    ['12:02', '12:14', 'hold outside'],
    ['12:01', '12:13', 'hold outside'],
  ])('with readings from %s to %s is a %s', (first, last, expected) => {
    expect(judged(tested(held([first, 1550], ['12:08', 1545], [last, 1540])), 'hold-covered')).toBe(expected);
  });

  it('stops where it cannot be judged from its readings', () => {
    const elsewhere = tested(held(['10:00', 1550], ['10:08', 1545], ['10:15', 1540]));
    expect(judged(elsewhere, 'hold-usable')).toBe('stop outside');
    expect(judged(elsewhere, 'hold-lowest')).toBeUndefined();
    expect(judged(tested(steady), 'hold-usable')).toBeUndefined();
  });

  it('does not call colder nitrogen a leak, nor let warmer nitrogen hide one', () => {
    const plan = planOf({ medium: 'nitrogen', pressurePsi: 900, allowedDropPsi: 20 });
    const colder = tested(held(['12:00', 1000, 90], ['12:08', 968, 75], ['12:15', 936, 60]), plan);
    expect(judged(colder, 'hold-drop')).toBe('hold within');
    expect(verdictOf(definitionOf(kind).judge(colder), 'hold-drop')?.text.key).toBe(
      'limits.hold-drop-corrected.within',
    );
    expect(Number(computedOf(colder).drop)).toBe(64);
    expect(Number(computedOf(colder)['corrected-drop'])).toBeLessThan(2);
    const warmer = tested(held(['12:00', 936, 60], ['12:08', 940, 75], ['12:15', 945, 90]), plan);
    expect(judged(warmer, 'hold-drop')).toBe('hold outside');
    const unread = tested(held(['12:00', 1000], ['12:08', 968], ['12:15', 936]), plan);
    expect(judged(unread, 'hold-drop')).toBe('hold outside');
  });

  it('tells lowest, drop and rate', () => {
    expect(computedOf(tested(steady))).toMatchObject({ lowest: '1540', drop: '10', rate: '0.666667' });
  });
});

describe('what was seen', () => {
  it.each(['weld', 'port', 'seal'])('stops at a leak at the %s', (leak) => {
    expect(judged(tested({ leak }), 'leak')).toBe('stop outside');
    expect(judged(tested({ leak: 'none' }), 'leak')).toBe('stop within');
  });

  it.each([
    [2000, 'hold within'], // 75 % of it is the target of 1500
    [1999, 'hold outside'],
    [6000, 'hold within'],
    [6001, 'hold outside'],
  ])('a gauge of %s psi full scale is a %s', (scale, expected) => {
    expect(judged(tested({ 'full-scale': scale }), 'gauge-range')).toBe(expected);
  });

  it('goes by the gauge’s own full scale and by the share that the programme sets', () => {
    expect(judged(tested({ gauge: 'gauge-1', 'full-scale': 20000 }), 'gauge-range')).toBe('hold within');
    expect(isRequired(tested({ gauge: 'gauge-1' }), 'full-scale')).toBe(false);
    expect(isRequired(tested(), 'full-scale')).toBe(true);
    const texas = planOf({}, { terms: { settings: { gaugeLowPct: '30', gaugeHighPct: '70' } } });
    expect(judged(tested({ 'full-scale': 2000 }, texas), 'gauge-range')).toBe('hold outside');
    expect(judged(tested({ 'full-scale': 5000 }, texas), 'gauge-range')).toBe('hold within');
  });

  it('holds a full scale that cannot be right', () => {
    expect(judged(tested({ 'full-scale': 0 }), 'gauge-range')).toBe('hold outside');
  });

  it.each([
    ['same', 'stop within'],
    ['replaced', 'hold outside'],
    ['not-back', 'stop outside'],
  ])('a plug that is %s is a %s', (back, expected) => {
    expect(judged(tested({ 'plug.1.back': back }), 'plug.1.back')).toBe(expected);
  });

  it('closes the custody of every port', () => {
    const twoPorts = tested({}, planOf({}, { head: { ports: 2 } }));
    expect(fieldsOf(twoPorts).map((field) => field.key)).toContain('plug.2.back');
    expectWords(twoPorts);
  });

  it('stops until it is bled to zero', () => {
    expect(judged(tested({ 'bled-to-zero': 'no' }), 'bled-to-zero')).toBe('stop outside');
  });
});

describe('the medium', () => {
  it('nitrogen shows its energy and how far to stand off', () => {
    const plan = planOf({ medium: 'nitrogen', pressurePsi: 1000 });
    const {
      'stored-energy': energy,
      'stand-off': distance,
      'oil-volume': oil,
    } = computedOf(tested({ volume: '61.0237440947' }, plan));
    expect(Number(energy)).toBeCloseTo(12.285, 3);
    expect(Number(distance)).toBeCloseTo(98.425, 3);
    expect(oil).toBeUndefined();
  });

  it('oil shows what to pump and what one degree does', () => {
    expect(computedOf(tested({ volume: '200' }))).toMatchObject({ 'oil-volume': '1', 'oil-per-degree': '138' });
  });

  it('has words for all that it shows', () => {
    const all: ReadingSpecs = {
      ...held(['12:00', 1550, 90], ['12:08', 1545, 80], ['12:15', 1540, 70]),
      'port-probed': 'yes',
      'fitting-in': 'yes',
      exclusion: 'yes',
      gauge: 'gauge-1',
      volume: '200',
      highest: 1600,
      leak: 'weld',
      'plug.1.back': 'replaced',
      'bled-to-zero': 'yes',
    };
    const ends: ReadingSpecs[] = [
      {},
      { leak: 'port', 'full-scale': 0, gauge: 'unknown' },
      { leak: 'seal', highest: 2600, 'bore-gauged': 'yes' },
    ];
    for (const own of ends) {
      for (const medium of ['nitrogen', 'hydraulic-oil'] as const) {
        const context = tested({ ...all, ...own }, planOf({ medium }));
        expectWords(context);
        expectPlainLimits(context);
      }
    }
    expectWords(tested(held(['10:00', 1550], ['10:08', 1545], ['10:15', 1540])));
  });
});
