import type { PointContext } from '../../../shared/hold-points/context';
import type { Range } from '../../../shared/job/plan';
import { toDecimal } from '../../../shared/units/decimal';

/** What is answered at a point, by field: as typed, in the field's own unit. `at` is the time of the answer, ISO. */
export type Answers = (context: PointContext, at: string) => Record<string, string>;

/** The middle of a range, where nobody has anything to say against it. */
export const middle = ({ min, max }: Range): string => toDecimal((Number(min) + Number(max)) / 2, 3);

/** An instant some minutes after another one. */
export const minutesAfter = (instant: string, minutes: number): string =>
  new Date(Date.parse(instant) + minutes * 60_000).toISOString();

/** The first instrument of a kind that is still in calibration and fits; its id, or nothing to choose. */
export const instrumentOf = (
  { state }: PointContext,
  at: string,
  fits: (one: PointContext['state']['plan']['instruments'][number]) => boolean,
): string => state.plan.instruments.find((one) => fits(one) && one.calibratedUntil >= at.slice(0, 10))?.id ?? '';

/** When an act of this point last began; the given time while it has not. */
export const begunAt = ({ point }: PointContext, act: string, at: string): string =>
  point.acts.filter((run) => run.act === act).at(-1)?.begun.at.corrected ?? at;
