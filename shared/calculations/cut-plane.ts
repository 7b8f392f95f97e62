import { directionTowards, type Direction } from './clock-position';
import { firstRefusal, mustBe, type Outcome } from './outcome';
import { DIAMETER_IN, HEIGHT_IN } from './ranges';

export const cutPlaneInfo = {
  id: 'cut-plane',
  version: 1,
  formula: 'least-squares plane z = c + a·x + b·y through four heights; tilt = atan(√(a² + b²))',
  source: 'least squares, exact for four points at right angles',
  range: 'OD 0 to 200 in, heights ±10,000 in',
} as const;

/** Rounding of doubles alone must not name a low side on a flat cut. */
const FLAT = 1e-9;

export interface CutPlane {
  meanIn: number;
  spreadIn: number;
  highestIn: number;
  lowestIn: number;
  tiltDeg: number;
  /** Where the plane is lowest; null on a flat cut. */
  lowSide: Direction | null;
  /** How far the four points miss the plane: a saddle that no tilt explains. */
  offPlaneIn: number;
}

/**
 * Mean, spread and best plane of a cut measured at 12, 3, 6 and 9 o'clock on a casing of the given OD, in inches.
 * Two opposite points give the slope across the diameter.
 */
export const cutPlane = (cut: {
  at12In: number;
  at3In: number;
  at6In: number;
  at9In: number;
  odIn: number;
}): Outcome<CutPlane> => {
  const { at12In, at3In, at6In, at9In, odIn } = cut;
  const refused = firstRefusal(
    mustBe('at12In', at12In, HEIGHT_IN),
    mustBe('at3In', at3In, HEIGHT_IN),
    mustBe('at6In', at6In, HEIGHT_IN),
    mustBe('at9In', at9In, HEIGHT_IN),
    mustBe('odIn', odIn, DIAMETER_IN),
  );
  if (refused) return refused;
  const highestIn = Math.max(at12In, at3In, at6In, at9In);
  const lowestIn = Math.min(at12In, at3In, at6In, at9In);
  const riseToThree = (at3In - at9In) / odIn;
  const riseToTwelve = (at12In - at6In) / odIn;
  const slope = Math.hypot(riseToThree, riseToTwelve);
  return {
    ok: true,
    meanIn: (at12In + at3In + at6In + at9In) / 4,
    spreadIn: highestIn - lowestIn,
    highestIn,
    lowestIn,
    tiltDeg: (Math.atan(slope) * 180) / Math.PI,
    lowSide: slope < FLAT ? null : directionTowards(-riseToTwelve, -riseToThree),
    offPlaneIn: Math.abs(at12In + at6In - at3In - at9In) / 4,
  };
};
