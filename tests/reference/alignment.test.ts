import fc from 'fast-check';
import { lusolve, multiply, transpose } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { cutPlane, flangeBolting, flangeTilt, readingAgreement, twoHoleRotation } from '../../shared/calculations';
import { answer, reason } from './answer';

describe('the plane of a cut (least squares)', () => {
  it('is flat for equal heights', () => {
    const flat = answer(cutPlane({ at12In: 3, at3In: 3, at6In: 3, at9In: 3, odIn: 9.625 }));
    expect(flat).toMatchObject({ meanIn: 3, spreadIn: 0, tiltDeg: 0, lowSide: null, offPlaneIn: 0 });
  });

  it.each([
    [24, 0.1492],
    [21, 0.1705],
  ])('tilts 1/16 in across %d in by %d° (worked by hand)', (odIn, degrees) => {
    const cut = answer(cutPlane({ at12In: 1 / 16, at3In: 1 / 32, at6In: 0, at9In: 1 / 32, odIn }));
    expect(cut.tiltDeg).toBeCloseTo(degrees, 4);
    expect(cut.lowSide).toEqual({ clockwiseDeg: 180, clock: '6:00' });
  });

  it('names the low side clockwise from above', () => {
    const low = (at12In: number, at3In: number, at6In: number, at9In: number) =>
      answer(cutPlane({ at12In, at3In, at6In, at9In, odIn: 13.375 })).lowSide?.clock;
    expect(low(0, 1, 2, 1)).toBe('12:00');
    expect(low(1, 0, 1, 2)).toBe('3:00');
    expect(low(1, 2, 1, 0)).toBe('9:00');
    expect(low(0, 0, 1, 1)).toBe('1:30');
  });

  it('shows a saddle that no tilt explains', () => {
    const saddle = answer(cutPlane({ at12In: 0.1, at3In: 0, at6In: 0.1, at9In: 0, odIn: 20 }));
    expect(saddle.tiltDeg).toBe(0);
    expect(saddle.offPlaneIn).toBeCloseTo(0.05, 12);
  });

  it('agrees with the normal equations (reference: mathjs)', () => {
    const height = fc.double({ min: -2, max: 2, noNaN: true });
    fc.assert(
      fc.property(height, height, height, height, fc.double({ min: 4.5, max: 30, noNaN: true }), (a, b, c, d, odIn) => {
        const r = odIn / 2;
        const points = [
          [1, 0, r],
          [1, r, 0],
          [1, 0, -r],
          [1, -r, 0],
        ];
        const side = transpose(points);
        const solved = lusolve(multiply(side, points), multiply(side, [a, b, c, d])) as number[][];
        const [mean = 0, x = 0, y = 0] = solved.map(([value = 0]) => value);
        const cut = answer(cutPlane({ at12In: a, at3In: b, at6In: c, at9In: d, odIn }));
        expect(cut.meanIn).toBeCloseTo(mean, 9);
        expect(cut.tiltDeg).toBeCloseTo((Math.atan(Math.hypot(x, y)) * 180) / Math.PI, 7);
      }),
    );
  });
});

describe('two-hole rotation (common practice)', () => {
  const turn = (firstOffsetIn: number, betweenIn: number, outletReachIn: number) =>
    answer(twoHoleRotation({ firstOffsetIn, secondOffsetIn: 0, betweenIn, outletReachIn }));
  it('turns 1/8 in per foot by 0.5968°', () => expect(turn(0.125, 12, 0).rotationDeg).toBeCloseTo(0.5968, 4));
  it('misses by 0.18326 in at 21 in for half a degree', () => {
    expect(turn(12 * Math.tan(Math.PI / 360), 12, 21).atValveIn).toBeCloseTo(0.18326, 5);
  });
  it('turns the other way for the other sign', () => expect(turn(-0.125, 12, 21).rotationDeg).toBeCloseTo(-0.5968, 4));
  it('needs a length', () =>
    expect(reason(twoHoleRotation({ firstOffsetIn: 1, secondOffsetIn: 0, betweenIn: 0, outletReachIn: 1 }))).toBe(
      'below-range',
    ));
});

describe('flange tilt of two levels at right angles (geometry)', () => {
  it('adds like a right triangle: 0.15° and 0.20° make 0.25°', () => {
    const tilt = answer(flangeTilt({ twelveHighDeg: 0.15, threeHighDeg: -0.2 }));
    expect(tilt.tiltDeg).toBeCloseTo(0.25, 5);
    expect(tilt.lowSide?.clockwiseDeg).toBeCloseTo(180 - 53.13, 1);
  });
  it('has no low side when level', () =>
    expect(answer(flangeTilt({ twelveHighDeg: 0, threeHighDeg: 0 })).lowSide).toBeNull());
});

describe('flange bolting (geometry of a bolt circle)', () => {
  it.each([
    [12, 15],
    [16, 11.25],
    [20, 9],
    [24, 7.5],
  ])('straddles with %d bolts by %d°', (bolts, half) =>
    expect(answer(flangeBolting({ bolts, boltCircleIn: 20 })).straddleHalfAngleDeg).toBe(half),
  );
  it.each([
    [12.5, 12, 3.2352],
    [21, 20, 3.2851],
  ])('on %d in with %d bolts holes lie %d in apart', (boltCircleIn, bolts, chord) =>
    expect(answer(flangeBolting({ bolts, boltCircleIn })).chordIn).toBeCloseTo(chord, 4),
  );
});

describe('agreement of readings (common practice)', () => {
  const agree = (...readingsIn: number[]) => answer(readingAgreement({ readingsIn, toleranceIn: 1 / 16 }));
  it('counts two within a sixteenth', () =>
    expect(agree(14.375, 14.4375)).toMatchObject({ agreed: true, counted: [0, 1], valueIn: 14.40625 }));
  it('leaves two apart open', () =>
    expect(agree(14.375, 14.5)).toMatchObject({ agreed: false, valueIn: null, differenceIn: 0.125 }));
  it('lets a third settle it', () =>
    expect(agree(14.375, 14.625, 14.3125)).toMatchObject({ agreed: true, counted: [0, 2] }));
  it('lets a third that agrees with nobody settle nothing', () => expect(agree(14, 15, 16).agreed).toBe(false));
  it('lets a third midway settle nothing', () => expect(agree(14.375, 14.5, 14.4375).agreed).toBe(false));
  it('ignores a third where two agreed already', () => expect(agree(14, 14, 20).counted).toEqual([0, 1]));
  it('needs two', () =>
    expect(reason(readingAgreement({ readingsIn: [14], toleranceIn: 1 }))).toBe('too-few-readings'));
});
