import type { InstrumentKind } from '../job/plan';
import type { Text } from '../locales/text';
import type { Unit } from '../units/units';
import type { PointContext } from './context';
import type { Part } from './order';
import type { PointKind } from './points';
import type { Computed, Verdict } from './verdict';

/** What a person is asked for, and how what he types is read. */
export type FieldType =
  /** a number with a unit; kept as a decimal string in the field's own unit */
  | { type: 'quantity'; unit: Unit; difference?: true }
  /** a whole number without a unit */
  | { type: 'count' }
  /** done or not done */
  | { type: 'check' }
  | { type: 'choice'; choices: readonly string[] }
  | { type: 'text'; long?: true }
  /** one or more names, separated by commas */
  | { type: 'names' }
  | { type: 'time' }
  | { type: 'instrument'; kinds: readonly InstrumentKind[] }
  /** a member of the job's crew with the welder's role, or several */
  | { type: 'welders' };

export interface FieldDefinition {
  /** unique within its point, e.g. `cut.12`, `rods.#.amps` (`#` stands for the row) */
  key: string;
  of: FieldType;
  required: boolean;
  /** belongs to the site and may be read again at any time while the job runs */
  site?: true;
  /** entered without seeing that field, and by another person */
  confirms?: string;
  /** outside this the screen asks whether it was typed right; it never refuses */
  likely?: { min: number; max: number };
  /** what the job knows that helps to answer */
  hint?: Text;
}

/** Fields that are read together. A group with `rows` repeats: `rods.1.amps`, `rods.2.amps`, ... */
export interface GroupDefinition {
  key: string;
  fields: FieldDefinition[];
  rows?: { min: number; max: number };
  /** how the group is drawn where a picture beats a list */
  picture?: 'clock' | 'plan-view';
}

/** A named photo: its text says what must be seen in it. */
export interface ShotDefinition {
  key: string;
  required: boolean;
}

export interface ActDefinition {
  key: string;
  /** fire is lit: gas check and permit are looked at when it begins */
  flame: boolean;
  required: boolean;
}

/**
 * A hold point. Every screen, verdict, permission, PDF page and test asks these functions; none repeats them.
 * Texts follow from the keys: `points.<kind>.title`, `.fields.<key>`, `.groups.<key>`, `.shots.<key>`,
 * `.acts.<key>`, `.statements.<key>`, `.cautions.<key>`, `.computed.<key>`, `.choices.<field>.<choice>`.
 */
export interface PointDefinition {
  kind: PointKind;
  version: number;
  /** the order of the work where it matters; what it leaves out comes after it */
  order?: readonly Part[];
  groups(context: PointContext): GroupDefinition[];
  shots(context: PointContext): ShotDefinition[];
  acts(context: PointContext): ActDefinition[];
  /** what the owner states with his signature */
  statements: readonly string[];
  cautions(context: PointContext): string[];
  compute(context: PointContext): Computed[];
  judge(context: PointContext): Verdict[];
  /** what must hold when an act begins, beside the checks that every flame gets; judged at `at` (corrected, ISO) */
  beforeAct?(context: PointContext, act: string, at: string): Verdict[];
}

/** The row number replaced by `#`: the name under which a repeated field is defined. */
export const templateKey = (field: string): string => field.replace(/\.\d+\./, '.#.');
