import { leftToCut } from '../calculations/left-to-cut';
import { weldRoom } from '../calculations/weld-room';
import type { PointContext } from './context';
import { answer } from './computing';
import { takeoffOf } from './takeoff-of';

/** How much casing stands above the mark in inches, by the height takeoff; negative when the stub ends below it. */
export const leftToCutIn = (takeoffPoint: PointContext): number | undefined => {
  const [stubTop, mark] = [takeoffPoint.number('stub-top'), takeoffOf(takeoffPoint)?.markIn];
  if (stubTop === undefined || mark === undefined) return undefined;
  return answer(leftToCut({ stubTopFromStringIn: stubTop, markFromStringIn: 0 - mark }))?.leftIn;
};

/** Room between the head's base and the conductor's top in inches, once the head sits on a cut at the mark. */
export const roomBelowBaseIn = (takeoffPoint: PointContext): number | undefined => {
  const { plan } = takeoffPoint.state;
  const found = takeoffOf(takeoffPoint);
  const conductorTop = takeoffPoint.number('conductor-top');
  if (!found || found.stringHeightIn === undefined || conductorTop === undefined) return undefined;
  const room = weldRoom({
    cutElevationIn: found.cutElevationIn,
    standOffIn: Number(plan.terms.standOffIn),
    socketDepthIn: Number(plan.head.socketDepthIn),
    obstructionElevationIn: found.stringHeightIn + conductorTop,
  });
  return answer(room)?.roomIn;
};
