import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import { aPlan, type PlanOverrides } from '../../support/a-plan';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';
import { computedAs, fieldKeys, ruling, verdictOn } from '../../support/verdicts';

const point = (readings: ReadingSpecs, plan?: PlanOverrides) =>
  aPointContext({ kind: 'bevel-prep', readings, plan: aPlan(plan) });
const withoutSeal: PlanOverrides = { head: { seals: 0, sealAboveBaseIn: [] } };

describe('bevel prep', () => {
  it.each([
    ['bevel.angle', '27.5', '32.5', '27.49', '32.51'],
    ['bevel.land', '0', '0.0625', '-0.01', '0.063'],
  ])('holds %s to the procedure', (field, low, high, under, over) => {
    for (const value of [low, high]) expect(ruling(point({ [field]: value }), field)).toBe('within hold');
    for (const value of [under, over]) expect(ruling(point({ [field]: value }), field)).toBe('outside hold');
    expect(verdictOn(point({ [field]: low }), field)?.source).toEqual({ kind: 'procedure', ref: 'HF-2 rev 3' });
  });

  it('holds every diameter to the pipe’s tolerance, one per cent over and half under', () => {
    for (const field of ['od.seal.x', 'od.seal.y', 'od.weld.x', 'od.weld.y']) {
      expect(ruling(point({ [field]: '9.72125' }), field)).toBe('within hold');
      expect(ruling(point({ [field]: '9.7213' }), field)).toBe('outside hold');
      expect(ruling(point({ [field]: '9.576875' }), field)).toBe('within hold');
      expect(ruling(point({ [field]: '9.5768' }), field)).toBe('outside hold');
    }
    expect(verdictOn(point({ 'od.seal.x': '9.625' }), 'od.seal.x')?.source).toEqual({
      kind: 'standard',
      ref: 'API 5CT',
    });
    expect(ruling(point({ 'od.seal.x': '9625' }), 'od.seal.x')).toBe('outside hold');
  });

  it('has no tolerance to hold a casing under four and a half inches to', () => {
    expect(ruling(point({ 'od.seal.x': '5' }, { casing: { odIn: '4' } }), 'od.seal.x')).toBe('silent');
  });

  it('wants the outside clean to three inches below the base, and the inside too', () => {
    expect(ruling(point({ 'clean.outside': '13' }), 'clean.outside')).toBe('within hold');
    expect(ruling(point({ 'clean.outside': '12.99' }), 'clean.outside')).toBe('outside hold');
    expect(ruling(point({ 'clean.outside': '12.75' }, { terms: { standOffIn: '0.25' } }), 'clean.outside')).toBe(
      'within hold',
    );
    expect(ruling(point({ 'clean.inside': '1' }), 'clean.inside')).toBe('within hold');
    expect(ruling(point({ 'clean.inside': '0.99' }), 'clean.inside')).toBe('outside hold');
  });

  it.each(['no-sharp-edge', 'inside-deburred', 'bright-metal', 'seal-area-smooth'])(
    'stops when %s is not done',
    (field) => {
      expect(ruling(point({ [field]: 'yes' }), field)).toBe('within stop');
      expect(ruling(point({ [field]: 'no' }), field)).toBe('outside stop');
    },
  );

  it('works out mean, share of nominal and roundness at seal and weld', () => {
    const context = point({ 'od.seal.x': '9.65', 'od.seal.y': '9.62' });
    expect(computedAs(context, 'od-mean.seal')).toBe(9.635);
    expect(computedAs(context, 'od-against-nominal.seal')).toBeCloseTo(0.103896, 5);
    expect(computedAs(context, 'out-of-round.seal')).toBeCloseTo(0.03, 6);
    expect(computedAs(context, 'od-mean.weld')).toBeUndefined();
  });

  it('drops what belongs to the seal on a head without one', () => {
    const context = point({}, withoutSeal);
    expect(fieldKeys(context)).toEqual([
      'bevel.angle',
      'bevel.land',
      'od.weld.x',
      'od.weld.y',
      'clean.outside',
      'clean.inside',
      'inside-deburred',
      'bright-metal',
    ]);
    expect(definitionOf('bevel-prep').shots(context)).toEqual([{ key: 'bevel', required: true }]);
    expect(definitionOf('bevel-prep').shots(point({}))).toHaveLength(2);
  });
});
