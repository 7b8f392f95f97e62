import {
  casingCollapse,
  casingCollapseInfo,
  CASING_GRADES,
  CASING_TABLE,
  drift,
  gradeNamed,
  internalYield,
  type CasingRow,
} from '../../../shared/calculations';
import type { Casing } from '../../../shared/job/plan';
import { toDecimal } from '../../../shared/units/decimal';
import type { UnitSystem } from '../../../shared/units/format';
import type { OwnCasing } from './draft';
import { readTyped, readWhole, type TypedNumber } from './typed-number';

/** The name of a row of the table within the form. */
export const keyOfRow = ({ odIn, weightLbFt, grade }: CasingRow): string => `${odIn}/${weightLbFt}/${grade}`;

export const rowOfKey = (key: string): CasingRow | undefined => CASING_TABLE.find((row) => keyOfRow(row) === key);

/** A row of the table as the plan carries it. */
export const casingOfRow = (row: CasingRow): Casing => ({
  odIn: toDecimal(row.odIn),
  weightLbFt: toDecimal(row.weightLbFt),
  wallIn: toDecimal(row.wallIn),
  idIn: toDecimal(row.idIn),
  driftIn: toDecimal(row.driftIn),
  grade: row.grade,
  collapsePsi: row.collapsePsi,
  internalYieldPsi: row.internalYieldPsi,
  source: row.source,
  ownRow: false,
});

/** An own row's numbers one by one, each read or not; ratings left open are worked out where the grade is known. */
export interface OwnCasingRead {
  readonly fields: Readonly<Record<keyof OwnCasing, TypedNumber>>;
  /** by the formulas, from diameter, wall and grade; null while one of them is missing or unknown */
  readonly worked: { readonly collapsePsi: number; readonly internalYieldPsi: number } | null;
  /** diameter and wall leave a bore that a mandrel can pass */
  readonly bored: boolean;
  readonly casing: Casing | null;
}

const numberOf = (read: TypedNumber): number | null => (read.is === 'read' ? Number(read.decimal) : null);
const words = (typed: string): TypedNumber =>
  typed.trim() === '' ? { is: 'blank' } : { is: 'read', decimal: typed.trim() };

function workOut(odIn: number | null, wallIn: number | null, gradeWords: string): OwnCasingRead['worked'] {
  const grade = gradeNamed(gradeWords);
  if (odIn === null || wallIn === null || grade === null) return null;
  const pipe = { odIn, wallIn, yieldPsi: CASING_GRADES[grade] };
  const [collapse, inside] = [casingCollapse(pipe), internalYield(pipe)];
  return collapse.ok && inside.ok
    ? { collapsePsi: collapse.collapsePsi, internalYieldPsi: inside.internalYieldPsi }
    : null;
}

/** Reads a casing that the table does not have. Without a source of its own it names the formulas. */
export function readOwnCasing(own: OwnCasing, system: UnitSystem): OwnCasingRead {
  const fields = {
    odIn: readTyped(own.odIn, 'in', system),
    wallIn: readTyped(own.wallIn, 'in', system),
    weightLbFt: readTyped(own.weightLbFt, 'count', 'imperial'),
    grade: words(own.grade),
    collapsePsi: readWhole(own.collapsePsi, 'psi', system),
    internalYieldPsi: readWhole(own.internalYieldPsi, 'psi', system),
    source: words(own.source),
  };
  const [odIn, wallIn, weight] = [numberOf(fields.odIn), numberOf(fields.wallIn), numberOf(fields.weightLbFt)];
  const worked = workOut(odIn, wallIn, own.grade);
  const collapsePsi = fields.collapsePsi.is === 'blank' ? worked?.collapsePsi : numberOf(fields.collapsePsi);
  const yieldPsi =
    fields.internalYieldPsi.is === 'blank' ? worked?.internalYieldPsi : numberOf(fields.internalYieldPsi);
  const bore = odIn === null || wallIn === null ? null : drift({ odIn, wallIn });
  const typedRatings = fields.collapsePsi.is === 'read' || fields.internalYieldPsi.is === 'read';
  const source = own.source.trim() || (typedRatings || worked === null ? '' : casingCollapseInfo.source);
  if (!bore?.ok || weight === null || !collapsePsi || !yieldPsi || own.grade.trim() === '' || source === '')
    return { fields, worked, bored: bore?.ok === true, casing: null };
  return {
    fields,
    worked,
    bored: true,
    casing: {
      odIn: toDecimal(odIn ?? 0),
      weightLbFt: toDecimal(weight),
      wallIn: toDecimal(wallIn ?? 0),
      idIn: toDecimal(bore.insideDiameterIn),
      driftIn: toDecimal(bore.driftIn),
      grade: gradeNamed(own.grade) ?? own.grade.trim(),
      collapsePsi,
      internalYieldPsi: yieldPsi,
      source,
      ownRow: true,
    },
  };
}
