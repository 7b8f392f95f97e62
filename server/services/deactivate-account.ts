import { IsNull } from 'typeorm';
import { Account } from '../entities/account';
import type { AppDeps } from './deps';
import { endSessionsOf } from './end-sessions';

/** Closes an account: it signs in no more, its open sessions end now, and the record goes on naming it. */
export async function deactivateAccount(deps: AppDeps, accountId: string): Promise<void> {
  await deps.dataSource
    .getRepository(Account)
    .update({ id: accountId, deactivatedAt: IsNull() }, { deactivatedAt: deps.clock() });
  await endSessionsOf(deps.dataSource, accountId);
}
