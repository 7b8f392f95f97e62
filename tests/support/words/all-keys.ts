import en from '../../../shared/locales/en';
import type { Messages } from '../../../shared/locales/say';

const isSentence = (found: string | Messages): boolean => typeof found === 'string' || 'other' in found;

const leaves = (messages: Messages, before: string): string[] =>
  Object.entries(messages).flatMap(([name, found]) => {
    const key = before === '' ? name : `${before}.${name}`;
    // `other` alone is a choice like any; a pair of one and many is one sentence
    return typeof found === 'string' || (isSentence(found) && 'one' in found) ? [key] : leaves(found, key);
  });

/** Every key that the house has words for; one and many count as one. */
export const allKeys = (): string[] => leaves(en, '');

/** The sentences of a key: one, or one for one and one for many. */
export const sentencesOf = (key: string): string[] => {
  let at: string | Messages | undefined = en as Messages;
  for (const name of key.split('.')) at = typeof at === 'object' && Object.hasOwn(at, name) ? at[name] : undefined;
  if (at === undefined || typeof at === 'string') return at === undefined ? [] : [at];
  return [at['one'], at['other']].filter((one): one is string => typeof one === 'string');
};

/** What has to be put into a sentence; the choice between one and many needs a count. */
export const paramsOf = (key: string): string[] => {
  const sentences = sentencesOf(key);
  const named = sentences.flatMap((sentence) => [...sentence.matchAll(/\{(\w+)\}/g)].map((match) => match[1] ?? ''));
  return [...new Set(sentences.length > 1 ? ['count', ...named] : named)];
};
