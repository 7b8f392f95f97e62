import type { PointPlace } from '../../../shared/hold-points/points';
import en from '../../../shared/locales/en';
import { hasWords, say, type Formatters } from '../../../shared/locales/say';
import { printQuantity } from '../../../shared/units/format';

const formatters: Formatters = {
  quantity: (value, unit, difference) => printQuantity(value, unit, 'imperial', difference),
  instant: (iso) => iso,
  day: (date) => date,
  number: String,
};

/** A message as an English reader sees it. */
export const words = (key: string, params: Record<string, string | number> = {}): string =>
  say(en, { key, params }, formatters);

/** The title of a hold point. */
export function titleOf({ kind, pass, round }: PointPlace): string {
  const title = pass === null ? words(`points.${kind}.title`) : words('job.point.pass', { pass });
  return round === 0 ? title : words('job.point.round', { title, round });
}

/** What a field, group, shot, act or statement of a hold point is called on the screen. */
export function nameOf(place: PointPlace, area: string, key: string): string {
  const names = [key, key.replace(/\.\d+\./, '.')].map((name) => `points.${place.kind}.${area}.${name}`);
  return words(names.find((name) => hasWords(en, name)) ?? names[0] ?? key);
}

/** The same for a field's answer that is one of a few. */
export const choiceOf = (place: PointPlace, field: string, value: string): string =>
  /^\d+$/.test(value) ? value : nameOf(place, 'choices', `${field}.${value}`);

/** A text as a pattern for the beginning of an accessible name. */
export const startsWith = (text: string): RegExp => new RegExp(`^${escaped(text)}(?![\\w’-])`);

export const escaped = (text: string): string => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
