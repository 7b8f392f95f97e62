import type { ProcedurePass } from '../job/plan';
import type { PointContext } from './context';
import type { GroupDefinition } from './definition';
import { count, quantity, time, words } from './fields';
import { byProcedure, commonPractice, judgeFact, judgeRange, standard } from './judging';
import { rodFactsOf, type RodFacts } from './rod-facts';
import { restingOn } from './resting-on';
import { judgeUsable } from './unusable';
import type { LimitKind, Verdict } from './verdict';

const around = (range: { min: string; max: string }, by: number) => ({
  likely: { min: Math.max(0, Number(range.min) - by), max: Number(range.max) + by },
});

/** A row for every batch of rods that came out of the oven together. */
export const rodGroup = ({ pass }: PointContext): GroupDefinition => ({
  key: 'rods',
  rows: { min: 1, max: 60 },
  fields: [
    words('rods.#.class'),
    words('rods.#.lot'),
    time('rods.#.out-of-oven'),
    count('rods.#.count', { likely: { min: 1, max: 60 } }),
    quantity('rods.#.amps', 'A', pass ? around(pass.currentA, 40) : {}),
    quantity('rods.#.volts', 'V', pass ? around(pass.voltageV, 8) : {}),
    quantity('rods.#.arc-time', 'min', { likely: { min: 0.25, max: 120 } }),
    quantity('rods.#.run-out', 'in', { required: false, likely: { min: 1, max: 120 } }),
  ],
});

const bare = (electrodeClass: string): string => electrodeClass.toUpperCase().replace(/[\s/]/g, '');

/** The procedure's class, with or without the optional marks behind it: hydrogen, moisture (`E8018-C3`, `-H4R`, `R`). */
const isOfClass = (used: string, asked: string): boolean =>
  bare(used) === bare(asked) ||
  (bare(used).startsWith(bare(asked)) && /^-?(H\d{1,2}R?|R)$/.test(bare(used).slice(bare(asked).length)));

const judgeClass = (context: PointContext, pass: ProcedurePass, row: number): Verdict[] => {
  const field = `rods.${row}.class`;
  const used = context.value(field);
  return judgeFact(context, {
    limit: field,
    kind: 'stop',
    about: [field],
    source: byProcedure(context),
    params: { used: used ?? '', asked: pass.electrodeClass },
    holds: used === undefined ? undefined : isOfClass(used, pass.electrodeClass),
  });
};

const judgeHeat = (context: PointContext, { heatInputKjPerIn: range }: ProcedurePass, facts: RodFacts): Verdict[] => {
  if (range === null) return [];
  const limit = `rods.${facts.row}.heat-input`;
  const about = ['amps', 'volts', 'arc-time', 'run-out'].map((name) => `rods.${facts.row}.${name}`);
  const verdicts = judgeRange(context, {
    limit,
    kind: 'hold',
    about: about.filter((field) => facts.heatRestsOn.includes(field)),
    measured: facts.heatInputKjPerIn,
    min: Number(range.min),
    max: Number(range.max),
    unit: 'kJPerIn',
    source: byProcedure(context),
  });
  return [
    ...restingOn(context, facts.heatRestsOn, verdicts),
    ...judgeUsable(context, `${limit}-usable`, facts.heatRestsOn, facts.heatInputKjPerIn !== undefined),
  ];
};

const judgeRow = (context: PointContext, pass: ProcedurePass, facts: RodFacts): Verdict[] => {
  const at = (name: string): string => `rods.${facts.row}.${name}`;
  const frame = { kind: 'hold' as LimitKind, source: byProcedure(context) };
  const outOfOven = context.value(at('out-of-oven'));
  return [
    ...judgeClass(context, pass, facts.row),
    ...judgeRange(context, {
      ...frame,
      limit: at('amps'),
      about: [at('amps')],
      measured: facts.amps,
      min: Number(pass.currentA.min),
      max: Number(pass.currentA.max),
      unit: 'A',
    }),
    ...judgeRange(context, {
      ...frame,
      limit: at('volts'),
      about: [at('volts')],
      measured: facts.volts,
      min: Number(pass.voltageV.min),
      max: Number(pass.voltageV.max),
      unit: 'V',
    }),
    ...judgeHeat(context, pass, facts),
    ...judgeFact(context, {
      ...frame,
      limit: at('out-of-oven'),
      about: [at('out-of-oven')],
      source: commonPractice,
      params: { out: outOfOven === undefined ? '' : { instant: outOfOven } },
      holds: facts.exposureMin === undefined ? undefined : facts.exposureMin >= 0,
    }),
    ...(facts.exposureLimitMin === undefined
      ? []
      : judgeRange(context, {
          ...frame,
          limit: at('exposure'),
          about: [at('out-of-oven'), at('class')],
          measured: facts.exposureMin,
          max: facts.exposureLimitMin,
          unit: 'min',
          source: standard('AWS D1.1'),
          params: { class: context.value(at('class')) ?? '' },
        })),
  ];
};

/** Every row of rods against the procedure and against its class's time out of the oven. */
export const judgeRods = (context: PointContext): Verdict[] => {
  const { pass } = context;
  return pass === null ? [] : rodFactsOf(context).flatMap((facts) => judgeRow(context, pass, facts));
};
