import type { InstrumentKind } from '../job/plan';
import type { Unit } from '../units/units';
import type { FieldDefinition } from './definition';

/** Short makers for field definitions, so that a point's file reads like the trade's own check sheet. */
type Extra = Partial<Omit<FieldDefinition, 'key' | 'of'>>;

const make = (key: string, of: FieldDefinition['of'], extra: Extra = {}): FieldDefinition => ({
  key,
  of,
  required: true,
  ...extra,
});

export const quantity = (key: string, unit: Unit, extra?: Extra): FieldDefinition =>
  make(key, { type: 'quantity', unit }, extra);
export const count = (key: string, extra?: Extra): FieldDefinition => make(key, { type: 'count' }, extra);
export const check = (key: string, extra?: Extra): FieldDefinition => make(key, { type: 'check' }, extra);
export const choice = (key: string, choices: readonly string[], extra?: Extra): FieldDefinition =>
  make(key, { type: 'choice', choices }, extra);
export const words = (key: string, extra?: Extra): FieldDefinition => make(key, { type: 'text' }, extra);
export const names = (key: string, extra?: Extra): FieldDefinition => make(key, { type: 'names' }, extra);
export const time = (key: string, extra?: Extra): FieldDefinition => make(key, { type: 'time' }, extra);
export const instrument = (key: string, kinds: readonly InstrumentKind[], extra?: Extra): FieldDefinition =>
  make(key, { type: 'instrument', kinds }, extra);
export const welders = (key: string, extra?: Extra): FieldDefinition => make(key, { type: 'welders' }, extra);

/** The clock positions of a quadrant reading; 12 o'clock faces the V-door, clockwise seen from above. */
export const quarters = ['12', '3', '6', '9'] as const;
export const byQuarter = (base: string, unit: Unit, extra?: Extra): FieldDefinition[] =>
  quarters.map((quarter) => quantity(`${base}.${quarter}`, unit, extra));
