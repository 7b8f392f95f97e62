import { clockIsDoubtful } from '../job/actor';
import type { PointContext } from './context';
import type { FieldDefinition } from './definition';
import { commonPractice, judgeFact } from './judging';
import { siteDay } from './site-day';
import type { Verdict } from './verdict';

/** Past its calibration date an instrument is a hold; a gas meter is a stop. Judged on the day it was used. */
const judgeCalibration = (context: PointContext, field: FieldDefinition): Verdict[] => {
  const reading = context.read(field.key);
  const instrument = context.instrument(reading?.value);
  if (!reading || !instrument) return [];
  const gas = instrument.kind === 'gas-meter';
  return judgeFact(context, {
    limit: `calibration.${field.key}`,
    kind: gas ? 'stop' : 'hold',
    about: [field.key],
    source: { kind: 'calibration', ref: instrument.serial },
    says: gas ? 'calibration-gas-meter' : 'calibration',
    params: { name: instrument.name, until: { instant: `${instrument.calibratedUntil}T00:00:00.000Z` } },
    holds: siteDay(context.state.plan.zone, reading.at.corrected) <= instrument.calibratedUntil,
  });
};

/** An instrument that is not on the job's list cannot be looked up, so it cannot be believed either. */
const judgeKnown = (context: PointContext, field: FieldDefinition): Verdict[] => {
  const value = context.value(field.key);
  if (value === undefined) return [];
  return judgeFact(context, {
    limit: `listed.${field.key}`,
    kind: field.of.type === 'instrument' && field.of.kinds.includes('gas-meter') ? 'stop' : 'hold',
    about: [field.key],
    source: commonPractice,
    says: 'instrument-listed',
    params: { name: value },
    holds: context.instrument(value) !== undefined,
  }).filter((verdict) => verdict.outcome === 'outside');
};

/** Readings whose time is not sure are a hold; the air's own are a stop and judged with the air. */
const judgeClock = (context: PointContext, fields: FieldDefinition[]): Verdict[] => {
  const doubtful = fields
    .filter((field) => !field.key.startsWith('gas.') && context.read(field.key))
    .filter((field) => clockIsDoubtful(context.read(field.key)!.at));
  return doubtful.length === 0
    ? []
    : judgeFact(context, {
        limit: 'clock-doubt',
        kind: 'hold',
        about: doubtful.map((field) => field.key),
        source: commonPractice,
        holds: false,
      });
};

/** What is judged the same way at every point: calibration, the clock, and what an act's beginning found. */
export const generalVerdicts = (context: PointContext, fields: FieldDefinition[]): Verdict[] => [
  ...fields
    .filter((field) => field.of.type === 'instrument')
    .flatMap((field) => [...judgeKnown(context, field), ...judgeCalibration(context, field)]),
  ...judgeClock(context, fields),
  ...context.point.acts.flatMap((run, index) =>
    run.verdicts
      .filter((verdict) => verdict.outcome === 'outside' && verdict.kind === 'hold')
      .map((verdict) => ({ ...verdict, limit: `${verdict.limit}.begun.${index + 1}`, basis: [run.id] })),
  ),
];
