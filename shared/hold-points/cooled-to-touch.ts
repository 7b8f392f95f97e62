import { newtonCoolingInfo } from '../calculations/newton-cooling';
import { answer, computed } from './computing';
import type { PointContext } from './context';
import { coolingFitOf, coolingPointsOf } from './cooling';
import type { GroupDefinition, PointDefinition } from './definition';
import { choice, quantity, time } from './fields';
import { judgeLook, lookGroups } from './imperfections';
import { namedInstrument } from './instruments';
import { byProcedure, bySetting, commonPractice, judgeFact, judgeRange } from './judging';
import { computeOrientation, judgeOrientation, orientationGroups } from './orientation';
import type { Verdict } from './verdict';

/** Level, two-hole and datum height once more, cold: what the blowout preventer will stand on. */
const asBuilt = 'as-built';

const groups = (context: PointContext): GroupDefinition[] => [
  {
    key: 'cooling',
    rows: { min: 2, max: 60 },
    fields: [time('cooling.#.at'), quantity('cooling.#.temperature', 'degF', { likely: { min: 0, max: 700 } })],
  },
  {
    key: 'cover',
    fields: [
      ...namedInstrument(context, 'cooled-instrument', 'pyrometer', false),
      quantity('ambient', 'degF', { likely: { min: -40, max: 120 } }),
      choice('covered', ['covered', 'wrapped', 'open']),
      time('cover-off', { required: false }),
      choice('quenched', ['no', 'yes']),
      time('fire-watch-ended'),
    ],
  },
  ...lookGroups(context, 'cold'),
  ...(context.state.plan.procedure.surfaceExam === 'none'
    ? []
    : [{ key: 'surface-exam', fields: [choice('surface-exam', ['pass', 'fail'])] }]),
  ...orientationGroups(context, asBuilt),
];

const judgeLast = (context: PointContext): Verdict[] => {
  const last = coolingPointsOf(context).at(-1);
  if (!last) return [];
  return judgeRange(context, {
    limit: 'cooled-last',
    kind: 'stop',
    about: [`cooling.${last.row}.temperature`, `cooling.${last.row}.at`],
    measured: last.temperatureF,
    max: context.setting('touchF'),
    unit: 'degF',
    source: bySetting(context, 'touchF'),
  });
};

const judgeAnswer = (context: PointContext, field: string, right: string): boolean | undefined => {
  const value = context.value(field);
  return value === undefined ? undefined : value === right;
};

/** Point 10: the weld came down by itself, is looked at cold, and the head stands where it was set. */
export const cooledToTouch: PointDefinition = {
  kind: 'cooled-to-touch',
  version: 1,
  groups,
  shots: () => [{ key: 'finished-weld', required: true }],
  acts: () => [],
  statements: [],
  cautions: () => ['still-hot', 'late-cracks', 'examiner'],
  compute: (context) => {
    const fit = answer(coolingFitOf(context));
    return [
      ...computed('cooling-constant', fit?.kPerMin, 'count', newtonCoolingInfo),
      ...computed('touch-after', fit?.touchAfterMin, 'min', newtonCoolingInfo),
      ...computeOrientation(context, asBuilt),
    ];
  },
  judge: (context) => [
    ...judgeLast(context),
    ...judgeLook(context, 'cold'),
    ...(context.state.plan.procedure.surfaceExam === 'none'
      ? []
      : judgeFact(context, {
          limit: 'surface-exam',
          kind: 'stop',
          about: ['surface-exam'],
          source: byProcedure(context),
          holds: judgeAnswer(context, 'surface-exam', 'pass'),
        })),
    ...judgeFact(context, {
      limit: 'quenched',
      kind: 'hold',
      about: ['quenched'],
      source: commonPractice,
      holds: judgeAnswer(context, 'quenched', 'no'),
    }),
    ...judgeOrientation(context, asBuilt),
  ],
};
