import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import * as calculations from '../../../shared/calculations';

/** Every calculation with the names of its number inputs and what else it needs. */
const CASES = {
  takeoff: [['faceToShoulderIn', 'faceToOutletIn', 'socketDepthIn'], { datum: 'outlet' }],
  cutMark: [['targetHeightIn', 'takeoffIn', 'standOffIn', 'stringHeightIn'], {}],
  datumLanding: [['cutElevationIn', 'takeoffIn', 'standOffIn', 'targetHeightIn'], {}],
  stringHeight: [['heightAtStakeAIn', 'heightAtStakeBIn', 'stakeAToStakeBIn', 'stakeAToCasingIn'], {}],
  leftToCut: [['stubTopFromStringIn', 'markFromStringIn'], {}],
  weldRoom: [['cutElevationIn', 'standOffIn', 'socketDepthIn', 'obstructionElevationIn'], {}],
  lowestRoughCut: [['cutElevationIn', 'allowanceIn', 'stringHeightIn'], {}],
  cutPlane: [['at12In', 'at3In', 'at6In', 'at9In', 'odIn'], {}],
  twoHoleRotation: [['firstOffsetIn', 'secondOffsetIn', 'betweenIn', 'outletReachIn'], {}],
  flangeTilt: [['twelveHighDeg', 'threeHighDeg'], {}],
  flangeBolting: [['bolts', 'boltCircleIn'], {}],
  collapseCoefficients: [['yieldPsi'], {}],
  casingCollapse: [['odIn', 'wallIn', 'yieldPsi'], {}],
  internalYield: [['odIn', 'wallIn', 'yieldPsi'], {}],
  bodyYield: [['odIn', 'wallIn', 'yieldPsi'], {}],
  odTolerance: [['nominalOdIn', 'measuredOdIn'], {}],
  drift: [['odIn', 'wallIn'], {}],
  outOfRoundness: [['firstOdIn', 'secondOdIn', 'nominalOdIn'], {}],
  voidPressureLimit: [['flangeRatingPsi', 'collapsePsi', 'collapseSharePct', 'sealRatingPsi'], {}],
  casingRow: [['odIn', 'weightLbFt'], { grade: 'J55' }],
  flangeOf: [['ratedPsi'], { size: '11' }],
  travelSpeedRound: [['odIn', 'arcMinutes'], {}],
  travelSpeedRunOut: [['runOutIn', 'arcMinutes'], {}],
  heatInput: [['volts', 'amperes', 'speedInPerMin'], {}],
  preheatDistance: [['thicknessIn'], { rule: 'iso-13916' }],
  electrodeExposure: [['exposedMinutes'], { electrodeClass: 'E7018' }],
  coolingTime: [['kPerMin', 'ambientF', 'startF', 'startMinute', 'targetF'], {}],
  nitrogenPressureAt: [['pressurePsig', 'temperatureF', 'newTemperatureF'], {}],
  nitrogenStoredEnergy: [['volumeL', 'pressurePsig'], {}],
  gaugeRange: [['targetPsi', 'fullScalePsi', 'lowPct', 'highPct'], {}],
  oilCompression: [['volumeL', 'pressurePsi', 'bulkModulusPsi'], {}],
  trappedLiquid: [['bulkModulusPsi', 'expansionPerF', 'differenceF'], {}],
  gasLimits: [['reading', 'siteLow', 'siteHigh'], { gas: 'oxygen' }],
  preheatAdvice: [['cetPct', 'thicknessMm', 'hydrogenMlPer100g', 'heatInputKjPerMm'], {}],
  filletPlan: [
    ['surfaceDiameterIn', 'planLegIn', 'gapIn', 'rodDiameterIn', 'rodLengthIn', 'stubIn', 'efficiencyPct'],
    { side: 'inside' },
  ],
  filletUndersize: [['planLegIn', 'measuredLegIn', 'undersizeSharePct'], {}],
  visualLimits: [['undercutIn', 'thicknessIn'], { crackPresent: false }],
  carbonEquivalent: [
    [
      'carbonPct',
      'manganesePct',
      'siliconPct',
      'chromiumPct',
      'molybdenumPct',
      'vanadiumPct',
      'nickelPct',
      'copperPct',
      'boronPct',
    ],
    {},
  ],
} as const satisfies Record<string, readonly [readonly string[], object]>;

const hostile = fc.oneof(
  fc.constantFrom(NaN, Infinity, -Infinity, 0, -0, -1, 1e-300, 1e308, -1e308, 5e-324, 2, 55_000),
  fc.double(),
  fc.double({ min: 0, max: 100, noNaN: true }),
);

const everyNumberIsFinite = (value: unknown): boolean =>
  typeof value === 'number'
    ? Number.isFinite(value)
    : value === null || typeof value !== 'object' || Object.values(value).every(everyNumberIsFinite);

type Calculate = (input: object) => calculations.Outcome<object>;

describe('a calculation takes any number a person can type', () => {
  it.each(Object.entries(CASES))('%s answers in finite numbers or says why not', (name, [inputs, rest]) => {
    const calculate = calculations[name as keyof typeof CASES] as unknown as Calculate;
    fc.assert(
      fc.property(fc.tuple(...inputs.map(() => hostile)), (numbers) => {
        const outcome = calculate({ ...rest, ...Object.fromEntries(inputs.map((input, i) => [input, numbers[i]])) });
        if (outcome.ok) expect(everyNumberIsFinite(outcome)).toBe(true);
        else expect(outcome.reason).toMatch(/^[a-z-]+$/);
      }),
    );
  });

  it('the lists of readings too', () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(hostile, hostile), { maxLength: 6 }), hostile, (pairs, number) => {
        const readings = pairs.map(([minute, temperatureF]) => ({ minute, temperatureF }));
        const samples = pairs.map(([timeS, pressurePsig]) => ({ timeS, pressurePsig, temperatureF: number }));
        const outcomes = [
          calculations.coolingFit({ readings, ambientF: null }),
          calculations.coolingFit({ readings, ambientF: number }),
          calculations.readingAgreement({ readingsIn: pairs.map(([reading]) => reading), toleranceIn: number }),
          calculations.pressureHold({
            samples,
            medium: 'nitrogen',
            targetPsig: 100,
            holdS: 60,
            allowedDropPsi: number,
            holdStartS: 0,
            holdEndS: 100,
            toleranceS: 30,
          }),
        ];
        for (const outcome of outcomes) {
          if (outcome.ok) expect(everyNumberIsFinite(outcome)).toBe(true);
          else expect(outcome.reason).toMatch(/^[a-z-]+$/);
        }
      }),
      { numRuns: 500 },
    );
  });
});

describe('every calculation stands on record with what it is', () => {
  const infos = Object.entries(calculations).flatMap(([name, value]) =>
    name.endsWith('Info') ? [value as calculations.CalculationInfo] : [],
  );
  it('has an id of its own, a version, a formula, a source and a range', () => {
    expect(new Set(infos.map(({ id }) => id)).size).toBe(infos.length);
    for (const info of infos) {
      expect(Number.isInteger(info.version) && info.version >= 1).toBe(true);
      for (const text of [info.formula, info.source, info.range]) expect(text.length).toBeGreaterThan(0);
    }
  });
});
