import { firstRefusal, mustBe, type Outcome } from './outcome';
import { HEIGHT_IN, LENGTH_IN } from './ranges';

export const weldRoomInfo = {
  id: 'weld-room',
  version: 1,
  formula: 'base = cut + stand-off − socket depth; room = base − top of what stands below',
  source: 'common practice',
  range: 'heights ±10,000 in, lengths 0 to 100,000 in',
} as const;

/** Height of the head's base and the room between it and the conductor top or cellar floor below, in inches. */
export const weldRoom = (set: {
  cutElevationIn: number;
  standOffIn: number;
  socketDepthIn: number;
  obstructionElevationIn: number;
}): Outcome<{ baseElevationIn: number; roomIn: number }> => {
  const { cutElevationIn, standOffIn, socketDepthIn, obstructionElevationIn } = set;
  const refused = firstRefusal(
    mustBe('cutElevationIn', cutElevationIn, HEIGHT_IN),
    mustBe('standOffIn', standOffIn, LENGTH_IN),
    mustBe('socketDepthIn', socketDepthIn, LENGTH_IN),
    mustBe('obstructionElevationIn', obstructionElevationIn, HEIGHT_IN),
  );
  if (refused) return refused;
  const baseElevationIn = cutElevationIn + standOffIn - socketDepthIn;
  return { ok: true, baseElevationIn, roomIn: baseElevationIn - obstructionElevationIn };
};
