import type { CalculationInfo } from '../calculations/outcome';
import { toDecimal } from '../units/decimal';
import type { Unit } from '../units/units';
import type { Computed } from './verdict';

/** One computed value with the calculation that made it; left out while its readings are not there. */
export const computed = (key: string, value: number | undefined, unit: Unit, by: CalculationInfo): Computed[] =>
  value === undefined || !Number.isFinite(value)
    ? []
    : [{ key, value: toDecimal(value), unit, calculation: { id: by.id, version: by.version } }];

/** What a calculation answered, or undefined where it had no answer. */
export const answer = <Answer extends object>(
  outcome: ({ readonly ok: true } & Answer) | { readonly ok: false } | undefined,
): Answer | undefined => (outcome?.ok ? outcome : undefined);
