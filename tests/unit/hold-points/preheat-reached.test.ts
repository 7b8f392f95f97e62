import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import { aPlan, carbonAlone } from '../../support/a-plan';
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
} from '../../support/judged';

const kind = 'preheat-reached' as const;
const metal = (temperature: number): ReadingSpecs =>
  Object.fromEntries(
    ['head', 'casing'].flatMap((part) => ['12', '3', '6', '9'].map((at) => [`preheat.${part}.${at}`, temperature])),
  );
const hot: ReadingSpecs = {
  ...metal(300),
  'preheat.seal-level': 180,
  'preheat.distance': 3,
  'preheat.by': 'pyrometer',
  'preheat.instrument': 'pyrometer-1',
  'joint-dry': 'yes',
  'joint-sheltered': 'yes',
  'fluid.below-weld': 24,
};
const heated = (own: ReadingSpecs, plan = aPlan()) => aPointContext({ kind, plan, readings: { ...hot, ...own } });

describe('preheat reached', () => {
  it.each([
    [249.9, 'outside'],
    [250, 'within'],
    [450, 'within'],
    [450.1, 'outside'],
  ])('holds %s °F against the procedure: %s', (temperature, outcome) => {
    expect(judged(heated({ 'preheat.casing.6': temperature }), 'preheat.casing.6')).toBe(`hold ${outcome}`);
  });

  it('names the procedure and its revision as the source', () => {
    expect(sourceOf(heated({}), 'preheat.head.12')).toBe('procedure HF-2 rev 3');
  });

  it.each([
    [300, 'hold within'],
    [300.1, 'hold outside'],
  ])('holds %s °F at the seal against its rating', (temperature, expected) => {
    expect(judged(heated({ 'preheat.seal-level': temperature }), 'preheat.seal-level')).toBe(expected);
  });

  it('asks nothing about a seal where there is none', () => {
    const context = heated({}, aPlan({ head: { seals: 0, sealAboveBaseIn: [] } }));
    expect(fieldsOf(context).map((field) => field.key)).not.toContain('preheat.seal-level');
    expect(judged(context, 'preheat.seal-level')).toBeUndefined();
  });

  it.each([
    ['aws-d1.1' as const, 2.99, 'hold outside', 'standard AWS D1.1'],
    ['aws-d1.1' as const, 3, 'hold within', 'standard AWS D1.1'],
    ['iso-13916' as const, 1.96, 'hold outside', 'standard ISO 13916'],
    ['iso-13916' as const, 1.97, 'hold within', 'standard ISO 13916'],
  ])('by %s takes %s in from the joint as %s', (preheatDistance, distance, expected, source) => {
    const context = heated(
      { 'preheat.distance': distance },
      aPlan({ head: { baseOdIn: '10.75' }, procedure: { preheatDistance } }),
    );
    expect(judged(context, 'preheat.distance')).toBe(expected);
    expect(sourceOf(context, 'preheat.distance')).toBe(source);
  });

  it('measures the distance by the thicker part, here the wall of the head', () => {
    const plan = aPlan({ head: { baseOdIn: '16.75', socketBoreIn: '9.75' } });
    expect(judged(heated({ 'preheat.distance': 3.49 }, plan), 'preheat.distance')).toBe('hold outside');
    expect(judged(heated({ 'preheat.distance': 3.5 }, plan), 'preheat.distance')).toBe('hold within');
  });

  it('stops at a wet or unsheltered joint', () => {
    expect(judged(heated({ 'joint-dry': 'no' }), 'joint-dry')).toBe('stop outside');
    expect(judged(heated({ 'joint-sheltered': 'no' }), 'joint-sheltered')).toBe('stop outside');
  });

  it.each([
    [23.9, 'hold outside'],
    [24, 'hold within'],
  ])('holds fluid %s in below the weld', (inches, expected) => {
    expect(judged(heated({ 'fluid.below-weld': inches }), 'fluid.below-weld')).toBe(expected);
  });

  it('gives the advice of the steel only when its chemistry is known, and never blocks by it', () => {
    const chemistry = {
      composition: carbonAlone('0.4225'),
      thicknessMm: '25.4',
      hydrogenMl: '5',
      heatInputKjPerMm: '1',
    };
    const context = heated({}, aPlan({ procedure: { chemistry } }));
    expect(judged(context, 'preheat-advised')).toBe('advice outside');
    expect(Number(computedOf(context)['advice-preheat'])).toBeCloseTo(329.09, 1);
    expect(computedOf(context)['carbon-equivalent']).toBe('0.4225');
    expect(judged(heated(metal(330), aPlan({ procedure: { chemistry } })), 'preheat-advised')).toBe('advice within');
    expect(judged(heated({}), 'preheat-advised')).toBeUndefined();
  });

  it('gives no advice outside the range of the method', () => {
    const chemistry = { composition: carbonAlone('0.52'), thicknessMm: '25.4', hydrogenMl: '5', heatInputKjPerMm: '1' };
    const context = heated({}, aPlan({ procedure: { chemistry } }));
    expect(judged(context, 'preheat-advised')).toBeUndefined();
    expect(computedOf(context)['advice-preheat']).toBeUndefined();
  });

  it('shows lowest and highest once all eight are read', () => {
    expect(computedOf(heated({ 'preheat.head.3': 260, 'preheat.casing.9': 420 }))).toMatchObject({
      lowest: '260',
      highest: '420',
    });
    expect(computedOf(aPointContext({ kind, readings: { 'preheat.head.12': 300 } }))).toEqual({});
  });

  it('asks for the pyrometer only when one was used', () => {
    expect(isRequired(heated({}), 'preheat.instrument')).toBe(true);
    expect(isRequired(heated({ 'preheat.by': 'stick' }), 'preheat.instrument')).toBe(false);
  });

  it('in a repair round digs first, and heats only what was found free of cracks', () => {
    const round = (cracks?: string) =>
      aPointContext({ kind, round: 1, readings: cracks ? { 'excavated-cracks': cracks } : {} });
    expect(
      definitionOf(kind)
        .acts(round())
        .map((act) => act.key),
    ).toEqual(['excavation', 'preheat']);
    expect(judged(round(), 'excavated-cracks')).toBeUndefined();
    expect(judged(round('found'), 'excavated-cracks')).toBe('stop outside');
    expect(judged(round('none'), 'excavated-cracks')).toBe('stop within');
    expect(judgedBefore(round(), 'preheat', noon, 'excavated-cracks')).toBe('stop outside');
    expect(judgedBefore(round('none'), 'preheat', noon, 'excavated-cracks')).toBe('stop within');
    expect(judgedBefore(round(), 'excavation', noon, 'excavated-cracks')).toBeUndefined();
    expect(
      definitionOf(kind)
        .acts(heated({}))
        .map((act) => act.key),
    ).toEqual(['preheat']);
  });

  it('has words for all that it shows', () => {
    const chemistry = {
      composition: carbonAlone('0.4225'),
      thicknessMm: '25.4',
      hydrogenMl: '5',
      heatInputKjPerMm: '1',
    };
    const context = aPointContext({
      kind,
      round: 1,
      plan: aPlan({ procedure: { chemistry } }),
      readings: { ...hot, 'excavated-cracks': 'none' },
    });
    expectWords(context);
    expectPlainLimits(context);
  });
});
