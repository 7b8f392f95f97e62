import { describe, expect, it } from 'vitest';
import {
  casingRow,
  FLANGE_TABLE,
  flangeBolting,
  flangeOf,
  gaugeRange,
  LIMITS,
  oilCompression,
  ratingsOf,
  trappedLiquid,
  voidPressureLimit,
} from '../../shared/calculations';
import { convert } from '../../shared/units';
import { answer, reason } from './answer';

const limitFor = (odIn: number, weightLbFt: number, flangeRatingPsi: number | null, sealRatingPsi: number | null) =>
  voidPressureLimit({
    flangeRatingPsi,
    collapsePsi: answer(casingRow({ odIn, weightLbFt, grade: 'J55' })).row.collapsePsi,
    collapseSharePct: LIMITS.collapseShare.value,
    sealRatingPsi,
  });

describe('the void’s pressure limit (80 % of collapse is common practice, no source)', () => {
  it('is 904 psi behind 13-3/8 54.5 J55', () =>
    expect(answer(limitFor(13.375, 54.5, 3000, null))).toMatchObject({
      limitPsi: 904,
      governedBy: 'collapse',
      unknown: ['seal'],
    }));
  it('is 2056 psi behind 9-5/8 40 J55', () => expect(answer(limitFor(9.625, 40, 3000, null)).limitPsi).toBe(2056));
  it('is the flange’s rating where that is lower (API 6A)', () =>
    expect(answer(limitFor(9.625, 40, 2000, 5000))).toMatchObject({ limitPsi: 2000, governedBy: 'flange' }));
  it('is the seal’s own rating where that is lower', () =>
    expect(answer(limitFor(9.625, 40, 3000, 1500))).toMatchObject({ limitPsi: 1500, governedBy: 'seal', unknown: [] }));
  it('is never the 70 % of internal yield of a casing test: the void presses from outside', () => {
    const { limitPsi, loading } = answer(limitFor(13.375, 54.5, 3000, null));
    expect(limitPsi).not.toBe(0.7 * 2730);
    expect(loading).toBe('external');
  });
  it('is refused when nothing is known', () => {
    const nothing = { flangeRatingPsi: null, collapsePsi: null, collapseSharePct: 80, sealRatingPsi: null };
    expect(reason(voidPressureLimit(nothing))).toBe('no-limit-given');
  });
});

describe('the flange table (API 6A)', () => {
  it.each([
    ['11', 3000, '6B', 16, '1-3/8', 18.5, 'R-53'],
    ['13-5/8', 3000, '6B', 20, '1-3/8', 21, 'R-57'],
    // From memory.
    ['13 5/8', 5000, '6BX', 16, '1-5/8', 23.25, 'BX-160'],
  ])('%s at %d', (size, ratedPsi, type, bolts, bolt, boltCircleIn, ring) =>
    expect(answer(flangeOf({ size, ratedPsi })).flange).toMatchObject({ type, bolts, bolt, boltCircleIn, ring }),
  );
  it('has no 21-1/4 at 3000', () => {
    expect(reason(flangeOf({ size: '21-1/4', ratedPsi: 3000 }))).toBe('flange-not-in-table');
    expect(ratingsOf('21-1/4')).toEqual([2000, 5000, 10000]);
  });
  it('leaves metal between the holes of every flange', () => {
    for (const flange of FLANGE_TABLE) {
      const [whole = '0', top = '0', bottom = '1'] = flange.bolt.split(/[-/]/);
      const boltIn = Number(whole) + Number(top) / Number(bottom);
      expect(answer(flangeBolting(flange)).chordIn).toBeGreaterThan(1.5 * boltIn);
      expect(flange.boltCircleIn).toBeGreaterThan(flange.boreIn + 2 * boltIn);
      expect(flange.bolts % 4).toBe(0);
    }
  });
});

describe('how each row of the flange table is known', () => {
  it('is stated for the two that the house was given, from memory for all others', () => {
    const stated = FLANGE_TABLE.filter(({ status }) => status === 'stated').map(({ size, ratedPsi }) => [
      size,
      ratedPsi,
    ]);
    expect(stated).toEqual([
      ['11', 3000],
      ['13-5/8', 3000],
    ]);
    expect(new Set(FLANGE_TABLE.map(({ status }) => status))).toEqual(new Set(['stated', 'from memory']));
  });
});

describe('the gauge’s good range', () => {
  const range = (targetPsi: number, lowPct: number, highPct: number) =>
    answer(gaugeRange({ targetPsi, fullScalePsi: 5000, lowPct, highPct }));
  it('is 1250 to 3750 psi of 5000 by common practice', () =>
    expect(range(2000, LIMITS.gaugeLow.value, LIMITS.gaugeHigh.value)).toMatchObject({
      lowPsi: 1250,
      highPsi: 3750,
      verdict: 'within',
    }));
  it('is 1500 to 3500 psi by Texas RRC form H-5', () =>
    expect(range(2000, LIMITS.gaugeLowTexas.value, LIMITS.gaugeHighTexas.value)).toMatchObject({
      lowPsi: 1500,
      highPsi: 3500,
    }));
  it('takes its own ends in where the scale was in bar', () => {
    for (let bar = 1; bar < 1000; bar += 1) {
      const fullScalePsi = convert(bar, 'bar', 'psi');
      for (const [share, lowPct, highPct] of [
        [0.25, 25, 99],
        [0.7, 1, 70],
      ] as const) {
        const targetPsi = convert(bar * share, 'bar', 'psi');
        expect(answer(gaugeRange({ targetPsi, fullScalePsi, lowPct, highPct })).verdict).toBe('within');
      }
    }
  });
  it('takes its own ends in', () =>
    expect([1249, 1250, 3750, 3751].map((psi) => range(psi, 25, 75).verdict)).toEqual([
      'below',
      'within',
      'within',
      'above',
    ]));
});

describe('oil under pressure (definitions; B 3.0e5 psi, α 4.6e-4 per °F common practice)', () => {
  it('rises 6900 psi when 50 °F warmer and shut in', () =>
    expect(answer(trappedLiquid({ bulkModulusPsi: 3e5, expansionPerF: 4.6e-4, differenceF: 50 })).risePsi).toBeCloseTo(
      6900,
      8,
    ));
  it('takes 10 mL into 1 L for 3000 psi, worked by hand', () => {
    const oil = answer(oilCompression({ volumeL: 1, pressurePsi: 3000, bulkModulusPsi: 3e5 }));
    expect(oil.pumpL).toBeCloseTo(0.01, 12);
    // P²V/2B = (3000 psi)²·1 L/(2·300,000 psi) = 15 psi·L = 15 × 6.894757 J.
    expect(oil.energyJ).toBeCloseTo(15 * 6.894757293, 6);
  });
});
