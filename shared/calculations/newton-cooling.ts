import { fitWithAmbient, fitWithoutAmbient, type CoolingReading } from './cooling-fit';
import { greatest, least } from './extremes';
import { firstRefusal, firstRefusalIn, mustBe, refuse, type Outcome } from './outcome';
import { METAL_F } from './ranges';

export const newtonCoolingInfo = {
  id: 'newton-cooling',
  version: 1,
  formula: 'T = Ta + (T₀ − Ta)·e^(−kt); k by least squares on ln(T − Ta), with Ta given, or Ta, T₀ and k fitted to T',
  source: "Newton's law of cooling",
  range: 'two readings with Ta given, three without; still air, nothing covered or uncovered in between',
} as const;

/** Readings closer than a second are one reading. */
const SHORTEST_SPAN_MIN = 1 / 60;

export interface CoolingFit {
  kPerMin: number;
  ambientF: number;
  /** Fitted temperature at the first reading's minute. */
  startF: number;
  startMinute: number;
  /** Largest distance of a reading from the curve: shows a cover that came off. */
  worstMissF: number;
}

/**
 * Fits the cooling of the weld through readings in minutes and °F. Ambient is given, or null to be fitted. Readings
 * before a cover came off are the caller's to leave out.
 */
export const coolingFit = (weld: {
  readings: readonly CoolingReading[];
  ambientF: number | null;
}): Outcome<CoolingFit> => {
  const { readings, ambientF } = weld;
  const [first] = readings;
  const needed = ambientF === null ? 3 : 2;
  if (first === undefined || readings.length < needed)
    return refuse('too-few-readings', 'readings', { atLeast: needed });
  const refused = firstRefusal(
    ambientF === null ? null : mustBe('ambientF', ambientF, METAL_F),
    firstRefusalIn(readings, ({ minute, temperatureF }) =>
      firstRefusal(
        mustBe('minute', minute, { atLeast: -100_000, atMost: 100_000 }),
        mustBe('temperatureF', temperatureF, METAL_F),
      ),
    ),
  );
  if (refused) return refused;
  const startMinute = least(readings.map(({ minute }) => minute));
  const shifted = readings.map(({ minute, temperatureF }) => ({ minute: minute - startMinute, temperatureF }));
  const span = greatest(shifted.map(({ minute }) => minute));
  if (span < SHORTEST_SPAN_MIN || new Set(shifted.map(({ minute }) => minute)).size < needed)
    return refuse('readings-at-one-time', 'readings');
  if (ambientF !== null && shifted.some(({ temperatureF }) => temperatureF <= ambientF)) {
    return refuse('reading-at-or-below-ambient', 'readings', { above: ambientF });
  }
  const curve = ambientF === null ? fitWithoutAmbient(shifted) : fitWithAmbient(shifted, ambientF);
  if (curve === null || !Number.isFinite(curve.k + curve.above + curve.ambient))
    return refuse('no-fit-for-ambient', 'readings');
  if (!(curve.k > 0)) return refuse('not-cooling', 'readings');
  const at = (minute: number): number => curve.ambient + curve.above * Math.exp(-curve.k * minute);
  const misses = shifted.map(({ minute, temperatureF }) => Math.abs(temperatureF - at(minute)));
  return {
    ok: true,
    kPerMin: curve.k,
    ambientF: curve.ambient,
    startF: curve.ambient + curve.above,
    startMinute,
    worstMissF: greatest(misses),
  };
};

/** The minute at which a fitted weld reaches a temperature in °F, on the readings' own clock. */
export const coolingTime = (
  target: Pick<CoolingFit, 'kPerMin' | 'ambientF' | 'startF' | 'startMinute'> & { targetF: number },
): Outcome<{ minute: number }> => {
  const { kPerMin, ambientF, startF, startMinute, targetF } = target;
  const refused = firstRefusal(
    mustBe('kPerMin', kPerMin, { atLeast: 1e-6, atMost: 100 }),
    mustBe('ambientF', ambientF, METAL_F),
    mustBe('startF', startF, { above: ambientF, atMost: 10_000 }),
    mustBe('startMinute', startMinute, { atLeast: -100_000, atMost: 100_000 }),
    mustBe('targetF', targetF, METAL_F),
  );
  if (refused) return refused;
  if (targetF <= ambientF) return refuse('target-never-reached', 'targetF', { above: ambientF });
  const minutes = Math.log((startF - ambientF) / (targetF - ambientF)) / kPerMin;
  return { ok: true, minute: startMinute + Math.max(0, minutes) };
};
