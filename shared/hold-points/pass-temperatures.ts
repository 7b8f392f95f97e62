import { minutesBetween } from '../job/actor';
import type { ProcedurePass } from '../job/plan';
import type { PointContext } from './context';
import type { GroupDefinition } from './definition';
import { quantity } from './fields';
import { namedInstrument } from './instruments';
import { byProcedure, bySetting, judgeFact, judgeRange } from './judging';
import type { Verdict } from './verdict';

/** Head and casing, read right before the arc is struck. */
export const passTemperatureFields = ['temps.head', 'temps.casing'] as const;

/** A round's first pass is laid on preheated metal, every later one between the procedure's interpass limits. */
const lowestAllowedF = (context: PointContext, pass: ProcedurePass): number =>
  Number(context.point.place.pass === 1 ? context.state.plan.procedure.preheatF.min : pass.interpassF.min);

export const passTemperatureGroup = (context: PointContext): GroupDefinition => {
  const pass = context.pass;
  const likely = pass && {
    likely: { min: lowestAllowedF(context, pass) - 100, max: Number(pass.interpassF.max) + 100 },
  };
  return {
    key: 'temps',
    fields: [
      ...passTemperatureFields.map((field) => quantity(field, 'degF', likely ?? {})),
      // a temperature-indicating stick is no instrument of the list
      ...namedInstrument(context, 'temps.instrument', 'pyrometer', false),
    ],
  };
};

const judgeCold = (context: PointContext, pass: ProcedurePass): Verdict[] =>
  passTemperatureFields.flatMap((field) =>
    judgeRange(context, {
      limit: `${field}.cold`,
      kind: 'stop',
      about: [field],
      measured: context.number(field),
      min: lowestAllowedF(context, pass),
      unit: 'degF',
      source: byProcedure(context),
      says: 'pass-cold',
    }),
  );

const judgeHot = (context: PointContext, pass: ProcedurePass): Verdict[] =>
  passTemperatureFields.flatMap((field) =>
    judgeRange(context, {
      limit: `${field}.hot`,
      kind: 'hold',
      about: [field],
      measured: context.number(field),
      max: Number(pass.interpassF.max),
      unit: 'degF',
      source: byProcedure(context),
      says: 'pass-hot',
    }),
  );

/** The arc was struck on that very reading: its verdict stands with the act and is not to be conceded twice. */
const standsWithAct = (context: PointContext, verdict: Verdict): boolean =>
  context.point.acts.some((run) =>
    run.verdicts.some(
      (one) => one.outcome === 'outside' && one.limit === verdict.limit && one.basis.join() === verdict.basis.join(),
    ),
  );

/** Too cold is a stop (heat it again and read again), over the interpass limit a hold. */
export const judgePassTemperatures = (context: PointContext): Verdict[] => {
  const { pass } = context;
  if (!pass) return [];
  return [
    ...judgeCold(context, pass),
    ...judgeHot(context, pass).filter((verdict) => !standsWithAct(context, verdict)),
  ];
};

/** Before the arc is struck at `at`: both temperatures there, fresh, and not below the procedure's minimum. */
export const judgeBeforePass = (context: PointContext, at: string): Verdict[] => {
  const { pass } = context;
  const read = passTemperatureFields.flatMap((field) => context.read(field) ?? []);
  const fresh = { limit: 'temps-fresh', kind: 'stop' as const, source: bySetting(context, 'passTemperatureMin') };
  if (read.length < passTemperatureFields.length) {
    return judgeFact(context, { ...fresh, about: [...passTemperatureFields], says: 'temps-missing', holds: false });
  }
  return [
    ...judgeRange(context, {
      ...fresh,
      about: [...passTemperatureFields],
      measured: Math.max(...read.map((reading) => minutesBetween(reading.at.corrected, at))),
      max: context.setting('passTemperatureMin'),
      unit: 'min',
    }),
    ...(pass ? [...judgeCold(context, pass), ...judgeHot(context, pass)] : []),
  ];
};
