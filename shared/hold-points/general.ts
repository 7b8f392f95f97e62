import { clockIsDoubtful, minutesBetween } from '../job/actor';
import type { ActRun } from '../job/state';
import type { PointContext } from './context';
import type { FieldDefinition } from './definition';
import { judgeInstrument } from './instruments';
import { commonPractice, judgeFact } from './judging';
import { judgeUsable } from './unusable';
import type { Verdict } from './verdict';

/** Readings whose time is not sure are a hold; the air's own are a stop and judged with the air. */
const judgeClock = (context: PointContext, fields: FieldDefinition[]): Verdict[] => {
  const doubtful = fields.filter(({ key }) => {
    const reading = key.startsWith('gas.') ? undefined : context.read(key);
    return reading !== undefined && clockIsDoubtful(reading.at);
  });
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

/** Colder than any rig has been, °F: a slip of the finger, and the limits that only say `no hotter than` would take it. */
const coldestF = -100;

const judgePossible = (context: PointContext, fields: FieldDefinition[]): Verdict[] =>
  fields
    .filter(({ of }) => of.type === 'quantity' && of.unit === 'degF')
    .flatMap(({ key }) => judgeUsable(context, `${key}.possible`, [key], (context.number(key) ?? 0) >= coldestF));

/** An act that ends before it began by more than two clocks may differ, in minutes. */
const clocksDifferMin = 4;

const timesAreSure = ({ begun, ended }: ActRun): boolean =>
  !clockIsDoubtful(begun.at) &&
  (ended === null ||
    (!clockIsDoubtful(ended.at) && minutesBetween(begun.at.corrected, ended.at.corrected) >= -clocksDifferMin));

/** Rods and cooling are aged by an act's times: an act whose times are not sure is a hold. */
const judgeActTimes = (context: PointContext): Verdict[] =>
  context.point.acts.flatMap((run, index) =>
    timesAreSure(run)
      ? []
      : judgeFact(context, {
          limit: `act-times.${index + 1}`,
          kind: 'hold',
          about: [],
          source: commonPractice,
          params: { act: { key: `points.${context.point.place.kind}.acts.${run.act}` } },
          holds: false,
        }).map((verdict) => ({ ...verdict, basis: [run.id] })),
  );

/**
 * A time that lies ahead of when it was typed was not seen on any watch: rods, cooling and the hold would be aged by it.
 * A permit's expiry is meant to lie ahead. Two clocks may differ by a little.
 */
const judgeAhead = (context: PointContext, fields: FieldDefinition[]): Verdict[] =>
  fields
    .filter(({ key, of }) => of.type === 'time' && key !== 'permit.expires')
    .flatMap(({ key }) => {
      const reading = context.read(key);
      return judgeFact(context, {
        limit: `${key}.ahead`,
        kind: 'stop',
        about: [key],
        source: commonPractice,
        says: 'time-ahead',
        params: { time: { instant: reading?.value ?? '' } },
        holds: reading && minutesBetween(reading.at.corrected, reading.value) <= clocksDifferMin,
      });
    })
    .filter((verdict) => verdict.outcome === 'outside');

/** What is judged the same way at every point: instruments, clocks, and what an act's beginning found. */
export const generalVerdicts = (context: PointContext, fields: FieldDefinition[]): Verdict[] => [
  ...fields.filter((field) => field.of.type === 'instrument').flatMap((field) => judgeInstrument(context, field)),
  ...judgePossible(context, fields),
  ...judgeAhead(context, fields),
  ...judgeClock(context, fields),
  ...judgeActTimes(context),
  ...context.point.acts.flatMap((run, index) =>
    run.verdicts
      .filter((verdict) => verdict.outcome === 'outside' && verdict.kind === 'hold')
      .map((verdict) => ({ ...verdict, limit: `${verdict.limit}.begun.${index + 1}`, basis: [run.id] })),
  ),
];
