import { refusePassword } from '../../shared/account/password-rules';
import type { PasswordRefusal } from '../../shared/account/password-rules';
import { Account } from '../entities/account';
import { checkOwnPassword } from './check-own-password';
import type { OwnPasswordRefusal } from './check-own-password';
import type { AppDeps } from './deps';
import { endSessionsOf } from './end-sessions';
import { hashPassword } from './secrets';

export type ChangePasswordAnswer =
  { ok: true } | OwnPasswordRefusal | { ok: false; code: `password.${PasswordRefusal}` };

/** Gives an account another password and ends all its sessions; the caller opens a new one for this device. */
export async function changePassword(
  deps: AppDeps,
  accountId: string,
  { current, next }: { current: string; next: string },
): Promise<ChangePasswordAnswer> {
  const checked = await checkOwnPassword(deps, accountId, current);
  if (!checked.ok) return checked;
  const refusal = refusePassword(next, checked.account);
  if (refusal) return { ok: false, code: `password.${refusal}` };
  const passwordHash = await hashPassword(next);
  await deps.dataSource
    .getRepository(Account)
    .update({ id: accountId }, { passwordHash, passwordChangedAt: deps.clock() });
  await endSessionsOf(deps.dataSource, accountId);
  return { ok: true };
}
