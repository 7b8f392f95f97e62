import { clockDoubtLimitMs, clockIsDoubtful } from '../job/actor';
import type { JobState, PointState, Reading } from '../job/state';
import type { Instrument, ProcedurePass, SettingName } from '../job/plan';
import type { PointKind } from './points';
import { rowsInUse, stands } from './rows';

/** What a definition may look at: the job as it stands and one of its points. No clock. */
export interface PointContext {
  state: JobState;
  point: PointState;
  /** the reading that counts, at this point or of the site */
  read(field: string): Reading | undefined;
  /** its number, in the field's own unit */
  number(field: string): number | undefined;
  /** its text, choice, `yes`/`no` or instant */
  value(field: string): string | undefined;
  /** row numbers in use for a repeated group, ascending */
  rows(group: string): number[];
  /** the same questions, asked of the newest point of another kind in this setting */
  other(kind: PointKind): PointContext | undefined;
  setting(name: SettingName): number;
  /** where that setting's value comes from */
  pass: ProcedurePass | null;
  instrument(id: string | undefined): Instrument | undefined;
}

/**
 * The reading of a field that counts: the one taken last, late and struck ones left aside. Two devices send when they have a
 * signal, so what arrives last may have been taken first; only where a clock is in doubt the order of arrival decides.
 */
export const readingThatCounts = (readings: readonly Reading[] | undefined): Reading | undefined => {
  let counts: Reading | undefined;
  for (const one of readings ?? []) {
    if (!stands(one)) continue;
    const older =
      counts !== undefined &&
      !clockIsDoubtful(counts.at) &&
      !clockIsDoubtful(one.at) &&
      Date.parse(one.at.corrected) < Date.parse(counts.at.corrected);
    if (!older) counts = one;
  }
  return counts;
};

const lastOf = <T>(items: T[], match: (item: T) => boolean): T | undefined => items.filter(match).at(-1);

/** Looks up what the procedure says about a pass; repair passes are run as the procedure's fill passes. */
const passOf = (state: JobState, point: PointState): ProcedurePass | null => {
  if (point.place.pass === null) return null;
  const { passes } = state.plan.procedure;
  if (point.place.round === 0) return passes[point.place.pass - 1] ?? null;
  return passes.find((pass) => pass.name === 'fill') ?? passes.at(-1) ?? null;
};

/** The view of one point for its definition. */
export const contextOf = (state: JobState, point: PointState): PointContext => {
  // what was released keeps the air and the permit that it was released on, however often they are read again
  const released = point.release ? new Set(point.release.readings) : null;
  const ofSite = (field: string): Reading[] | undefined =>
    released ? state.site[field]?.filter((one) => released.has(one.id)) : state.site[field];
  const read = (field: string): Reading | undefined =>
    readingThatCounts(point.readings[field]) ?? readingThatCounts(ofSite(field));
  const value = (field: string): string | undefined => read(field)?.value;
  return {
    state,
    point,
    read,
    value,
    number: (field) => {
      const raw = value(field);
      if (raw === undefined || raw === '') return undefined;
      const parsed = Number(raw);
      return Number.isFinite(parsed) ? parsed : undefined;
    },
    rows: (group) => rowsInUse(point.readings, group),
    other: (kind) => {
      const found = lastOf(state.points, (one) => one.place.kind === kind);
      return found ? contextOf(state, found) : undefined;
    },
    setting: (name) => Number(state.plan.terms.settings[name].value),
    pass: passOf(state, point),
    instrument: (id) => state.plan.instruments.find((one) => one.id === id),
  };
};

const takenBy = (readings: Record<string, Reading[]>, latest: number): Record<string, Reading[]> =>
  Object.fromEntries(
    Object.entries(readings).map(([field, all]) => [
      field,
      all.filter((one) => Date.parse(one.at.corrected) <= latest),
    ]),
  );

/**
 * The view of a point as it was at an instant (ISO): an act is judged by what had been read when it began, within what
 * the clocks of two devices may differ and both still be believed.
 */
export const contextAsOf = (state: JobState, point: PointState, at: string): PointContext => {
  const latest = Date.parse(at) + clockDoubtLimitMs;
  const then = { ...point, readings: takenBy(point.readings, latest) };
  const points = state.points.map((one) => (one.place.id === point.place.id ? then : one));
  return contextOf({ ...state, points, site: takenBy(state.site, latest) }, then);
};
