import { Account } from '../entities/account';
import { forgetAttempts, takeAttempt } from './attempts';
import type { AppDeps } from './deps';
import { passwordMatches } from './secrets';

export type OwnPasswordRefusal =
  { ok: false; code: 'password.wrong' } | { ok: false; code: 'signing.locked'; retryAfter: number };

/** Asks somebody signed in for the password again; wrong ones count with those of signing. */
export async function checkOwnPassword(
  { dataSource, clock }: AppDeps,
  accountId: string,
  password: string,
): Promise<{ ok: true; account: Account } | OwnPasswordRefusal> {
  const wait = await takeAttempt(dataSource, 'signing', accountId, clock());
  if (wait !== null) return { ok: false, code: 'signing.locked', retryAfter: wait };
  const account = await dataSource.getRepository(Account).findOneBy({ id: accountId });
  if (!(await passwordMatches(account?.passwordHash ?? null, password)) || !account) {
    return { ok: false, code: 'password.wrong' };
  }
  await forgetAttempts(dataSource, 'signing', accountId);
  return { ok: true, account };
}
