import type { PointContext } from './context';

/**
 * Whether an act of this point was carried through before the point was reopened. What is cut, bevelled or set stays
 * so: nobody has to light a torch again only because a reading is taken again.
 */
export const doneBefore = (context: PointContext, act: string): boolean =>
  context.point.superseded.some((evidence) => evidence.acts.some((run) => run.act === act && run.ended !== null));
