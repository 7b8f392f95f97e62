import { refusePin } from '../../shared/account/pin-rules';
import type { PinRefusal } from '../../shared/account/pin-rules';
import { Account } from '../entities/account';
import { checkOwnPassword } from './check-own-password';
import type { OwnPasswordRefusal } from './check-own-password';
import type { AppDeps } from './deps';
import { hashPin } from './secrets';

export type ChangePinAnswer = { ok: true } | OwnPasswordRefusal | { ok: false; code: `pin.${PinRefusal}` };

/** Sets the signing PIN, under the password. */
export async function changePin(
  deps: AppDeps,
  accountId: string,
  { password, pin }: { password: string; pin: string },
): Promise<ChangePinAnswer> {
  const checked = await checkOwnPassword(deps, accountId, password);
  if (!checked.ok) return checked;
  const refusal = refusePin(pin);
  if (refusal) return { ok: false, code: `pin.${refusal}` };
  const pinHash = await hashPin(deps.keys.pin, accountId, pin);
  await deps.dataSource.getRepository(Account).update({ id: accountId }, { pinHash });
  return { ok: true };
}
