import type { FieldDefinition } from '../hold-points/definition';
import { convertIfAlike, parseQuantity, toDecimal, UNITS, type Unit } from '../units';

export type Understood = { ok: true; value: string } | { ok: false; reason: string };

const isUnit = (unit: string): unit is Unit => Object.hasOwn(UNITS, unit);
const instantPattern = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2}(\.\d{1,3})?)?(Z|[+-]\d{2}:\d{2})$/;

const understandQuantity = (typed: string, unitTyped: string | null, unit: Unit): Understood => {
  // a unit that is not known must not pass for the field's own: 10 of something is not 10 psi
  if (unitTyped !== null && !isUnit(unitTyped)) return { ok: false, reason: 'quantity-unit-unknown' };
  const spoken = unitTyped ?? unit;
  const parsed = parseQuantity(typed, spoken);
  if (!parsed.ok) return { ok: false, reason: parsed.reason };
  if (parsed.unit === unit) return { ok: true, value: parsed.exact };
  const converted = convertIfAlike(parsed.value, parsed.unit, unit);
  return converted === null
    ? { ok: false, reason: 'quantity-unit-of-another-kind' }
    : { ok: true, value: toDecimal(converted) };
};

/**
 * What a typed answer means for a field: a decimal string in the field's own unit, `yes`/`no`, a choice's code,
 * an ISO instant or the text itself. The same on the phone and on the server. `reason` is a message key under `entry.`
 * or one of the quantity refusals.
 */
export const understand = (field: FieldDefinition, typed: string, unitTyped: string | null): Understood => {
  const { of } = field;
  const trimmed = typed.trim();
  if (trimmed === '') return { ok: false, reason: 'answer-empty' };
  switch (of.type) {
    case 'quantity':
      return understandQuantity(typed, unitTyped, of.unit);
    case 'count':
      return /^\d{1,4}$/.test(trimmed)
        ? { ok: true, value: String(Number(trimmed)) }
        : { ok: false, reason: 'count-not-whole' };
    case 'check':
      return trimmed === 'yes' || trimmed === 'no'
        ? { ok: true, value: trimmed }
        : { ok: false, reason: 'check-yes-or-no' };
    case 'choice':
      return of.choices.includes(trimmed) ? { ok: true, value: trimmed } : { ok: false, reason: 'choice-not-offered' };
    case 'time':
      return instantPattern.test(trimmed) && Number.isFinite(Date.parse(trimmed))
        ? { ok: true, value: new Date(Date.parse(trimmed)).toISOString() }
        : { ok: false, reason: 'time-not-understood' };
    case 'instrument':
      return { ok: true, value: trimmed };
    case 'text':
    case 'names':
    case 'welders':
      return { ok: true, value: typed };
  }
};
