import { IsNull } from 'typeorm';
import type { EntityManager } from 'typeorm';
import type { JobPerson } from '../../shared/job/plan';
import type { Role } from '../../shared/permissions';
import { Account } from '../entities/account';
import { AccountRole } from '../entities/account-role';

export type PersonFault = 'person-unknown' | 'person-without-role' | 'person-on-both-sides';

const ofTheFirm = new Set<string>(['welder', 'coordinator'] satisfies Role[]);

/**
 * Somebody as he stands on a job, from the accounts and from nowhere else. Nobody takes a role that the account does not
 * hold, and nobody is of the firm and a guest at once: he would release what his own side recorded.
 */
export async function findJobPerson(
  manager: EntityManager,
  accountId: string,
  role: Role,
): Promise<{ ok: true; person: JobPerson } | { ok: false; fault: PersonFault }> {
  const account = await manager.findOneBy(Account, { id: accountId, deactivatedAt: IsNull() });
  if (!account) return { ok: false, fault: 'person-unknown' };
  const held = (await manager.findBy(AccountRole, { accountId })).map((row) => row.role);
  if (!held.includes(role)) return { ok: false, fault: 'person-without-role' };
  if (held.some((one) => ofTheFirm.has(one)) && held.some((one) => !ofTheFirm.has(one))) {
    return { ok: false, fault: 'person-on-both-sides' };
  }
  const qualifications = JSON.parse(account.qualifications) as JobPerson['qualifications'];
  return {
    ok: true,
    person: {
      accountId: account.id,
      name: account.name,
      role,
      qualifications: role === 'welder' ? qualifications : [],
    },
  };
}
