import { cutPlane, type CutPlane } from '../calculations/cut-plane';
import { leftToCut } from '../calculations/left-to-cut';
import { answer } from './computing';
import type { PointContext } from './context';
import { quarters } from './fields';
import { landsAt, takeoffOf } from './takeoff-of';

export const cutFields = quarters.map((quarter) => `cut.${quarter}`);

export interface FinishedCut {
  /** the cut as a plane; its heights are from the string, positive up */
  plane: CutPlane;
  /** from the string, positive down, as it is read off the tape */
  meanIn: number;
  /** mean above the cut elevation; negative is low */
  missIn: number;
  landsByMeanIn: number | undefined;
  /** where the head rests: on the high point */
  landsByHighIn: number | undefined;
  /** casing cut off since the stub was measured */
  allowanceUsedIn: number | undefined;
}

/** The finished cut as it was measured from the string at four places; undefined while one is missing. */
export const finishedCut = (context: PointContext): FinishedCut | undefined => {
  const [at12, at3, at6, at9] = cutFields.map((field) => context.number(field));
  const found = takeoffOf(context);
  if (at12 === undefined || at3 === undefined || at6 === undefined || at9 === undefined) return undefined;
  if (!found || found.stringHeightIn === undefined) return undefined;
  const plane = answer(
    cutPlane({
      at12In: 0 - at12,
      at3In: 0 - at3,
      at6In: 0 - at6,
      at9In: 0 - at9,
      odIn: Number(context.state.plan.casing.odIn),
    }),
  );
  if (!plane) return undefined;
  const elevation = found.stringHeightIn + plane.meanIn;
  const first = context.other('height-takeoff');
  const [stubTop, firstString] = [first?.number('stub-top'), first && takeoffOf(first)?.stringHeightIn];
  const used =
    stubTop === undefined || firstString === undefined
      ? undefined
      : answer(leftToCut({ stubTopFromStringIn: firstString + stubTop, markFromStringIn: elevation }));
  return {
    plane,
    meanIn: 0 - plane.meanIn,
    missIn: elevation - found.cutElevationIn,
    landsByMeanIn: landsAt(context, elevation),
    landsByHighIn: landsAt(context, found.stringHeightIn + plane.highestIn),
    allowanceUsedIn: used?.leftIn,
  };
};
