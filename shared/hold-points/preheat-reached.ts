import { carbonEquivalent, carbonEquivalentInfo } from '../calculations/carbon-equivalent';
import { preheatAdvice, preheatAdviceInfo } from '../calculations/preheat-advice';
import { preheatDistance } from '../calculations/preheat-distance';
import type { JobPlan } from '../job/plan';
import { answer, computed } from './computing';
import type { PointContext } from './context';
import type { GroupDefinition, PointDefinition } from './definition';
import { byQuarter, check, choice, instrument, quantity, quarters } from './fields';
import { judgeFluidBelowWeld } from './fluid-in-casing';
import { byDrawing, byProcedure, commonPractice, judgeCheck, judgeFact, judgeRange, standard } from './judging';
import { doneBefore } from './done-before';
import { judgePlugsOut } from './plug-in-port';
import type { Computed, Verdict } from './verdict';
import { act, read } from './order';

const isRepair = (context: PointContext): boolean => context.point.place.round > 0;
const metalFields = ['head', 'casing'].flatMap((part) => quarters.map((quarter) => `preheat.${part}.${quarter}`));

const lowestAndHighest = (context: PointContext): { lowest: number; highest: number } | undefined => {
  const read = metalFields.map((field) => context.number(field));
  const known = read.filter((one) => one !== undefined);
  return known.length < read.length ? undefined : { lowest: Math.min(...known), highest: Math.max(...known) };
};

const groups = (context: PointContext): GroupDefinition[] => {
  const { head, procedure } = context.state.plan;
  const likely = { min: Number(procedure.preheatF.min) - 100, max: Number(procedure.preheatF.max) + 100 };
  return [
    ...(isRepair(context) ? [{ key: 'excavated', fields: [choice('excavated-cracks', ['none', 'found'])] }] : []),
    { key: 'preheat-head', picture: 'clock', fields: byQuarter('preheat.head', 'degF', { likely }) },
    { key: 'preheat-casing', picture: 'clock', fields: byQuarter('preheat.casing', 'degF', { likely }) },
    {
      key: 'preheat-how',
      fields: [
        ...(head.seals > 0 ? [quantity('preheat.seal-level', 'degF', { likely: { min: 32, max: likely.max } })] : []),
        quantity('preheat.distance', 'in', { likely: { min: 0.5, max: 12 } }),
        choice('preheat.by', ['stick', 'pyrometer']),
        instrument('preheat.instrument', ['pyrometer'], { required: context.value('preheat.by') === 'pyrometer' }),
      ],
    },
    {
      key: 'joint',
      fields: [
        check('joint-dry'),
        check('joint-sheltered'),
        quantity('fluid.below-weld', 'in', { likely: { min: 0, max: 600 } }),
      ],
    },
  ];
};

/** Nothing is heated or welded over a crack: it is ground out further and looked at again. */
const judgeExcavation = (context: PointContext, unanswered: boolean | undefined): Verdict[] => {
  const cracks = context.value('excavated-cracks');
  return judgeFact(context, {
    limit: 'excavated-cracks',
    kind: 'stop',
    about: ['excavated-cracks'],
    source: commonPractice,
    holds: cracks === undefined ? unanswered : cracks === 'none',
  });
};

const judgeMetal = (context: PointContext): Verdict[] => {
  const { preheatF } = context.state.plan.procedure;
  return metalFields.flatMap((field) =>
    judgeRange(context, {
      limit: field,
      kind: 'hold',
      about: [field],
      measured: context.number(field),
      min: Number(preheatF.min),
      max: Number(preheatF.max),
      unit: 'degF',
      source: byProcedure(context),
      says: 'preheat-metal',
    }),
  );
};

const judgeSealLevel = (context: PointContext): Verdict[] => {
  const { seals, sealRatedF } = context.state.plan.head;
  if (seals === 0 || sealRatedF === null) return [];
  return judgeRange(context, {
    limit: 'preheat.seal-level',
    kind: 'hold',
    about: ['preheat.seal-level'],
    measured: context.number('preheat.seal-level'),
    max: Number(sealRatedF),
    unit: 'degF',
    source: byDrawing(context),
  });
};

/** The thicker part of the joint: the casing's wall, or the head's where it takes the casing in. */
const thickerPartIn = ({ casing, head }: JobPlan): number =>
  Math.max(Number(casing.wallIn), (Number(head.baseOdIn) - Number(head.socketBoreIn)) / 2);

