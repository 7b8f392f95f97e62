import { greatest, least } from './extremes';
import { temperaturesBetween } from './temperatures-between';
import { NITROGEN_F, nitrogenGauge, nitrogenPressureAt } from './nitrogen-temperature';
import { firstRefusal, firstRefusalIn, mustBe, refuse, type Outcome } from './outcome';
import { POSITIVE_PRESSURE_PSI, PRESSURE_PSI } from './ranges';

export const pressureHoldInfo = {
  id: 'pressure-hold',
  version: 2,
  formula:
    'lowest ≥ target; start − lowest ≤ allowed; for nitrogen with temperatures (straight between two readings): expected at equal density − reading ≤ allowed',
  source: 'common practice; nitrogen by the reference equation of state of Span and others (2000)',
  range: 'readings at both ends of the hold',
} as const;

export interface HoldSample {
  readonly timeS: number;
  readonly pressurePsig: number;
  readonly temperatureF?: number;
}

/** What speaks against the hold; none of them means it held. */
export type HoldFinding =
  'start-not-covered' | 'end-not-covered' | 'clock-short' | 'below-target' | 'drop-over-allowed';

export interface PressureHold {
  held: boolean;
  findings: readonly HoldFinding[];
  lowestPsig: number;
  highestPsig: number;
  startPsig: number;
  endPsig: number;
  /** Largest fall below the start as read off the gauge. */
  dropPsi: number;
  ratePsiPerMin: number;
  /** Largest fall that temperature does not explain; null without nitrogen or without temperatures. */
  correctedDropPsi: number | null;
  /** Which of the two drops was held against the allowance. */
  judgedBy: 'as-read' | 'temperature-corrected';
  /** Longest stretch of the hold without a reading, seconds. */
  longestGapS: number;
}

export interface HoldTest {
  samples: readonly HoldSample[];
  medium: 'nitrogen' | 'oil';
  targetPsig: number;
  holdS: number;
  allowedDropPsi: number;
  holdStartS: number;
  holdEndS: number;
  /** How late a first and how early a last reading may be and still stand for that end of the hold, seconds. */
  toleranceS: number;
}

const SECONDS = { atLeast: -1e10, atMost: 1e10 } as const;
/** Below any gauge's resolution; keeps a pressure or a drop on its limit from failing on rounding alone. */
const SLACK_PSI = 1e-6;

const numbersFit = (test: HoldTest) =>
  firstRefusal(
    mustBe('targetPsig', test.targetPsig, POSITIVE_PRESSURE_PSI),
    mustBe('holdS', test.holdS, { above: 0, atMost: 1e6 }),
    mustBe('allowedDropPsi', test.allowedDropPsi, PRESSURE_PSI),
    mustBe('holdStartS', test.holdStartS, SECONDS),
    mustBe('holdEndS', test.holdEndS, SECONDS),
    mustBe('toleranceS', test.toleranceS, { atLeast: 0, atMost: 3600 }),
    firstRefusalIn(test.samples, ({ timeS, pressurePsig, temperatureF }) =>
      firstRefusal(
        mustBe('timeS', timeS, SECONDS),
        mustBe('pressurePsig', pressurePsig, { atLeast: -15, atMost: 100_000 }),
        temperatureF === undefined ? null : mustBe('temperatureF', temperatureF, NITROGEN_F),
      ),
    ),
  );

/**
 * Largest unexplained fall against the first reading; null when a temperature is missing at either end. A reading
 * without one in between is held against the straight line between its neighbours, so that no dip hides there.
 */
const correctedDrop = (first: HoldSample, last: HoldSample, during: readonly HoldSample[]): number | null => {
  const startF = first.temperatureF;
  if (startF === undefined || last.temperatureF === undefined) return null;
  const start = { pressurePsig: first.pressurePsig, temperatureF: startF, newTemperatureF: startF };
  const gas = nitrogenPressureAt(start);
  if (!gas.ok) return null;
  const temperatures = temperaturesBetween(during);
  const unexplained = during.map(
    ({ pressurePsig }, index) => nitrogenGauge(gas.densityMolM3, temperatures[index] ?? startF) - pressurePsig,
  );
  return Math.max(0, greatest(unexplained));
};

/**
 * Judges a pressure test's hold from its readings (seconds, psig, °F). Readings before and after the hold are ignored.
 * A colder gauge on nitrogen is no leak and a warmer one hides none, where temperatures were taken.
 */
export const pressureHold = (test: HoldTest): Outcome<PressureHold> => {
  const refused = numbersFit(test);
  if (refused) return refused;
  const { holdStartS, holdEndS, toleranceS } = test;
  const during = test.samples
    .filter(({ timeS }) => timeS >= holdStartS && timeS <= holdEndS)
    .sort((a, b) => a.timeS - b.timeS);
  const [first, last] = [during[0], during.at(-1)];
  if (first === undefined || last === undefined || during.length < 2) {
    return refuse('too-few-readings', 'samples', { atLeast: 2 });
  }
  const pressures = during.map(({ pressurePsig }) => pressurePsig);
  const [lowestPsig, highestPsig] = [least(pressures), greatest(pressures)];
  const dropPsi = first.pressurePsig - lowestPsig;
  const correctedDropPsi = test.medium === 'nitrogen' ? correctedDrop(first, last, during) : null;
  const times = [holdStartS, ...during.map(({ timeS }) => timeS), holdEndS];
  const gaps = times.slice(1).map((time, index) => time - (times[index] ?? time));
  const minutes = (last.timeS - first.timeS) / 60;
  const against: readonly (readonly [HoldFinding, boolean])[] = [
    ['start-not-covered', first.timeS - holdStartS > toleranceS],
    ['end-not-covered', holdEndS - last.timeS > toleranceS],
    ['clock-short', holdEndS - holdStartS < test.holdS],
    ['below-target', lowestPsig < test.targetPsig - SLACK_PSI],
    ['drop-over-allowed', (correctedDropPsi ?? dropPsi) > test.allowedDropPsi + SLACK_PSI],
  ];
  const findings = against.filter(([, found]) => found).map(([finding]) => finding);
  return {
    ok: true,
    held: findings.length === 0,
    findings,
    lowestPsig,
    highestPsig,
    startPsig: first.pressurePsig,
    endPsig: last.pressurePsig,
    dropPsi,
    ratePsiPerMin: minutes > 0 ? (first.pressurePsig - last.pressurePsig) / minutes : 0,
    correctedDropPsi,
    judgedBy: correctedDropPsi === null ? 'as-read' : 'temperature-corrected',
    longestGapS: Math.max(0, greatest(gaps)),
  };
};
