import type { ActorStamp, Times } from '../job/actor';
import type { PointState, Reading } from '../job/state';

type Readings = Readonly<Record<string, readonly Reading[]>>;

/** What comes before the number in the keys of a repeated group: `hold-readings` for `hold-readings.#.at`. */
export const rowPrefix = (group: { key: string; fields: readonly { key: string }[] }): string =>
  group.fields[0]?.key.split('.#.')[0] ?? group.key;

/** The row that a key names under a prefix: 2 for `rods.2.amps` under `rods`; undefined for every other key. */
export const rowNamed = (prefix: string, key: string): number | undefined => {
  const match = key.startsWith(`${prefix}.`) ? /^(\d+)\./.exec(key.slice(prefix.length + 1)) : null;
  return match ? Number(match[1]) : undefined;
};

/** Neither late nor struck: such a reading may count. */
export const stands = (reading: Pick<Reading, 'late' | 'struck'>): boolean => !reading.late && reading.struck === null;

const rowsWhere = (readings: Readings, prefix: string, fits: (reading: Reading) => boolean): number[] => {
  const found = new Set<number>();
  for (const [key, all] of Object.entries(readings)) {
    const row = rowNamed(prefix, key);
    if (row !== undefined && all.some(fits)) found.add(row);
  }
  return [...found].sort((a, b) => a - b);
};

/** Rows with a reading that stands, ascending. */
export const rowsInUse = (readings: Readings, prefix: string): number[] => rowsWhere(readings, prefix, stands);

/** Rows that were struck, ascending. Their numbers are given to no other row, so that the record stays plain. */
export const rowsStruck = (readings: Readings, prefix: string): number[] =>
  rowsWhere(readings, prefix, (reading) => reading.struck !== null);

/** Every reading of one row by its field, late and struck ones too. */
export const readingsOfRow = ({ readings }: Pick<PointState, 'readings'>, prefix: string, row: number): Reading[] =>
  Object.entries(readings).flatMap(([key, all]) => (rowNamed(prefix, key) === row ? all : []));

/** The number that the next row gets: past every row that was ever written to. */
export const nextRow = (readings: Readings, prefix: string): number =>
  Math.max(0, ...rowsInUse(readings, prefix), ...rowsStruck(readings, prefix)) + 1;

/**
 * The rows that a form shows: those in use, the first `min` that were not struck, and while these are fewer than
 * `min`, the next numbers.
 */
export const rowsAsked = (readings: Readings, prefix: string, min: number): number[] => {
  const struck = new Set(rowsStruck(readings, prefix));
  const first = Array.from({ length: min }, (_, index) => index + 1).filter((row) => !struck.has(row));
  const asked = new Set([...rowsInUse(readings, prefix), ...first]);
  for (let row = min + 1; asked.size < min; row += 1) if (!struck.has(row)) asked.add(row);
  return [...asked].sort((a, b) => a - b);
};

/** A row taken back: its number, who struck it and why, and what had been written there. */
export interface Strike {
  prefix: string;
  row: number;
  reason: string;
  by: ActorStamp;
  at: Times;
  readings: Reading[];
}

/** Every row that was struck at a point, in the order of their numbers within a group. */
export const strikesIn = ({ readings }: Pick<PointState, 'readings'>): Strike[] => {
  const found = new Map<string, Strike>();
  for (const reading of Object.values(readings).flat()) {
    const [, prefix, row] = /^([^.]+)\.(\d+)\./.exec(reading.field) ?? [];
    if (!reading.struck || prefix === undefined) continue;
    const key = `${prefix}.${row}`;
    const strike = found.get(key) ?? { ...reading.struck, prefix, row: Number(row), readings: [] };
    found.set(key, { ...strike, readings: [...strike.readings, reading] });
  }
  return [...found.values()].sort((a, b) => a.prefix.localeCompare(b.prefix) || a.row - b.row);
};
