import { pressureLimitsOf, type PressureLimits } from '../../../shared/hold-points/pressure-limits';
import type { LimitKind, Source, Verdict } from '../../../shared/hold-points/verdict';
import { planFaults } from '../../../shared/job/plan-faults';
import type { JobPlan, SettingName } from '../../../shared/job/plan';
import { settingNames } from '../../../shared/job/plan';
import { settingDefinitions, settingsWith } from '../../../shared/job/settings';
import type { Text } from '../../../shared/locales/text';
import type { Catalogue, Planning } from '../../api/jobs';
import { casingOfRow, readOwnCasing, rowOfKey, type OwnCasingRead } from './casing-choice';
import type { PlanDraft } from './draft';
import { readHeights, type PlannedHeights } from './heights';
import { standInCasing, standInHead, standInProcedure } from './stand-in';
import { readTyped, readWhole, type TypedNumber } from './typed-number';

/** Something about the form that stands in the way or is worth a look, at one field. */
export interface FormFault {
  readonly field: string;
  /** `missing` and `unread` are said when somebody tries to plan; verdicts at once */
  readonly kind: 'missing' | 'unread' | LimitKind;
  readonly text: Text;
  readonly source: Source | null;
}

export interface DraftRead {
  /** what the server is asked for; null while something is missing or not understood */
  readonly planning: Omit<Planning, 'commandId' | 'clock'> | null;
  readonly faults: readonly FormFault[];
  readonly heights: PlannedHeights | null;
  readonly pressure: PressureLimits | null;
  readonly own: OwnCasingRead | null;
}

const missing = (field: string): FormFault => ({
  field,
  kind: 'missing',
  text: { key: `plan.need.${field}` },
  source: null,
});

/** What a typed field lacks; nothing when it was read. `optional` fields may be left open. */
const lacks = (field: string, read: TypedNumber, optional = false): FormFault[] => {
  if (read.is === 'unread') return [{ field, kind: 'unread', text: read.text, source: null }];
  return read.is === 'blank' && !optional ? [missing(field)] : [];
};

const of = (read: TypedNumber, otherwise: string): string => (read.is === 'read' ? read.decimal : otherwise);

function readSettings({ ownSettings, units }: PlanDraft): {
  own: Partial<Record<SettingName, string>>;
  faults: FormFault[];
} {
  const reads = settingNames.map(
    (name) => [name, readTyped(ownSettings[name] ?? '', settingDefinitions[name].unit, units)] as const,
  );
  return {
    own: Object.fromEntries(reads.flatMap(([name, read]) => (read.is === 'read' ? [[name, read.decimal]] : []))),
    faults: reads.flatMap(([name, read]) => lacks(`settings.${name}`, read, true)),
  };
}

const ownCasingFaults = (own: OwnCasingRead | null): FormFault[] => {
  if (own === null) return [];
  const { fields, worked, bored, casing } = own;
  const rated = worked !== null;
  const faults = [
    ...lacks('ownCasing.odIn', fields.odIn),
    ...lacks('ownCasing.weightLbFt', fields.weightLbFt),
    ...lacks('ownCasing.wallIn', fields.wallIn),
    ...lacks('ownCasing.grade', fields.grade),
    ...lacks('ownCasing.collapsePsi', fields.collapsePsi, rated),
    ...lacks('ownCasing.internalYieldPsi', fields.internalYieldPsi, rated),
    ...lacks('ownCasing.source', fields.source, casing !== null || rated),
  ];
  if (faults.length > 0 || casing !== null) return faults;
  const field = bored ? 'ownCasing.source' : 'ownCasing.wallIn';
  const text = { key: bored ? `plan.need.${field}` : 'plan.need.ownCasing.bore' };
  return [{ field, kind: bored ? 'missing' : 'stop', text, source: null }];
};

const asFault = ({ about, kind, text, source }: Verdict): FormFault => ({ field: about[0] ?? '', kind, text, source });

/**
 * Reads the form: what it asks for, what is missing, and what the job's rules say to the parts that are there.
 * @param day ISO date at the site that dates are held against
 */
