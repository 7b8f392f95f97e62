import { gradeNamed, type CasingGrade } from './casing-grades';
import { refuse, type Outcome } from './outcome';

/** How a row's numbers were come by. Each was recomputed by the formulas and found equal. */
export type CasingRowStatus =
  'read in a secondary copy; recomputed and equal' | 'from memory; recomputed with the 5C3 formulas and equal';

export interface CasingRow {
  readonly odIn: number;
  readonly weightLbFt: number;
  readonly wallIn: number;
  readonly idIn: number;
  readonly driftIn: number;
  readonly grade: CasingGrade;
  readonly collapsePsi: number;
  readonly internalYieldPsi: number;
  readonly source: string;
  readonly status: CasingRowStatus;
}

/** Where the table's values come from, with the edition a crew is shown. */
export const CASING_TABLE_SOURCE = 'API Bulletin 5C2 (21st ed.) / TR 5C3 table value';

const READ = 'read in a secondary copy; recomputed and equal';
const MEMORY = 'from memory; recomputed with the 5C3 formulas and equal';

type Row = readonly [number, number, number, number, number, CasingGrade, number, number, CasingRowStatus];

/** OD, weight, wall, inside diameter, drift, grade, collapse, internal yield, status. */
const ROWS: readonly Row[] = [
  [7, 26, 0.362, 6.276, 6.151, 'P110', 6230, 9960, READ],
  [8.625, 24, 0.264, 8.097, 7.972, 'J55', 1370, 2950, MEMORY],
  [8.625, 24, 0.264, 8.097, 7.972, 'K55', 1370, 2950, MEMORY],
  [8.625, 28, 0.304, 8.017, 7.892, 'H40', 1610, 2470, MEMORY],
  [8.625, 32, 0.352, 7.921, 7.796, 'H40', 2200, 2860, MEMORY],
  [8.625, 32, 0.352, 7.921, 7.796, 'J55', 2530, 3930, MEMORY],
  [8.625, 32, 0.352, 7.921, 7.796, 'K55', 2530, 3930, MEMORY],
  [8.625, 36, 0.4, 7.825, 7.7, 'J55', 3450, 4460, MEMORY],
  [8.625, 36, 0.4, 7.825, 7.7, 'K55', 3450, 4460, MEMORY],
  [9.625, 32.3, 0.312, 9.001, 8.845, 'H40', 1370, 2270, MEMORY],
  [9.625, 36, 0.352, 8.921, 8.765, 'H40', 1720, 2560, MEMORY],
  [9.625, 36, 0.352, 8.921, 8.765, 'J55', 2020, 3520, MEMORY],
  [9.625, 36, 0.352, 8.921, 8.765, 'K55', 2020, 3520, MEMORY],
  [9.625, 40, 0.395, 8.835, 8.679, 'J55', 2570, 3950, READ],
  [9.625, 40, 0.395, 8.835, 8.679, 'K55', 2570, 3950, READ],
  [9.625, 47, 0.472, 8.681, 8.525, 'N80', 4760, 6870, READ],
  [10.75, 32.75, 0.279, 10.192, 10.036, 'H40', 840, 1820, MEMORY],
  [10.75, 40.5, 0.35, 10.05, 9.894, 'H40', 1390, 2280, MEMORY],
  [10.75, 40.5, 0.35, 10.05, 9.894, 'J55', 1580, 3130, MEMORY],
  [10.75, 40.5, 0.35, 10.05, 9.894, 'K55', 1580, 3130, MEMORY],
  [10.75, 45.5, 0.4, 9.95, 9.794, 'J55', 2090, 3580, MEMORY],
  [10.75, 45.5, 0.4, 9.95, 9.794, 'K55', 2090, 3580, MEMORY],
  [10.75, 51, 0.45, 9.85, 9.694, 'J55', 2700, 4030, MEMORY],
  [10.75, 51, 0.45, 9.85, 9.694, 'K55', 2700, 4030, MEMORY],
  [11.75, 42, 0.333, 11.084, 10.928, 'H40', 1040, 1980, MEMORY],
  [11.75, 47, 0.375, 11, 10.844, 'J55', 1510, 3070, MEMORY],
  [11.75, 47, 0.375, 11, 10.844, 'K55', 1510, 3070, MEMORY],
  [11.75, 54, 0.435, 10.88, 10.724, 'J55', 2070, 3560, MEMORY],
  [11.75, 54, 0.435, 10.88, 10.724, 'K55', 2070, 3560, MEMORY],
  [11.75, 60, 0.489, 10.772, 10.616, 'J55', 2660, 4010, MEMORY],
  [11.75, 60, 0.489, 10.772, 10.616, 'K55', 2660, 4010, MEMORY],
  [13.375, 48, 0.33, 12.715, 12.559, 'H40', 740, 1730, MEMORY],
  [13.375, 54.5, 0.38, 12.615, 12.459, 'J55', 1130, 2730, MEMORY],
  [13.375, 54.5, 0.38, 12.615, 12.459, 'K55', 1130, 2730, MEMORY],
  [13.375, 61, 0.43, 12.515, 12.359, 'J55', 1540, 3090, MEMORY],
  [13.375, 61, 0.43, 12.515, 12.359, 'K55', 1540, 3090, MEMORY],
  [13.375, 68, 0.48, 12.415, 12.259, 'J55', 1950, 3450, MEMORY],
  [13.375, 68, 0.48, 12.415, 12.259, 'K55', 1950, 3450, MEMORY],
  [16, 65, 0.375, 15.25, 15.062, 'H40', 630, 1640, MEMORY],
  [16, 75, 0.438, 15.124, 14.936, 'J55', 1020, 2630, MEMORY],
  [16, 75, 0.438, 15.124, 14.936, 'K55', 1020, 2630, MEMORY],
  [16, 84, 0.495, 15.01, 14.822, 'J55', 1410, 2980, MEMORY],
  [16, 84, 0.495, 15.01, 14.822, 'K55', 1410, 2980, MEMORY],
  [16, 109, 0.656, 14.688, 14.5, 'J55', 2560, 3950, MEMORY],
  [16, 109, 0.656, 14.688, 14.5, 'K55', 2560, 3950, MEMORY],
  [20, 94, 0.438, 19.124, 18.936, 'H40', 520, 1530, MEMORY],
  [20, 94, 0.438, 19.124, 18.936, 'J55', 520, 2110, MEMORY],
  [20, 94, 0.438, 19.124, 18.936, 'K55', 520, 2110, MEMORY],
  [20, 106.5, 0.5, 19, 18.812, 'J55', 770, 2410, MEMORY],
  [20, 106.5, 0.5, 19, 18.812, 'K55', 770, 2410, MEMORY],
  [20, 133, 0.635, 18.73, 18.542, 'J55', 1500, 3060, MEMORY],
  [20, 133, 0.635, 18.73, 18.542, 'K55', 1500, 3060, MEMORY],
];

/** Casing dimensions and ratings as published, one row per size, weight and grade. */
export const CASING_TABLE: readonly CasingRow[] = ROWS.map(
  ([odIn, weightLbFt, wallIn, idIn, driftIn, grade, collapsePsi, internalYieldPsi, status]) => ({
    odIn,
    weightLbFt,
    wallIn,
    idIn,
    driftIn,
    grade,
    collapsePsi,
    internalYieldPsi,
    source: CASING_TABLE_SOURCE,
    status,
  }),
);

/** The table's row of a casing by OD (inches), weight (lb/ft) and grade (`J-55` reads as `J55`). */
export const casingRow = (casing: { odIn: number; weightLbFt: number; grade: string }): Outcome<{ row: CasingRow }> => {
  const grade = gradeNamed(casing.grade);
  if (grade === null) return refuse('grade-unknown', 'grade');
  const row = CASING_TABLE.find(
    (each) => each.odIn === casing.odIn && each.weightLbFt === casing.weightLbFt && each.grade === grade,
  );
  return row ? { ok: true, row } : refuse('casing-not-in-table', 'weightLbFt');
};
