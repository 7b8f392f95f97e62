import type { Verdict } from '../../../shared/hold-points/verdict';

/** Verdicts on this field alone. */
export const verdictsAt = (verdicts: readonly Verdict[], field: string): Verdict[] =>
  verdicts.filter((verdict) => verdict.about.length === 1 && verdict.about[0] === field);

/** Verdicts on several fields together, the first of which stands in this group. */
export const verdictsUnder = (verdicts: readonly Verdict[], fields: readonly string[]): Verdict[] =>
  verdicts.filter((verdict) => verdict.about.length > 1 && fields.includes(verdict.about[0] ?? ''));
