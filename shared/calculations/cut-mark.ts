import { firstRefusal, mustBe, type Outcome } from './outcome';
import { HEIGHT_IN, LENGTH_IN } from './ranges';

export const cutMarkInfo = {
  id: 'cut-mark',
  version: 1,
  formula: 'cut = target − takeoff − stand-off; mark = cut − string height',
  source: 'common practice',
  range: 'heights ±10,000 in, stand-off 0 to 100,000 in',
} as const;

/**
 * Height of the final cut above ground and the mark measured from the string, in inches. A negative mark lies below
 * the string. The stand-off is the room left between casing end and shoulder.
 */
export const cutMark = (plan: {
  targetHeightIn: number;
  takeoffIn: number;
  standOffIn: number;
  stringHeightIn: number;
}): Outcome<{ cutElevationIn: number; markFromStringIn: number; side: 'above' | 'below' | 'on' }> => {
  const { targetHeightIn, takeoffIn, standOffIn, stringHeightIn } = plan;
  const refused = firstRefusal(
    mustBe('targetHeightIn', targetHeightIn, HEIGHT_IN),
    mustBe('takeoffIn', takeoffIn, HEIGHT_IN),
    mustBe('standOffIn', standOffIn, LENGTH_IN),
    mustBe('stringHeightIn', stringHeightIn, HEIGHT_IN),
  );
  if (refused) return refused;
  const cutElevationIn = targetHeightIn - takeoffIn - standOffIn;
  const markFromStringIn = cutElevationIn - stringHeightIn;
  const side = markFromStringIn > 0 ? 'above' : markFromStringIn < 0 ? 'below' : 'on';
  return { ok: true, cutElevationIn, markFromStringIn, side };
};
