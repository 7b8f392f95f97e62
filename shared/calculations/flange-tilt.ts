import { directionTowards, type Direction } from './clock-position';
import { firstRefusal, mustBe, type Outcome } from './outcome';
import { ANGLE_DEG } from './ranges';

export const flangeTiltInfo = {
  id: 'flange-tilt',
  version: 1,
  formula: 'tilt = atan(√(tan²α + tan²β)) of two levels at right angles',
  source: 'geometry of a plane',
  range: '−90° < level < 90°',
} as const;

const RAD = Math.PI / 180;
const FLAT = 1e-9;

/**
 * The flange's true tilt from two levels at right angles, in degrees: along 12–6 (positive when 12 is high) and along
 * 3–9 (positive when 3 is high). The low side is null on a level flange.
 */
export const flangeTilt = (level: {
  twelveHighDeg: number;
  threeHighDeg: number;
}): Outcome<{ tiltDeg: number; lowSide: Direction | null }> => {
  const { twelveHighDeg, threeHighDeg } = level;
  const refused = firstRefusal(
    mustBe('twelveHighDeg', twelveHighDeg, ANGLE_DEG),
    mustBe('threeHighDeg', threeHighDeg, ANGLE_DEG),
  );
  if (refused) return refused;
  const [toTwelve, toThree] = [Math.tan(twelveHighDeg * RAD), Math.tan(threeHighDeg * RAD)];
  const slope = Math.hypot(toTwelve, toThree);
  const lowSide = slope < FLAT ? null : directionTowards(-toTwelve, -toThree);
  return { ok: true, tiltDeg: Math.atan(slope) / RAD, lowSide };
};
