import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import { type ReadingSpecs } from '../../support/a-point';
import { at, held, kind, planOf, steady, tested } from '../../support/a-pressure-test';
import {
  computedOf,
  expectPlainLimits,
  expectWords,
  fieldsOf,
  isRequired,
  judged,
  verdictOf,
} from '../../support/judged';

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
