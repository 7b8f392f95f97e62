import { Account } from '../entities/account';
import { forgetAttempts, giveBackAttempt, takeAttempt } from './attempts';
import type { AppDeps } from './deps';
import { networkOf } from './network-of';
import { passwordMatches } from './secrets';

export type SignInAnswer =
  | { ok: true; accountId: string }
  | { ok: false; code: 'sign-in.refused' }
  | { ok: false; code: 'sign-in.locked'; retryAfter: number };

/** The form in which an e-mail address is stored and looked for. */
export const plainEmail = (typed: string): string => typed.trim().toLowerCase();

/**
 * Checks e-mail and password. Unknown address, wrong password, deactivated account and a demo account outside demo mode
 * are answered alike and take alike; tries are counted by address typed and by address on the network.
 */
export async function checkSignIn(
  { dataSource, config, clock }: AppDeps,
  typed: { email: string; password: string; address: string },
): Promise<SignInAnswer> {
  const email = plainEmail(typed.email);
  const network = networkOf(typed.address);
  const wait =
    (await takeAttempt(dataSource, 'signInAddress', network, clock())) ??
    (await takeAttempt(dataSource, 'signInAccount', email, clock()));
  if (wait !== null) return { ok: false, code: 'sign-in.locked', retryAfter: wait };
  const found = await dataSource.getRepository(Account).findOneBy({ email });
  // the database takes letters with and without an accent for the same; each such spelling would have its own count of tries
  const account = found?.email === email ? found : null;
  const matches = await passwordMatches(account?.passwordHash ?? null, typed.password);
  if (!matches || !account || account.deactivatedAt || (account.demo && !config.demo)) {
    return { ok: false, code: 'sign-in.refused' };
  }
  await forgetAttempts(dataSource, 'signInAccount', email);
  await giveBackAttempt(dataSource, 'signInAddress', network);
  return { ok: true, accountId: account.id };
}
