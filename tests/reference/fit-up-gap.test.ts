import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fitUpGap } from '../../shared/calculations';
import { answer, reason } from './answer';

describe('what the fit-up gap adds to the fillet leg (common practice)', () => {
  it.each([
    [[0, 0, 0, 0], 0],
    [[0.0625, 0.03, 0, 0], 0],
    [[0.0626, 0.03, 0, 0], 0.0626],
    [[0.03, 0.125, 0.09375, 0], 0.125],
  ])('gaps of %j add %f in', (gaps, adds) => {
    expect(answer(fitUpGap(gaps))).toEqual({ ok: true, largestIn: Math.max(...gaps), addToLegIn: adds });
  });

  it('refuses no readings, and readings that are no gap', () => {
    expect(reason(fitUpGap([]))).toBe('too-few-readings');
    expect(reason(fitUpGap([0, -0.01]))).toBe('below-range');
    expect(reason(fitUpGap([NaN]))).toBe('not-a-number');
  });

  it('adds nothing or the largest gap, never anything between', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 1, maxLength: 8 }), (gaps) => {
        expect([0, Math.max(...gaps)]).toContain(answer(fitUpGap(gaps)).addToLegIn);
      }),
    );
  });
});