const judgeDistance = (context: PointContext): Verdict[] => {
  const rule = context.state.plan.procedure.preheatDistance;
  const least = answer(preheatDistance({ thicknessIn: thickerPartIn(context.state.plan), rule }));
  return judgeRange(context, {
    limit: 'preheat.distance',
    kind: 'hold',
    about: ['preheat.distance'],
    measured: least && context.number('preheat.distance'),
    min: least?.distanceIn,
    unit: 'in',
    source: standard(rule === 'aws-d1.1' ? 'AWS D1.1' : 'ISO 13916'),
  });
};

/** The steel's carbon equivalents; undefined while nobody has its mill certificate. */
const equivalentOf = (context: PointContext) => {
  const steel = context.state.plan.procedure.chemistry?.composition;
  if (!steel) return undefined;
  return answer(
    carbonEquivalent({
      carbonPct: Number(steel.carbon),
      manganesePct: Number(steel.manganese),
      siliconPct: Number(steel.silicon),
      chromiumPct: Number(steel.chromium),
      molybdenumPct: Number(steel.molybdenum),
      vanadiumPct: Number(steel.vanadium),
      nickelPct: Number(steel.nickel),
      copperPct: Number(steel.copper),
      boronPct: Number(steel.boron),
    }),
  );
};

const advisedF = (context: PointContext): number | undefined => {
  const { chemistry } = context.state.plan.procedure;
  const cetPct = equivalentOf(context)?.cetPct;
  if (!chemistry || cetPct === undefined) return undefined;
  return answer(
    preheatAdvice({
      cetPct,
      thicknessMm: Number(chemistry.thicknessMm),
      hydrogenMlPer100g: Number(chemistry.hydrogenMl),
      heatInputKjPerMm: Number(chemistry.heatInputKjPerMm),
    }),
  )?.preheatF;
};

const judgeAdvice = (context: PointContext): Verdict[] => {
  const advised = advisedF(context);
  return judgeRange(context, {
    limit: 'preheat-advised',
    kind: 'advice',
    about: metalFields,
    measured: advised === undefined ? undefined : lowestAndHighest(context)?.lowest,
    min: advised,
    unit: 'degF',
    source: standard('EN 1011-2 method B'),
  });
};

/** No formula: the coldest and the hottest of the eight readings. */
const extremesInfo = {
  id: 'lowest-and-highest',
  version: 1,
  formula: 'lowest and highest of the readings',
  source: 'definition',
  range: 'all eight readings there',
} as const;

const compute = (context: PointContext): Computed[] => {
  const metal = lowestAndHighest(context);
  return [
    ...computed('lowest', metal?.lowest, 'degF', extremesInfo),
    ...computed('highest', metal?.highest, 'degF', extremesInfo),
    ...computed('carbon-equivalent', equivalentOf(context)?.iiwPct, 'pct', carbonEquivalentInfo),
    ...computed('advice-preheat', advisedF(context), 'degF', preheatAdviceInfo),
  ];
};

/** Point 8: the joint is hot all the way round, dry and sheltered, and nothing wet can reach it. */
export const preheatReached: PointDefinition = {
  kind: 'preheat-reached',
  version: 1,
  order: [act('excavation'), read(/^excavated/), act('preheat')],
  groups,
  shots: () => [{ key: 'instrument-on-metal', required: true }],
  acts: (context) => [
    ...(isRepair(context) ? [{ key: 'excavation', flame: true, required: !doneBefore(context, 'excavation') }] : []),
    { key: 'preheat', flame: true, required: true },
  ],
  statements: [],
  cautions: (context) => [
    'hot-metal',
    ...(context.state.plan.head.seals > 0 ? ['seal-heat'] : []),
    'procedure-governs',
  ],
  compute,
  judge: (context) => [
    ...(isRepair(context) ? judgeExcavation(context, undefined) : []),
    ...judgeMetal(context),
    ...judgeSealLevel(context),
    ...judgeDistance(context),
    ...judgeCheck(context, 'joint-dry', 'stop'),
    ...judgeCheck(context, 'joint-sheltered', 'stop'),
    ...judgeFluidBelowWeld(context, 'fluid-still-below-weld'),
    ...judgeAdvice(context),
  ],
  beforeAct: (context, act) => [
    ...judgePlugsOut(context),
    ...(isRepair(context) && act === 'preheat' ? judgeExcavation(context, false) : []),
  ],
};
