import { getCurrentInstance } from 'vue';
import { printDay, printInstant } from '../../shared/locales/print-instant';
import { hasWords, say as sayIn, type Formatters } from '../../shared/locales/say';
import type { Text, TextParam } from '../../shared/locales/text';
import { printQuantity, quantityParts } from '../../shared/units/format';
import type { PrintedQuantity } from '../../shared/units/print-amount';
import { usePreferencesStore } from '../stores/preferences';
import { useMessages } from './language';
import { useSiteZone } from './site-zone';

export interface Sayer {
  /** A text, or a key with its params, in the reader's language, units and the site's time. */
  say(text: Text | string, params?: Readonly<Record<string, TextParam>>): string;
  /** Whether there are words for a key. */
  has(key: string): boolean;
  /** `02 Mar 2026 03:10`. */
  instant(iso: string): string;
  /** `14 3/8 in`, from the decimal string and unit code of the record. */
  quantity(quantity: string, unit: string, difference?: true): string;
  /** The same in two pieces, where the unit is set in the muted ink. */
  parts(quantity: string, unit: string, difference?: true): PrintedQuantity;
}

/** Says texts the reader's way. Use it in `setup`; what it answers follows language and units as they change. */
export function useSay(): Sayer {
  const preferences = usePreferencesStore();
  const zone = getCurrentInstance() === null ? () => 'UTC' : useSiteZone();
  const messages = useMessages();

  const instant = (iso: string) => printInstant(iso, zone(), preferences.language);
  const formatters: Formatters = {
    quantity: (value, unit, difference) => printQuantity(value, unit, preferences.units, difference),
    instant,
    day: (date) => printDay(date, preferences.language),
    number: String,
  };

  return {
    say: (text, params) => sayIn(messages.value, asText(text, params), formatters),
    has: (key) => hasWords(messages.value, key),
    instant,
    quantity: formatters.quantity,
    parts: (value, unit, difference) => quantityParts(value, unit, preferences.units, difference),
  };
}

function asText(text: Text | string, params: Text['params']): Text {
  if (typeof text !== 'string') return text;
  return params === undefined ? { key: text } : { key: text, params };
}
