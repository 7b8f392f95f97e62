import type { Text, TextParam } from './text';

/** One language's messages: areas within areas, sentences at the ends. */
export interface Messages {
  readonly [name: string]: string | Messages;
}

/** How one reader sees values: units of choice, zone of the site, marks of the language. */
export interface Formatters {
  quantity(quantity: string, unit: string, difference?: true): string;
  instant(iso: string): string;
  day(date: string): string;
  number(value: number): string;
}

/**
 * Puts a text into words.
 *
 * A message that is a pair `{ one, other }` is chosen by its param `count`. A missing message is said as its key and a
 * missing param stays in its braces: both are visible on the screen and found by tests, and neither throws.
 */
export function say(messages: Messages, text: Text, formatters: Formatters): string {
  const sentence = sentenceOf(find(messages, text.key), text.params?.['count']);
  if (sentence === undefined) return text.key;
  return sentence.replace(/\{(\w+)\}/g, (braces, name: string) => {
    const param = text.params?.[name];
    return param === undefined ? braces : inWords(messages, param, formatters);
  });
}

/** Tells whether a language has words for a key. */
export function hasWords(messages: Messages, key: string): boolean {
  return sentenceOf(find(messages, key), 1) !== undefined;
}

function find(messages: Messages, key: string): string | Messages | undefined {
  let at: string | Messages | undefined = messages;
  for (const name of key.split('.')) {
    if (at === undefined || typeof at === 'string' || !Object.hasOwn(at, name)) return undefined;
    at = at[name];
  }
  return at;
}

function sentenceOf(found: string | Messages | undefined, count: TextParam | undefined): string | undefined {
  if (found === undefined || typeof found === 'string') return found;
  const chosen = found[count === 1 ? 'one' : 'other'];
  return count !== undefined && typeof chosen === 'string' ? chosen : undefined;
}

function inWords(messages: Messages, param: TextParam, formatters: Formatters): string {
  if (typeof param === 'string') return param;
  if (typeof param === 'number') return formatters.number(param);
  if ('quantity' in param) return formatters.quantity(param.quantity, param.unit, param.difference);
  if ('instant' in param) return formatters.instant(param.instant);
  if ('day' in param) return formatters.day(param.day);
  return say(messages, param, formatters);
}
