import type { PointContext } from './context';
import { commonPractice, judgeRange } from './judging';
import type { Verdict } from './verdict';

/** How far below the lowest weld the fluid in the casing has to stand, so that it neither chills nor boils. Common practice. */
const fluidBelowWeldIn = 24;

/** Holds the fluid's depth below the weld against its limit; `says` is the sentence where it is read again. */
export const judgeFluidBelowWeld = (context: PointContext, says?: string): Verdict[] =>
  judgeRange(context, {
    limit: 'fluid.below-weld',
    kind: 'hold',
    about: ['fluid.below-weld'],
    measured: context.number('fluid.below-weld'),
    min: fluidBelowWeldIn,
    unit: 'in',
    source: commonPractice,
    says,
  });
