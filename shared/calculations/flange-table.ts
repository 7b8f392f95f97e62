import { refuse, type Outcome } from './outcome';

/** How a row was come by; a crew is shown it beside the numbers. */
export type FlangeRowStatus = 'stated' | 'from memory';

export interface Flange {
  /** Nominal size as stamped: `13-5/8`. */
  readonly size: string;
  readonly boreIn: number;
  readonly ratedPsi: 2000 | 3000 | 5000 | 10000;
  readonly type: '6B' | '6BX';
  readonly bolts: number;
  readonly bolt: string;
  readonly boltCircleIn: number;
  readonly ring: string;
  readonly source: string;
  readonly status: FlangeRowStatus;
}

const BORES: Readonly<Record<string, number>> = {
  '7-1/16': 7.0625,
  '9': 9,
  '11': 11,
  '13-5/8': 13.625,
  '16-3/4': 16.75,
  '18-3/4': 18.75,
  '20-3/4': 20.75,
  '21-1/4': 21.25,
};

type Row = readonly [string, Flange['ratedPsi'], Flange['type'], number, string, number, string, FlangeRowStatus];
const STATED = 'stated';
const MEMORY = 'from memory';

/** Size, rated pressure, type, number of bolts, bolt, bolt circle, ring, status. There is no 21-1/4 at 3000. */
const ROWS: readonly Row[] = [
  ['7-1/16', 2000, '6B', 12, '1', 11.5, 'R-45', MEMORY],
  ['9', 2000, '6B', 12, '1-1/8', 13.75, 'R-49', MEMORY],
  ['11', 2000, '6B', 16, '1-1/4', 17, 'R-53', MEMORY],
  ['13-5/8', 2000, '6B', 20, '1-1/4', 19.25, 'R-57', MEMORY],
  ['16-3/4', 2000, '6B', 20, '1-1/2', 23.75, 'R-65', MEMORY],
  ['21-1/4', 2000, '6B', 24, '1-5/8', 28.5, 'R-73', MEMORY],
  ['7-1/16', 3000, '6B', 12, '1-1/8', 12.5, 'R-45', MEMORY],
  ['9', 3000, '6B', 12, '1-3/8', 15.5, 'R-49', MEMORY],
  ['11', 3000, '6B', 16, '1-3/8', 18.5, 'R-53', STATED],
  ['13-5/8', 3000, '6B', 20, '1-3/8', 21, 'R-57', STATED],
  ['16-3/4', 3000, '6B', 20, '1-5/8', 24.25, 'R-66', MEMORY],
  ['20-3/4', 3000, '6B', 20, '2', 29.5, 'R-74', MEMORY],
  ['7-1/16', 5000, '6B', 12, '1-3/8', 12.5, 'R-46', MEMORY],
  ['9', 5000, '6B', 12, '1-5/8', 15.5, 'R-50', MEMORY],
  ['11', 5000, '6B', 12, '1-7/8', 19, 'R-54', MEMORY],
  ['13-5/8', 5000, '6BX', 16, '1-5/8', 23.25, 'BX-160', MEMORY],
  ['16-3/4', 5000, '6BX', 16, '1-7/8', 26.62, 'BX-162', MEMORY],
  ['18-3/4', 5000, '6BX', 20, '2', 31.62, 'BX-163', MEMORY],
  ['21-1/4', 5000, '6BX', 24, '2', 34.88, 'BX-165', MEMORY],
  ['7-1/16', 10000, '6BX', 12, '1-1/2', 15.88, 'BX-156', MEMORY],
  ['9', 10000, '6BX', 16, '1-1/2', 18.75, 'BX-157', MEMORY],
  ['11', 10000, '6BX', 16, '1-3/4', 22.25, 'BX-158', MEMORY],
  ['13-5/8', 10000, '6BX', 20, '1-7/8', 26.5, 'BX-159', MEMORY],
  ['16-3/4', 10000, '6BX', 24, '1-7/8', 30.56, 'BX-162', MEMORY],
  ['18-3/4', 10000, '6BX', 24, '2-1/4', 36.44, 'BX-164', MEMORY],
  ['21-1/4', 10000, '6BX', 24, '2-1/2', 40.25, 'BX-166', MEMORY],
];

/** Wellhead flanges by nominal size and rated working pressure. Source: API 6A types 6B and 6BX, customary sizes. */
export const FLANGE_TABLE: readonly Flange[] = ROWS.map(
  ([size, ratedPsi, type, bolts, bolt, boltCircleIn, ring, status]) => ({
    size,
    boreIn: BORES[size] ?? 0,
    ratedPsi,
    type,
    bolts,
    bolt,
    boltCircleIn,
    ring,
    source: `API 6A type ${type}`,
    status,
  }),
);

/** Sizes may be typed `13 5/8`, `13-5/8` or with an inch mark. */
const sizeNamed = (text: string): string => text.trim().replace(/\s+/g, '-').replace(/["″]$/, '');

/** The flange of a size and pressure class, or a refusal that the standard has none. */
export const flangeOf = (wanted: { size: string; ratedPsi: number }): Outcome<{ flange: Flange }> => {
  const size = sizeNamed(wanted.size);
  const flange = FLANGE_TABLE.find((row) => row.size === size && row.ratedPsi === wanted.ratedPsi);
  return flange ? { ok: true, flange } : refuse('flange-not-in-table', 'ratedPsi');
};

/** The pressure classes that exist for a size, lowest first. */
export const ratingsOf = (size: string): readonly number[] =>
  FLANGE_TABLE.filter((row) => row.size === sizeNamed(size)).map((row) => row.ratedPsi);
