import type { Datum, SettingName, TestMedium } from '../../../shared/job/plan';
import type { Role } from '../../../shared/permissions/roles';
import type { UnitSystem } from '../../../shared/units/format';

/** A casing that the table does not have, as the coordinator types it. */
export interface OwnCasing {
  odIn: string;
  weightLbFt: string;
  wallIn: string;
  grade: string;
  collapsePsi: string;
  internalYieldPsi: string;
  source: string;
}

/** A new job as far as it is filled in: what was typed stays as typed. Empty means not chosen yet. */
export interface PlanDraft {
  /** the system that bare numbers were typed in; it stays when the person's own setting changes */
  units: UnitSystem;
  operatorId: string;
  rigId: string;
  well: string;
  zone: string;
  /** a row of the table by its key, `own` for one that is typed */
  casing: string;
  ownCasing: OwnCasing;
  headId: string;
  datum: Datum;
  targetHeight: string;
  standOff: string;
  direction: string;
  procedureId: string;
  medium: TestMedium;
  pressure: string;
  holdMin: string;
  allowedDrop: string;
  instrumentIds: string[];
  people: { accountId: string; role: Role }[];
  /** what the operator's programme replaces, as typed */
  ownSettings: Partial<Record<SettingName, string>>;
}

/** A form that nobody has touched: only what is common practice everywhere is there. */
export const blankDraft = (units: UnitSystem): PlanDraft => ({
  units,
  operatorId: '',
  rigId: '',
  well: '',
  zone: '',
  casing: '',
  ownCasing: { odIn: '', weightLbFt: '', wallIn: '', grade: '', collapsePsi: '', internalYieldPsi: '', source: '' },
  headId: '',
  datum: 'face',
  targetHeight: '',
  standOff: '0',
  direction: '',
  procedureId: '',
  medium: 'hydraulic-oil',
  pressure: '',
  holdMin: '15',
  allowedDrop: '',
  instrumentIds: [],
  people: [],
  ownSettings: {},
});

const shape = Object.entries(blankDraft('imperial')).map(
  ([name, value]) => [name, Array.isArray(value) ? 'list' : typeof value] as const,
);

/** Whether something kept is a draft of today's form; an older form's draft is not guessed at. */
export const isDraft = (value: unknown): value is PlanDraft =>
  typeof value === 'object' &&
  value !== null &&
  shape.every(([name, type]) => {
    const part: unknown = (value as Record<string, unknown>)[name];
    return type === 'list' ? Array.isArray(part) : typeof part === type && part !== null;
  });
