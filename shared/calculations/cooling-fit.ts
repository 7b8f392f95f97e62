import { greatest, least } from './extremes';

/** A temperature with its time, on any clock that runs in minutes. */
export interface CoolingReading {
  readonly minute: number;
  readonly temperatureF: number;
}

interface Curve {
  readonly k: number;
  readonly ambient: number;
  /** Fitted start above ambient. */
  readonly above: number;
}

interface Line {
  readonly slope: number;
  readonly intercept: number;
}

const line = (points: readonly (readonly [number, number])[]): Line => {
  const n = points.length;
  const meanX = points.reduce((sum, [x]) => sum + x, 0) / n;
  const meanY = points.reduce((sum, [, y]) => sum + y, 0) / n;
  const top = points.reduce((sum, [x, y]) => sum + (x - meanX) * (y - meanY), 0);
  const bottom = points.reduce((sum, [x]) => sum + (x - meanX) ** 2, 0);
  const slope = top / bottom;
  return { slope, intercept: meanY - slope * meanX };
};

/** With ambient known, ln(T − Ta) over time is a straight line whose slope is −k. */
export const fitWithAmbient = (readings: readonly CoolingReading[], ambient: number): Curve => {
  const { slope, intercept } = line(
    readings.map(({ minute, temperatureF }) => [minute, Math.log(temperatureF - ambient)] as const),
  );
  return { k: -slope, ambient, above: Math.exp(intercept) };
};

/** For a given k the curve is a straight line over e^(−kt): ambient and start follow, only k is searched. */
const curveAt = (readings: readonly CoolingReading[], k: number): Curve & { readonly squares: number } => {
  const points = readings.map(({ minute, temperatureF }) => [Math.exp(-k * minute), temperatureF] as const);
  const { slope, intercept } = line(points);
  const squares = points.reduce((sum, [x, y]) => sum + (y - intercept - slope * x) ** 2, 0);
  return { k, ambient: intercept, above: slope, squares };
};

const STEPS = 240;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * Least squares on T with ambient unknown. Scans k over what the readings' span can tell, then narrows by golden
 * section. Null when the best k lies at the edge of the scan: the readings do not bend enough to show an ambient.
 */
export const fitWithoutAmbient = (readings: readonly CoolingReading[]): Curve | null => {
  const span = greatest(readings.map(({ minute }) => minute));
  const [low, high] = [Math.log(0.01 / span), Math.log(50 / span)];
  const step = (high - low) / STEPS;
  const squaresAt = (logK: number): number => curveAt(readings, Math.exp(logK)).squares;
  const scan = Array.from({ length: STEPS + 1 }, (_, index) => squaresAt(low + index * step));
  const best = scan.indexOf(least(scan));
  if (best <= 0 || best >= STEPS) return null;
  let [left, right] = [low + (best - 1) * step, low + (best + 1) * step];
  for (let round = 0; round < 80; round += 1) {
    const inner = (right - left) * GOLDEN;
    if (squaresAt(right - inner) < squaresAt(left + inner)) right = left + inner;
    else left = right - inner;
  }
  const curve = curveAt(readings, Math.exp((left + right) / 2));
  const coldest = least(readings.map(({ temperatureF }) => temperatureF));
  return curve.above > 0 && curve.ambient < coldest ? curve : null;
};
