import { clockIsDoubtful } from '../job/actor';
import type { PointContext } from './context';
import type { GroupDefinition, PointDefinition } from './definition';
import { check, choice, quantity, words } from './fields';
import { bySetting, commonPractice, judgeCheck, judgeFact, judgeRange } from './judging';
import { namedDirection } from './named-direction';
import type { Verdict } from './verdict';
import { act, read, shot } from './order';

const hasSeal = (context: PointContext): boolean => context.state.plan.head.seals > 0;

/** A seal that nobody could see or feel has no state that anybody could vouch for. */
const stateKnown = (context: PointContext): boolean => context.value('seal.sight') !== 'not-seen';

const greased = ['greased.casing', 'greased.head'] as const;

const sealGroups = (context: PointContext): GroupDefinition[] => [
  { key: 'seal-before', fields: [words('seal.part'), words('seal.condition'), check('seal.sound')] },
  {
    key: 'grease',
    fields: [
      words('grease.product'),
      quantity('grease.clear', 'in', { likely: { min: 0.25, max: Number(context.state.plan.head.socketDepthIn) } }),
      ...greased.map((key) => check(key)),
    ],
  },
  {
    key: 'seal-after',
    fields: [
      choice('seal.sight', ['seen', 'felt', 'not-seen']),
      choice('seal.state-after', ['sound', 'rolled-or-cut'], { required: stateKnown(context) }),
    ],
  },
];

/** A mark that was made before the direction was named again shows where the valve was wanted once. */
const markedAsNamed = (context: PointContext): boolean => {
  const mark = context.read('direction-marked');
  const named = context.state.direction?.at;
  if (mark?.value !== 'yes') return false;
  const tells = named !== undefined && !clockIsDoubtful(named) && !clockIsDoubtful(mark.at);
  return !tells || Date.parse(mark.at.corrected) >= Date.parse(named.corrected);
};

/** Named and marked before the head is lifted: turning it over the seal rolls the seal. */
const judgeDirection = (context: PointContext): Verdict[] => [
  ...judgeFact(context, {
    limit: 'direction-named',
    kind: 'stop',
    about: ['direction-marked'],
    source: commonPractice,
    params: { direction: namedDirection(context) },
    holds: context.state.direction !== null,
  }),
  ...judgeFact(context, {
    limit: 'direction-marked',
    kind: 'stop',
    about: ['direction-marked'],
    source: commonPractice,
    holds: context.value('direction-marked') === undefined ? undefined : markedAsNamed(context),
  }),
];

const judgeSeal = (context: PointContext): Verdict[] => {
  const [sight, after] = [context.value('seal.sight'), context.value('seal.state-after')];
  return [
    ...judgeCheck(context, 'seal.sound', 'stop'),
    ...judgeFact(context, {
      limit: 'seal.state-after',
      kind: 'stop',
      about: ['seal.state-after'],
      source: commonPractice,
      holds: after === undefined ? undefined : after === 'sound',
    }),
    ...judgeFact(context, {
      limit: 'seal.sight',
      kind: 'hold',
      about: ['seal.sight'],
      source: commonPractice,
      holds: sight === undefined ? undefined : sight !== 'not-seen',
    }),
  ];
};

const judgeGrease = (context: PointContext): Verdict[] => [
  ...greased.flatMap((field) => judgeCheck(context, field, 'hold')),
  ...judgeRange(context, {
    limit: 'grease.clear',
    kind: 'hold',
    about: ['grease.clear'],
    measured: context.number('grease.clear'),
    min: context.setting('greaseClearIn'),
    unit: 'in',
    source: bySetting(context, 'greaseClearIn'),
  }),
];

/** Before the lift every check that can't be made up for afterwards has to be answered with yes. */
const judgeBeforeLift = (context: PointContext): Verdict[] => {
  const answered = (field: string, says: string, holds: boolean): Verdict[] =>
    judgeFact(context, { limit: field, kind: 'stop', about: [field], source: commonPractice, says, holds });
  return [
    ...judgeDirection(context).filter((verdict) => verdict.limit === 'direction-named'),
    ...answered('direction-marked', 'direction-marked', markedAsNamed(context)),
    ...(hasSeal(context)
      ? answered('seal.sound', 'seal-sound-before-lift', context.value('seal.sound') === 'yes')
      : []),
  ];
};

/** Point 5: the seal is looked at before and after the head goes over it. Without a seal only the direction is left. */
export const sealGreasedAndChecked: PointDefinition = {
  kind: 'seal-greased-and-checked',
  version: 1,
  order: [read(/^(direction|seal\.(part|condition|sound)|grease)/), shot('seal-before'), act('set-head')],
  groups: (context) => [
    { key: 'direction', fields: [check('direction-marked')] },
    ...(hasSeal(context) ? sealGroups(context) : []),
  ],
  shots: (context) =>
    hasSeal(context)
      ? [
          { key: 'seal-before', required: true },
          { key: 'seal-after', required: stateKnown(context) },
        ]
      : [],
  // Asked for again after a reopening: the head came off, or somebody vouches that it stands as it was set.
  acts: () => [{ key: 'set-head', flame: false, required: true }],
  statements: [],
  cautions: (context) => ['suspended-head', ...(hasSeal(context) ? ['grease'] : [])],
  compute: () => [],
  judge: (context) => [
    ...judgeDirection(context),
    ...(hasSeal(context) ? [...judgeSeal(context), ...judgeGrease(context)] : []),
  ],
  beforeAct: (context) => judgeBeforeLift(context),
};
