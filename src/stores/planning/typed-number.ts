import type { Text } from '../../../shared/locales/text';
import { convertIfAlike } from '../../../shared/units/convert';
import { toDecimal } from '../../../shared/units/decimal';
import { unitFor, type UnitSystem } from '../../../shared/units/format';
import { parseQuantity } from '../../../shared/units/parse-quantity';
import type { Unit } from '../../../shared/units/units';

/** A typed number: not there, not understood and why, or a decimal string in the unit that the record keeps. */
export type TypedNumber = { is: 'blank' } | { is: 'unread'; text: Text } | { is: 'read'; decimal: string };

/** Reads what was typed, in the person's unit, into the unit of the record. Inches keep every digit. */
export function readTyped(typed: string, unit: Unit, system: UnitSystem): TypedNumber {
  if (typed.trim() === '') return { is: 'blank' };
  const parsed = parseQuantity(typed, unitFor(unit, system));
  if (!parsed.ok) return { is: 'unread', text: { key: `entry.${parsed.reason}` } };
  if (parsed.unit === unit) return { is: 'read', decimal: parsed.exact };
  return { is: 'read', decimal: toDecimal(convertIfAlike(parsed.value, parsed.unit, unit) ?? parsed.value) };
}

/** The same for what the record keeps whole: psi and minutes. */
export function readWhole(typed: string, unit: Unit, system: UnitSystem): TypedNumber {
  const read = readTyped(typed, unit, system);
  return read.is === 'read' ? { is: 'read', decimal: String(Math.round(Number(read.decimal))) } : read;
}
