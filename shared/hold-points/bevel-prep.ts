import { odTolerance, odToleranceInfo } from '../calculations/od-tolerance';
import { outOfRoundness, outOfRoundnessInfo } from '../calculations/out-of-roundness';
import { toDecimal } from '../units/decimal';
import { answer, computed } from './computing';
import type { PointContext } from './context';
import type { FieldDefinition, PointDefinition } from './definition';
import { doneBefore } from './done-before';
import { check, quantity } from './fields';
import { byProcedure, commonPractice, judgeCheck, judgeRange, standard } from './judging';
import type { Verdict } from './verdict';
import { act } from './order';

/** How far below the head's base the casing is cleaned, and how far down its inside. Common practice. */
const cleanBelowBaseIn = 3;
const cleanInsideIn = 1;

/** Where the outside diameter is taken, on two axes at right angles; without a seal there is only the weld. */
const odPlaces = (context: PointContext): ('seal' | 'weld')[] =>
  context.state.plan.head.seals === 0 ? ['weld'] : ['seal', 'weld'];

const odFields = (place: string): [string, string] => [`od.${place}.x`, `od.${place}.y`];

const checks = (context: PointContext): string[] =>
  context.state.plan.head.seals === 0
    ? ['inside-deburred', 'bright-metal']
    : ['no-sharp-edge', 'inside-deburred', 'bright-metal', 'seal-area-smooth'];

const cleanOutsideIn = (context: PointContext): number => {
  const { head, terms } = context.state.plan;
  return Number(head.socketDepthIn) - Number(terms.standOffIn) + cleanBelowBaseIn;
};

const odQuantities = (context: PointContext): FieldDefinition[] => {
  const nominal = Number(context.state.plan.casing.odIn);
  const likely = { min: nominal * 0.98, max: nominal * 1.02 };
  return odPlaces(context).flatMap((place) => odFields(place).map((field) => quantity(field, 'in', { likely })));
};

/** A caliper reads thousandths: the ends of the tolerance are shown so, and not as marks of a tape between which they lie. */
const inThousandths = (verdict: Verdict): Verdict => {
  if (verdict.allowed === null) return verdict;
  const { unit, ...ends } = verdict.allowed;
  const [min, max] = [toDecimal(Number(ends.min), 3), toDecimal(Number(ends.max), 3)];
  const params = { ...verdict.text.params, min: { quantity: min, unit }, max: { quantity: max, unit } };
  return { ...verdict, allowed: { min, max, unit }, text: { ...verdict.text, params } };
};

/** The pipe's own tolerance; none is published for sizes under 4-1/2 in. */
const judgeOd = (context: PointContext): Verdict[] => {
  const nominalOdIn = Number(context.state.plan.casing.odIn);
  const tolerance = answer(odTolerance({ nominalOdIn, measuredOdIn: nominalOdIn }));
  if (!tolerance) return [];
  return odPlaces(context)
    .flatMap(odFields)
    .flatMap((field) =>
      judgeRange(context, {
        limit: field,
        kind: 'hold',
        about: [field],
        measured: context.number(field),
        min: tolerance.smallestIn,
        max: tolerance.largestIn,
        unit: 'in',
        source: standard('API 5CT'),
        says: 'casing-od',
      }).map(inThousandths),
    );
};

const judgeGroove = (context: PointContext): Verdict[] => {
  const { bevelDeg, landIn } = context.state.plan.procedure;
  const frame = { kind: 'hold' as const, source: byProcedure(context) };
  return [
    ...judgeRange(context, {
      ...frame,
      limit: 'bevel.angle',
      about: ['bevel.angle'],
      measured: context.number('bevel.angle'),
      min: Number(bevelDeg.min),
      max: Number(bevelDeg.max),
      unit: 'deg',
    }),
    ...judgeRange(context, {
      ...frame,
      limit: 'bevel.land',
      about: ['bevel.land'],
      measured: context.number('bevel.land'),
      min: Number(landIn.min),
      max: Number(landIn.max),
      unit: 'in',
    }),
  ];
};

const judgeClean = (context: PointContext): Verdict[] =>
  [
    { field: 'clean.outside', min: cleanOutsideIn(context) },
    { field: 'clean.inside', min: cleanInsideIn },
  ].flatMap(({ field, min }) =>
    judgeRange(context, {
      limit: field,
      kind: 'hold',
      about: [field],
      measured: context.number(field),
      min,
      unit: 'in',
      source: commonPractice,
    }),
  );

const roundness = (context: PointContext, place: 'seal' | 'weld') => {
  const [firstOdIn, secondOdIn] = odFields(place).map((field) => context.number(field));
  if (firstOdIn === undefined || secondOdIn === undefined) return undefined;
  return answer(outOfRoundness({ firstOdIn, secondOdIn, nominalOdIn: Number(context.state.plan.casing.odIn) }));
};

/** Point 4: the stub is bevelled, cleaned and gauged before the head comes near it. */
export const bevelPrep: PointDefinition = {
  kind: 'bevel-prep',
  version: 1,
  order: [act('bevel')],
  groups: (context) => {
    const { bevelDeg } = context.state.plan.procedure;
    const outside = cleanOutsideIn(context);
    return [
      {
        key: 'bevel',
        fields: [
          quantity('bevel.angle', 'deg', {
            likely: { min: Number(bevelDeg.min) - 15, max: Number(bevelDeg.max) + 15 },
          }),
          quantity('bevel.land', 'in', { likely: { min: 0, max: 0.25 } }),
        ],
      },
      { key: 'od', fields: odQuantities(context) },
      {
        key: 'clean',
        fields: [
          quantity('clean.outside', 'in', { likely: { min: outside / 2, max: outside * 3 } }),
          quantity('clean.inside', 'in', { likely: { min: 0, max: 24 } }),
        ],
      },
      { key: 'checks', fields: checks(context).map((key) => check(key)) },
    ];
  },
  shots: (context) => [
    { key: 'bevel', required: true },
    ...(context.state.plan.head.seals === 0 ? [] : [{ key: 'seal-area', required: true }]),
  ],
  acts: (context) => [{ key: 'bevel', flame: true, required: !doneBefore(context, 'bevel') }],
  statements: [],
  cautions: () => ['grinding'],
  compute: (context) => {
    const nominalOdIn = Number(context.state.plan.casing.odIn);
    return odPlaces(context).flatMap((place) => {
      const round = roundness(context, place);
      const against = round && answer(odTolerance({ nominalOdIn, measuredOdIn: round.meanOdIn }));
      return [
        ...computed(`od-mean.${place}`, round?.meanOdIn, 'in', outOfRoundnessInfo),
        ...computed(`od-against-nominal.${place}`, against?.deviationPct, 'pct', odToleranceInfo),
        ...computed(`out-of-round.${place}`, round?.differenceIn, 'in', outOfRoundnessInfo),
      ];
    });
  },
  judge: (context) => [
    ...judgeGroove(context),
    ...judgeOd(context),
    ...judgeClean(context),
    ...checks(context).flatMap((field) => judgeCheck(context, field, 'stop')),
  ],
};
