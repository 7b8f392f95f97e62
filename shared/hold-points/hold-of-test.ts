import { pressureHold, type PressureHold } from '../calculations/pressure-hold';
import { answer } from './computing';
import type { PointContext } from './context';
import { commonPractice, byJob, judgeFact, judgeRange } from './judging';
import type { Verdict } from './verdict';

/** How late a first and how early a last reading still stands for that end of the hold. Common practice. */
const endToleranceS = 60;
/** Fewer readings than that are no hold. */
export const fewestHoldReadings = 3;

const rowsOf = (context: PointContext): number[] =>
  context
    .rows('hold-readings')
    .filter(
      (row) =>
        context.value(`hold-readings.${row}.at`) !== undefined &&
        context.number(`hold-readings.${row}.pressure`) !== undefined,
    );

const seconds = (instant: string | undefined): number => Date.parse(instant ?? '') / 1000;

const isComplete = (context: PointContext): boolean =>
  context.value('hold.start') !== undefined &&
  context.value('hold.end') !== undefined &&
  rowsOf(context).length >= fewestHoldReadings;

/** The hold as its readings tell it; undefined while they are not all there or do not fit the hold. */
export const holdOf = (context: PointContext): PressureHold | undefined => {
  if (!isComplete(context)) return undefined;
  const { test } = context.state.plan.terms;
  return answer(
    pressureHold({
      samples: rowsOf(context).map((row) => ({
        timeS: seconds(context.value(`hold-readings.${row}.at`)),
        pressurePsig: context.number(`hold-readings.${row}.pressure`) ?? NaN,
        temperatureF: context.number(`hold-readings.${row}.temperature`),
      })),
      medium: test.medium === 'nitrogen' ? 'nitrogen' : 'oil',
      targetPsig: test.pressurePsi,
      holdS: test.holdMin * 60,
      allowedDropPsi: test.allowedDropPsi,
      holdStartS: seconds(context.value('hold.start')),
      holdEndS: seconds(context.value('hold.end')),
      toleranceS: endToleranceS,
    }),
  );
};

const fieldsOf = (context: PointContext, ...names: string[]): string[] =>
  rowsOf(context).flatMap((row) => names.map((name) => `hold-readings.${row}.${name}`));

const judgeTime = (context: PointContext): Verdict[] => {
  const [start, end] = [context.value('hold.start'), context.value('hold.end')];
  const hold = holdOf(context);
  const covered = !hold?.findings.some((finding) => finding === 'start-not-covered' || finding === 'end-not-covered');
  return [
    ...judgeRange(context, {
      limit: 'hold-time',
      kind: 'hold',
      about: ['hold.start', 'hold.end'],
      measured: start === undefined || end === undefined ? undefined : (seconds(end) - seconds(start)) / 60,
      min: context.state.plan.terms.test.holdMin,
      unit: 'min',
      source: byJob,
    }),
    ...judgeFact(context, {
      limit: 'hold-usable',
      kind: 'stop',
      about: ['hold.start', 'hold.end', ...fieldsOf(context, 'at', 'pressure')],
      source: commonPractice,
      holds: isComplete(context) ? hold !== undefined : undefined,
    }).filter((verdict) => verdict.outcome === 'outside'),
    ...judgeFact(context, {
      limit: 'hold-covered',
      kind: 'hold',
      about: ['hold.start', 'hold.end', ...fieldsOf(context, 'at', 'pressure')],
      source: commonPractice,
      holds: hold && covered,
    }),
  ];
};

/** Never below target during the hold, no more lost than allowed, the whole time covered by readings. */
export const judgeHold = (context: PointContext): Verdict[] => {
  const hold = holdOf(context);
  const { test } = context.state.plan.terms;
  const corrected = hold?.judgedBy === 'temperature-corrected';
  return [
    ...judgeRange(context, {
      limit: 'hold-lowest',
      kind: 'hold',
      about: fieldsOf(context, 'pressure'),
      measured: hold?.lowestPsig,
      min: test.pressurePsi,
      unit: 'psi',
      source: byJob,
    }),
    ...judgeRange(context, {
      limit: 'hold-drop',
      kind: 'hold',
      about: fieldsOf(context, 'pressure', ...(corrected ? ['temperature'] : [])),
      measured: hold?.correctedDropPsi ?? hold?.dropPsi,
      max: test.allowedDropPsi,
      unit: 'psi',
      source: byJob,
      says: corrected ? 'hold-drop-corrected' : 'hold-drop',
    }),
    ...judgeTime(context),
  ];
};
