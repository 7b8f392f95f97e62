import { formatISO, subDays } from 'date-fns';
import { Account } from '../entities/account';
import { AccountRole } from '../entities/account-role';
import { OperatorGrant } from '../entities/operator-grant';
import type { AppDeps } from '../services/deps';
import { hashPassword, hashPin } from '../services/secrets';
import { demoOperators } from './operators';
import { demoPeople } from './people';

/** The accounts of the invented scenario; the operators that they are granted must be there. */
export async function loadDemoPeople({
  dataSource,
  clock,
  keys,
}: Pick<AppDeps, 'dataSource' | 'clock' | 'keys'>): Promise<void> {
  const now = clock();
  const accounts = await Promise.all(
    demoPeople.map(async ({ id, name, email, password, pin, qualifications }) => ({
      id,
      name,
      email,
      passwordHash: await hashPassword(password),
      passwordChangedAt: now,
      pinHash: await hashPin(keys.pin, id, pin),
      qualifications: JSON.stringify(
        qualifications.map(({ process, usedDaysAgo }) => ({
          process,
          lastUsed: formatISO(subDays(now, usedDaysAgo), { representation: 'date' }),
        })),
      ),
      demo: true,
      createdAt: now,
      deactivatedAt: null,
    })),
  );
  const granted = (operator: string) => demoOperators.filter((each) => each.name === operator);
  await dataSource.transaction(async (manager) => {
    await manager.insert(Account, accounts);
    await manager.insert(
      AccountRole,
      demoPeople.flatMap(({ id, roles }) => roles.map((role) => ({ accountId: id, role }))),
    );
    await manager.insert(
      OperatorGrant,
      demoPeople.flatMap(({ id, grants }) =>
        grants.flatMap(granted).map((each) => ({ accountId: id, operatorId: each.id })),
      ),
    );
  });
}
