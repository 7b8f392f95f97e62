import type { JobState, PointState, Reading } from '../job/state';
import type { Instrument, ProcedurePass, SettingName } from '../job/plan';
import type { PointKind } from './points';

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

const newest = (readings: Reading[] | undefined): Reading | undefined => readings?.filter((one) => !one.late).at(-1);

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
  const read = (field: string): Reading | undefined => newest(point.readings[field]) ?? newest(ofSite(field));
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
    rows: (group) => {
      const found = new Set<number>();
      for (const key of Object.keys(point.readings)) {
        const match = key.startsWith(`${group}.`) ? /^(\d+)\./.exec(key.slice(group.length + 1)) : null;
        if (match) found.add(Number(match[1]));
      }
      return [...found].sort((a, b) => a - b);
    },
    other: (kind) => {
      const found = lastOf(state.points, (one) => one.place.kind === kind);
      return found ? contextOf(state, found) : undefined;
    },
    setting: (name) => Number(state.plan.terms.settings[name].value),
    pass: passOf(state, point),
    instrument: (id) => state.plan.instruments.find((one) => one.id === id),
  };
};
