import { createHmac } from 'node:crypto';
import { hash, verify } from '@node-rs/argon2';
import type { Options } from '@node-rs/argon2';

/** Argon2id as OWASP asks for it: 19 MiB, two passes, one lane. */
const cost: Options = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** A hash of the same cost that no password matches: an unknown e-mail address takes as long as a known one. */
let nobody: Promise<string> | undefined;

export const hashPassword = (password: string): Promise<string> => hash(password.normalize('NFKC'), cost);

/** Whether a password is the one of a hash. Without a hash it takes as long and answers no. */
export async function passwordMatches(stored: string | null, password: string): Promise<boolean> {
  nobody ??= hashPassword('an account that does not exist');
  const matches = await verify(stored ?? (await nobody), password.normalize('NFKC'));
  return matches && stored !== null;
}

/** Six digits are soon tried, so what is hashed is an HMAC under a key that the database does not hold. */
const peppered = (key: Buffer, accountId: string, pin: string) =>
  createHmac('sha256', key).update(`${accountId}\n${pin}`).digest('base64');

export const hashPin = (key: Buffer, accountId: string, pin: string): Promise<string> =>
  hash(peppered(key, accountId, pin), cost);

export const pinMatches = (key: Buffer, accountId: string, stored: string, pin: string): Promise<boolean> =>
  verify(stored, peppered(key, accountId, pin));
