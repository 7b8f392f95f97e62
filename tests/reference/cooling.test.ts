import fc from 'fast-check';
import { levenbergMarquardt } from 'ml-levenberg-marquardt';
import { linearRegression } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { coolingFit, coolingTime } from '../../shared/calculations';
import { answer, reason } from './answer';

type Pair = readonly [minute: number, temperatureF: number];
const fit = (pairs: readonly Pair[], ambientF: number | null) =>
  coolingFit({ ambientF, readings: pairs.map(([minute, temperatureF]) => ({ minute, temperatureF })) });
const curve = (k: number, ambient: number, start: number, minutes: readonly number[]): Pair[] =>
  minutes.map((minute) => [minute, ambient + (start - ambient) * Math.exp(-k * minute)]);

describe('cooling by Newton’s law', () => {
  it.each([
    [475, 75, 10, 350, 175, 0.037469, 36.998],
    [375, 72, 15, 215, 120, 0.050059, 36.807],
  ])(
    '%d °F in air of %d, after %d min %d: %d °F with k %d at %d min',
    (start, air, minute, later, target, k, reached) => {
      const cooling = answer(
        fit(
          [
            [0, start],
            [minute, later],
          ],
          air,
        ),
      );
      expect(cooling.kPerMin).toBeCloseTo(k, 6);
      expect(answer(coolingTime({ ...cooling, targetF: target })).minute).toBeCloseTo(reached, 3);
    },
  );

  it('fits ln(T − Ta) as a straight line (reference: simple-statistics)', () => {
    const pairs: Pair[] = [
      [0, 470],
      [8, 372],
      [17, 284],
      [30, 205],
    ];
    const theirs = linearRegression(pairs.map(([minute, t]) => [minute, Math.log(t - 75)]));
    const cooling = answer(fit(pairs, 75));
    expect(cooling.kPerMin).toBeCloseTo(-theirs.m, 10);
    expect(cooling.startF).toBeCloseTo(75 + Math.exp(theirs.b), 8);
  });

  it('finds ambient too where nobody took it (reference: ml-levenberg-marquardt)', () => {
    const minutes = [0, 5, 12, 20, 33, 45, 60];
    const pairs = curve(0.04, 68, 480, minutes).map(([m, t], index): Pair => [
      m,
      t + [0.8, -1.1, 0.4, 0.9, -0.7, 0.5, -0.3][index]!,
    ]);
    const theirs = levenbergMarquardt(
      { x: minutes, y: pairs.map(([, t]) => t) },
      ([air = 0, above = 0, k = 0]: number[]) =>
        (minute: number) =>
          air + above * Math.exp(-k * minute),
      {
        initialValues: [60, 400, 0.05],
        gradientDifference: 1e-6,
        maxIterations: 500,
        damping: 1e-3,
        errorTolerance: 1e-12,
      },
    );
    const [air = 0, above = 0, k = 0] = theirs.parameterValues;
    const cooling = answer(fit(pairs, null));
    expect(cooling.kPerMin).toBeCloseTo(k, 5);
    expect(cooling.ambientF).toBeCloseTo(air, 2);
    expect(cooling.startF).toBeCloseTo(air + above, 2);
    expect(cooling.worstMissF).toBeLessThan(1.5);
  });

  it('recovers its own constants, with ambient given and without', () => {
    const constants = fc.record({
      k: fc.double({ min: 0.01, max: 0.1, noNaN: true }),
      ambient: fc.double({ min: -20, max: 110, noNaN: true }),
      start: fc.double({ min: 250, max: 700, noNaN: true }),
    });
    fc.assert(
      fc.property(constants, ({ k, ambient, start }) => {
        const pairs = curve(k, ambient, start, [0, 7, 15, 26, 40]);
        const given = answer(fit(pairs, ambient));
        expect(given.kPerMin).toBeCloseTo(k, 9);
        const fitted = answer(fit(pairs, null));
        expect(fitted.kPerMin).toBeCloseTo(k, 5);
        expect(Math.abs(fitted.ambientF - ambient)).toBeLessThan(0.05);
      }),
    );
  });

  it('counts from the first reading’s own minute', () => {
    const late = answer(
      fit(
        [
          [100, 475],
          [110, 350],
        ],
        75,
      ),
    );
    expect(answer(coolingTime({ ...late, targetF: 175 })).minute).toBeCloseTo(136.998, 3);
  });

  it.each<[string, Pair[], number | null, string]>([
    ['one reading', [[0, 400]], 75, 'too-few-readings'],
    [
      'two readings without ambient',
      [
        [0, 400],
        [9, 300],
      ],
      null,
      'too-few-readings',
    ],
    [
      'two readings at one minute',
      [
        [5, 400],
        [5, 390],
      ],
      75,
      'readings-at-one-time',
    ],
    [
      'a reading at ambient',
      [
        [0, 400],
        [60, 75],
      ],
      75,
      'reading-at-or-below-ambient',
    ],
    [
      'a weld that warms',
      [
        [0, 300],
        [9, 400],
      ],
      75,
      'not-cooling',
    ],
    [
      'a straight line that shows no ambient',
      [
        [0, 400],
        [10, 390],
        [20, 380],
      ],
      null,
      'no-fit-for-ambient',
    ],
    [
      'a reading that is no number',
      [
        [0, NaN],
        [9, 300],
      ],
      75,
      'not-a-number',
    ],
  ])('has no answer for %s', (_name, pairs, ambient, why) => expect(reason(fit(pairs, ambient))).toBe(why));

  it('never reaches what the air itself has not', () => {
    const cooling = answer(
      fit(
        [
          [0, 475],
          [10, 350],
        ],
        125,
      ),
    );
    expect(reason(coolingTime({ ...cooling, targetF: 120 }))).toBe('target-never-reached');
  });
});
