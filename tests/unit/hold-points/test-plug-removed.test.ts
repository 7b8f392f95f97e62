import { describe, expect, it } from 'vitest';
import { aPlan } from '../../support/a-plan';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';
import { expectPlainLimits, expectWords, fieldsOf, judged } from '../../support/judged';

const kind = 'test-plug-removed' as const;
const allDone: ReadingSpecs = {
  'plug.1.out': 'yes',
  'plug.1.where': 'Welding truck, left drawer',
  'plug.1.holder': 'W. Calder',
  'port.1.clear': 'yes',
  'bore-covered': 'yes',
  'bore-vented': 'yes',
};

describe('test plug removed', () => {
  it('is silent while nothing is answered', () => {
    const context = aPointContext({ kind });
    expect(judged(context, 'plug.1.out')).toBeUndefined();
    expect(judged(context, 'plug.1.custody')).toBeUndefined();
  });

  it.each(['plug.1.out', 'port.1.clear', 'bore-covered', 'bore-vented'])(
    'stops when %s is answered with no',
    (field) => {
      expect(judged(aPointContext({ kind, readings: { ...allDone, [field]: 'no' } }), field)).toBe('stop outside');
      expect(judged(aPointContext({ kind, readings: allDone }), field)).toBe('stop within');
    },
  );

  it('stops when nobody holds the plug', () => {
    const nobody = aPointContext({ kind, readings: { ...allDone, 'plug.1.holder': ' ' } });
    expect(judged(nobody, 'plug.1.custody')).toBe('stop outside');
    expect(judged(aPointContext({ kind, readings: allDone }), 'plug.1.custody')).toBe('stop within');
  });

  it('takes every plug of a head with two ports into custody', () => {
    const context = aPointContext({ kind, plan: aPlan({ head: { ports: 2 } }), readings: allDone });
    expect(fieldsOf(context).map((field) => field.key)).toContain('plug.2.where');
    expect(judged(context, 'plug.2.out')).toBeUndefined();
    expectWords(context);
  });

  it('asks in a repair round whether pressure and medium are gone first', () => {
    const context = aPointContext({ kind, round: 1, readings: { ...allDone, 'bled-to-zero': 'no', drained: 'no' } });
    expect(fieldsOf(context)[0]?.key).toBe('bled-to-zero');
    expect(judged(context, 'bled-to-zero')).toBe('stop outside');
    expect(judged(context, 'drained')).toBe('stop outside');
    expect(fieldsOf(aPointContext({ kind })).map((field) => field.key)).not.toContain('drained');
  });

  it('has words for all that it shows', () => {
    const context = aPointContext({ kind, round: 1, readings: { ...allDone, 'bled-to-zero': 'yes', drained: 'yes' } });
    expectWords(context);
    expectPlainLimits(context);
  });
});
