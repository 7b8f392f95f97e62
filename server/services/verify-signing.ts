import { Account } from '../entities/account';
import { forgetAttempts, takeAttempt } from './attempts';
import type { AppDeps } from './deps';
import { passwordMatches, pinMatches } from './secrets';

/** How long a session that had the password is a continuous one (21 CFR 11.200): the PIN alone signs in it. */
export const signingFreshMs = 12 * 3_600_000;

export type SigningAnswer =
  | { ok: true; components: 'pin' | 'password-and-pin' }
  | { ok: false; code: 'signing.pin-wrong' | 'signing.password-needed' | 'signing.no-pin' }
  | { ok: false; code: 'signing.locked'; retryAfter: number };

/**
 * Checks the secrets of a signature. Call it before the job's row is locked and outside its transaction: failures are
 * counted whatever becomes of the command. After `password-and-pin` the session counts as opened with the password now.
 * @param secrets as they came beside the command, in no body that is kept
 * @param session when it last had the password, ISO 8601
 */
export async function verifySigning(
  { dataSource, keys, clock }: AppDeps,
  accountId: string,
  secrets: { pin?: string; password?: string },
  session: { passwordAt: string | null },
): Promise<SigningAnswer> {
  const now = clock();
  const fresh = session.passwordAt !== null && now.getTime() - Date.parse(session.passwordAt) < signingFreshMs;
  if (!fresh && secrets.password === undefined) return { ok: false, code: 'signing.password-needed' };
  const account = await dataSource.getRepository(Account).findOneBy({ id: accountId });
  if (!account?.pinHash) return { ok: false, code: 'signing.no-pin' };
  if (secrets.pin === undefined) return { ok: false, code: 'signing.pin-wrong' };
  const wait = await takeAttempt(dataSource, 'signing', accountId, now);
  if (wait !== null) return { ok: false, code: 'signing.locked', retryAfter: wait };
  const pinIsRight = await pinMatches(keys.pin, accountId, account.pinHash, secrets.pin);
  const passwordIsRight =
    secrets.password === undefined || (await passwordMatches(account.passwordHash, secrets.password));
  if (!pinIsRight || !passwordIsRight) return { ok: false, code: 'signing.pin-wrong' };
  await forgetAttempts(dataSource, 'signing', accountId);
  return { ok: true, components: secrets.password === undefined ? 'pin' : 'password-and-pin' };
}
