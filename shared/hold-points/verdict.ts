import type { Text } from '../locales/text';

/** `stop`: life safety or no way back; `hold`: released only with a concession; `advice`: never blocks. */
export type LimitKind = 'stop' | 'hold' | 'advice';

/** Where a limit comes from. `ref` names the standard and clause, the procedure's number, or the setting. */
export interface Source {
  kind: 'job' | 'procedure' | 'standard' | 'common-practice' | 'drawing' | 'calibration' | 'instrument-data';
  ref: string | null;
}

export interface Amount {
  /** decimal string */
  value: string;
  unit: string;
}

/**
 * One reading, or one value computed from readings, held against one limit. A verdict is stored as judged:
 * it keeps the limit, its source and the readings that it rests on.
 */
export interface Verdict {
  /** the limit's name, unique within its hold point, e.g. `cut-low`, `rods.2.amps` */
  limit: string;
  kind: LimitKind;
  outcome: 'within' | 'outside';
  /** the fields it is shown at */
  about: string[];
  /** ids of the readings it rests on: a concession binds them, a new reading voids it */
  basis: string[];
  measured: Amount | null;
  allowed: {
    min: string | null;
    max: string | null;
    /** the highest value itself is already outside */ below?: true;
    unit: string;
  } | null;
  /** by how much it is outside */
  by: Amount | null;
  source: Source;
  /** what is wrong and what can be done now; for `within` what was held against what */
  text: Text;
}

/** A value worked out from readings, shown and kept with the calculation that made it. */
export interface Computed {
  key: string;
  value: string;
  unit: string;
  calculation: { id: string; version: number };
}
