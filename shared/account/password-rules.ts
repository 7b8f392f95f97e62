import { commonPasswords } from './common-passwords';

export type PasswordRefusal = 'too-short' | 'too-long' | 'common' | 'too-simple' | 'contains-you';

export const passwordLength = { min: 15, max: 200 } as const;

/**
 * Why a password is refused, or null. Length and a blocklist, no rules of composition (NIST SP 800-63B-4, 3.1.1.2);
 * length counts characters as a person sees them typed, so an emoji is one.
 * @param about e-mail address and name of its owner: a password that holds a part of either is the first one guessed
 */
export function refusePassword(password: string, about: { email: string; name: string }): PasswordRefusal | null {
  const characters = [...password.normalize('NFKC')];
  if (characters.length < passwordLength.min) return 'too-short';
  if (characters.length > passwordLength.max) return 'too-long';
  const plain = characters.join('').toLowerCase();
  if (new Set(characters).size < 5 || isRun(plain)) return 'too-simple';
  const letters = plain.replace(/[^\p{L}\p{N}]/gu, '');
  if (commonPasswords.some((each) => letters === each || letters.replaceAll(each, '').length < 5)) return 'common';
  const parts = [about.email.split('@')[0] ?? '', ...about.name.split(/\s+/)].map((part) => part.toLowerCase());
  return parts.some((part) => part.length >= 4 && plain.includes(part)) ? 'contains-you' : null;
}

/** Characters that follow each other, up or down, from the first to the last but a few: abcdefgh..., 9876... */
function isRun(word: string): boolean {
  let steps = 0;
  for (let at = 1; at < word.length; at += 1) {
    if (Math.abs(word.charCodeAt(at) - word.charCodeAt(at - 1)) === 1) steps += 1;
  }
  return steps >= word.length - 4;
}
