import type { PointContext } from './context';
import type { Verdict } from './verdict';

/**
 * Adds readings that a verdict depends on beside those it is shown at: a mark is held against the string, so reading
 * the string again voids what was conceded about the mark.
 */
export const restingOn = (context: PointContext, fields: string[], verdicts: Verdict[]): Verdict[] => {
  const ids = fields.flatMap((field) => context.read(field)?.id ?? []);
  return verdicts.map((verdict) => ({ ...verdict, basis: [...new Set([...verdict.basis, ...ids])] }));
};
