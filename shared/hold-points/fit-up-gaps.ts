import { fitUpGap, GAP_LEFT_ALONE_IN } from '../calculations/fit-up-gap';
import { answer } from './computing';
import type { PointContext } from './context';
import { quarters } from './fields';
import { commonPractice, judgeRange } from './judging';
import { judgeUsable } from './unusable';
import type { Verdict } from './verdict';

const gapFields = quarters.map((quarter) => `gap.${quarter}`);

/** What the fit-up gap adds to the fillet's leg in inches, by the newest valve orientation of the job. */
export const gapToAddIn = (context: PointContext): number | undefined => {
  const set = context.point.place.kind === 'valve-orientation' ? context : context.other('valve-orientation');
  const gaps = gapFields.map((field) => set?.number(field));
  if (gaps.some((gap) => gap === undefined)) return undefined;
  return answer(fitUpGap(gaps as number[]))?.addToLegIn;
};

/** Every gap over 1/16 in is told to whoever welds it out. */
export const judgeGaps = (context: PointContext): Verdict[] => [
  ...gapFields.flatMap((field) =>
    judgeRange(context, {
      limit: field,
      kind: 'advice',
      about: [field],
      measured: context.number(field),
      max: GAP_LEFT_ALONE_IN,
      unit: 'in',
      source: commonPractice,
    }),
  ),
  ...judgeUsable(context, 'gaps-usable', gapFields, gapToAddIn(context) !== undefined),
];
