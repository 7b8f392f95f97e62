import type { Preferences } from '../../shared/contracts/session';
import { Account } from '../entities/account';
import type { AppDeps } from './deps';

/** Keeps how somebody wants to read: language, units, theme. */
export async function changePreferences(deps: AppDeps, accountId: string, wanted: Preferences): Promise<Preferences> {
  await deps.dataSource.getRepository(Account).update({ id: accountId }, wanted);
  return wanted;
}
