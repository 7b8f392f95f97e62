import { exposureLimit } from '../calculations/electrode-exposure';
import { heatInput } from '../calculations/heat-input';
import { travelSpeedRound, travelSpeedRunOut } from '../calculations/travel-speed';
import { minutesBetween } from '../job/actor';
import { answer } from './computing';
import type { PointContext } from './context';

/** What a row of rods comes to; undefined while its readings are not there. */
export interface RodFacts {
  row: number;
  /** the fields that travel speed and heat input rest on */
  heatRestsOn: string[];
  amps: number | undefined;
  volts: number | undefined;
  speedInPerMin: number | undefined;
  heatInputKjPerIn: number | undefined;
  /** from out of the oven to the end of the pass; negative when the times contradict each other */
  exposureMin: number | undefined;
  /** of the class that was used; undefined where its class has none or is not known */
  exposureLimitMin: number | undefined;
}

const rowFields = ['class', 'lot', 'out-of-oven', 'count', 'amps', 'volts', 'arc-time', 'run-out'] as const;

/** The diameter that the weld runs round: the casing's outside, or its bore where it is welded inside. */
const weldDiameterIn = (context: PointContext): number =>
  Number(context.pass?.weld === 'inside' ? context.state.plan.casing.idIn : context.state.plan.casing.odIn);

/** Arc time of the whole pass, in minutes; undefined while one row has none. */
const totalArcMin = (context: PointContext, rows: number[]): number | undefined => {
  const times = rows.map((row) => context.number(`rods.${row}.arc-time`));
  return times.every((one) => one !== undefined) ? times.reduce((sum, one) => sum + one, 0) : undefined;
};

/** By its own run-out where that was measured, else the whole pass once round the casing. */
const speedOf = (context: PointContext, row: number, passArcMin: number | undefined): number | undefined => {
  const [runOutIn, arcMinutes] = [context.number(`rods.${row}.run-out`), context.number(`rods.${row}.arc-time`)];
  if (runOutIn !== undefined && arcMinutes !== undefined) {
    return answer(travelSpeedRunOut({ runOutIn, arcMinutes }))?.speedInPerMin;
  }
  if (passArcMin === undefined) return undefined;
  return answer(travelSpeedRound({ odIn: weldDiameterIn(context), arcMinutes: passArcMin }))?.speedInPerMin;
};

/** With a run-out the row speaks for itself; without one its speed comes from every row's arc time. */
const heatRestsOn = (context: PointContext, row: number, rows: number[]): string[] => {
  const own = [`rods.${row}.amps`, `rods.${row}.volts`];
  return context.number(`rods.${row}.run-out`) === undefined
    ? [...own, ...rows.map((each) => `rods.${each}.arc-time`)]
    : [...own, `rods.${row}.arc-time`, `rods.${row}.run-out`];
};

/** The last end of the pass, also of one before a reopening; undefined before it was struck and while an arc burns. */
const passEnded = (context: PointContext): string | undefined => {
  const { acts, superseded } = context.point;
  const runs = [...superseded.flatMap((evidence) => evidence.acts), ...acts].filter((run) => run.act === 'pass');
  const ends = runs.map((run) => run.ended?.at.corrected);
  return ends.every((end) => end !== undefined) ? ends.sort().at(-1) : undefined;
};

/** The end of the pass, or until there is one the time when the row was last written to. */
const usedUpAt = (context: PointContext, row: number): string | undefined =>
  passEnded(context) ??
  rowFields
    .flatMap((name) => context.read(`rods.${row}.${name}`)?.at.corrected ?? [])
    .sort()
    .at(-1);

const exposureOf = (context: PointContext, row: number): number | undefined => {
  const [out, end] = [context.value(`rods.${row}.out-of-oven`), usedUpAt(context, row)];
  return out === undefined || end === undefined ? undefined : minutesBetween(out, end);
};

const limitOf = (context: PointContext, row: number): number | undefined => {
  const electrodeClass = context.value(`rods.${row}.class`);
  return electrodeClass === undefined ? undefined : (answer(exposureLimit(electrodeClass))?.limitMinutes ?? undefined);
};

/** Every row of rods of this pass with its travel speed, heat input and time out of the oven. */
export const rodFactsOf = (context: PointContext): RodFacts[] => {
  const rows = context.rows('rods');
  const passArcMin = totalArcMin(context, rows);
  return rows.map((row) => {
    const [amps, volts] = [context.number(`rods.${row}.amps`), context.number(`rods.${row}.volts`)];
    const speedInPerMin = speedOf(context, row, passArcMin);
    const known = amps !== undefined && volts !== undefined && speedInPerMin !== undefined;
    return {
      row,
      heatRestsOn: heatRestsOn(context, row, rows),
      amps,
      volts,
      speedInPerMin,
      heatInputKjPerIn: known ? answer(heatInput({ volts, amperes: amps, speedInPerMin }))?.kilojoulesPerIn : undefined,
      exposureMin: exposureOf(context, row),
      exposureLimitMin: limitOf(context, row),
    };
  });
};
