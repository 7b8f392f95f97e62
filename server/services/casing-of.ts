import { drift } from '../../shared/calculations/drift';
import { casingRow } from '../../shared/calculations/casing-table';
import type { Planning } from '../../shared/contracts/jobs';
import type { Casing } from '../../shared/job/plan';
import { toDecimal } from '../../shared/units/decimal';

/** The casing of a plan: the table's row under its names, or the coordinator's own row; null when the table has none. */
export function casingOf(chosen: Planning['casing']): Casing | null {
  const odIn = Number(chosen.odIn);
  if (!('wallIn' in chosen)) {
    const found = casingRow({ odIn, weightLbFt: Number(chosen.weightLbFt), grade: chosen.grade });
    if (!found.ok) return null;
    const { grade, collapsePsi, internalYieldPsi, source, ...sizes } = found.row;
    return {
      odIn: toDecimal(sizes.odIn),
      weightLbFt: toDecimal(sizes.weightLbFt),
      wallIn: toDecimal(sizes.wallIn),
      idIn: toDecimal(sizes.idIn),
      driftIn: toDecimal(sizes.driftIn),
      grade,
      collapsePsi,
      internalYieldPsi,
      source,
      ownRow: false,
    };
  }
  const mandrel = drift({ odIn, wallIn: Number(chosen.wallIn) });
  if (!mandrel.ok) return null;
  return {
    ...chosen,
    odIn: toDecimal(odIn),
    weightLbFt: toDecimal(Number(chosen.weightLbFt)),
    wallIn: toDecimal(Number(chosen.wallIn)),
    idIn: toDecimal(mandrel.insideDiameterIn),
    driftIn: toDecimal(mandrel.driftIn),
    ownRow: true,
  };
}