export function readDraft(draft: PlanDraft, catalogue: Catalogue, day: string): DraftRead {
  const operator = catalogue.operators.find((one) => one.id === draft.operatorId);
  const rig = operator?.rigs.find((one) => one.id === draft.rigId);
  const head = catalogue.heads.find((one) => one.id === draft.headId);
  const procedure = catalogue.procedures.find((one) => one.id === draft.procedureId);
  const own = draft.casing === 'own' ? readOwnCasing(draft.ownCasing, draft.units) : null;
  const row = rowOfKey(draft.casing);
  const casing = own === null ? (row === undefined ? null : casingOfRow(row)) : own.casing;
  const height = readTyped(draft.targetHeight, 'in', draft.units);
  const standOff = readTyped(draft.standOff, 'in', draft.units);
  const pressure = readWhole(draft.pressure, 'psi', draft.units);
  const hold = readWhole(draft.holdMin, 'min', draft.units);
  const drop = readWhole(draft.allowedDrop, 'psi', draft.units);
  const settings = readSettings(draft);
  const people = draft.people.flatMap(({ accountId, role }) => {
    const person = catalogue.people.find((one) => one.accountId === accountId);
    return person === undefined
      ? []
      : [{ accountId, role, name: person.name, qualifications: role === 'welder' ? person.qualifications : [] }];
  });
  const instruments = catalogue.instruments.filter((one) => draft.instrumentIds.includes(one.id));
  const od = casing?.odIn ?? head?.casingOdIn ?? '9.625';

  const terms = {
    datum: draft.datum,
    targetHeightIn: of(height, '0'),
    standOffIn: of(standOff, '0'),
    test: {
      medium: draft.medium,
      pressurePsi: Number(of(pressure, '0')),
      holdMin: Number(of(hold, '0')),
      allowedDropPsi: Number(of(drop, '0')),
    },
  };
  const plan: JobPlan = {
    operator: { id: draft.operatorId, name: operator?.name ?? '' },
    rig: { id: draft.rigId, name: rig?.name ?? '' },
    well: draft.well.trim(),
    zone: draft.zone,
    casing: casing ?? standInCasing(od),
    head: head ?? standInHead(od),
    procedure: procedure ?? standInProcedure,
    instruments,
    people,
    terms: { ...terms, settings: settingsWith(settings.own) },
    proposedDirection: draft.direction.trim() || null,
    rateCardId: null,
  };

  const absent: Record<string, boolean> = {
    operatorId: operator === undefined,
    rigId: rig === undefined,
    well: plan.well === '',
    zone: draft.zone === '',
    casing: draft.casing !== 'own' && casing === null,
    headId: head === undefined,
    procedureId: procedure === undefined,
    people: people.length === 0,
    instrumentIds: instruments.length === 0,
  };
  const lacking = [
    ...Object.keys(absent)
      .filter((field) => absent[field])
      .map(missing),
    ...ownCasingFaults(own),
    ...lacks('targetHeightIn', height),
    ...lacks('standOffIn', standOff),
    ...lacks('test.pressurePsi', pressure),
    ...lacks('test.holdMin', hold),
    ...lacks('test.allowedDropPsi', drop),
    ...settings.faults,
  ];
  const judged = planFaults(plan, day).filter(
    ({ about }) => !about.some((field) => absent[field] || (field === 'casing' && casing === null)),
  );
  const { casing: pipe } = plan;
  return {
    planning:
      lacking.length > 0
        ? null
        : {
            operatorId: draft.operatorId,
            rigId: draft.rigId,
            well: plan.well,
            zone: plan.zone,
            casing: pipe.ownRow
              ? {
                  odIn: pipe.odIn,
                  weightLbFt: pipe.weightLbFt,
                  wallIn: pipe.wallIn,
                  grade: pipe.grade,
                  collapsePsi: pipe.collapsePsi,
                  internalYieldPsi: pipe.internalYieldPsi,
                  source: pipe.source,
                }
              : { odIn: pipe.odIn, weightLbFt: pipe.weightLbFt, grade: pipe.grade },
            headId: draft.headId,
            procedureId: draft.procedureId,
            instrumentIds: instruments.map((one) => one.id),
            people: people.map(({ accountId, role }) => ({ accountId, role })),
            terms: { ...terms, ownSettings: settings.own },
            proposedDirection: plan.proposedDirection,
            rateCardId: null,
          },
    faults: [...lacking, ...judged.map(asFault)],
    heights: head === undefined ? null : readHeights(plan, height.is === 'read' && standOff.is === 'read'),
    pressure: casing === null || head === undefined ? null : pressureLimitsOf(plan),
    own,
  };
}
