import { firstRefusal, mustBe, type Outcome } from './outcome';
import { DIAMETER_IN } from './ranges';

export const flangeBoltingInfo = {
  id: 'flange-bolting',
  version: 1,
  formula: 'half angle = 180/N; chord = BC·sin(π/N)',
  source: 'geometry of a bolt circle',
  range: '3 to 100 bolts',
} as const;

/** Pitch, straddle half angle (degrees) and distance between neighbouring bolt holes (inches) of a flange. */
export const flangeBolting = (flange: {
  bolts: number;
  boltCircleIn: number;
}): Outcome<{ pitchDeg: number; straddleHalfAngleDeg: number; chordIn: number }> => {
  const { bolts, boltCircleIn } = flange;
  const refused = firstRefusal(
    mustBe('bolts', bolts, { atLeast: 3, atMost: 100 }),
    mustBe('boltCircleIn', boltCircleIn, DIAMETER_IN),
  );
  if (refused) return refused;
  return {
    ok: true,
    pitchDeg: 360 / bolts,
    straddleHalfAngleDeg: 180 / bolts,
    chordIn: boltCircleIn * Math.sin(Math.PI / bolts),
  };
};
