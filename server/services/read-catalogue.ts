import { In, IsNull } from 'typeorm';
import type { Catalogue } from '../../shared/contracts/catalogue';
import type { Role } from '../../shared/permissions';
import { Account } from '../entities/account';
import { AccountRole } from '../entities/account-role';
import { CatalogueItem } from '../entities/catalogue-item';
import type { CatalogueKind } from '../entities/catalogue-item';
import { Operator } from '../entities/operator';
import { Rig } from '../entities/rig';
import type { AppDeps } from './deps';

/** Everything that a new job is made from, in the order in which a person looks for it. */
export async function readCatalogue({ dataSource }: AppDeps): Promise<Catalogue> {
  const [operators, rigs, items, accounts] = await Promise.all([
    dataSource.getRepository(Operator).find({ order: { name: 'ASC' } }),
    dataSource.getRepository(Rig).find({ order: { name: 'ASC' } }),
    dataSource.getRepository(CatalogueItem).find({ where: { retiredAt: IsNull() }, order: { name: 'ASC' } }),
    dataSource.getRepository(Account).find({ where: { deactivatedAt: IsNull() }, order: { name: 'ASC' } }),
  ]);
  const roles = await dataSource
    .getRepository(AccountRole)
    .find({ where: { accountId: In(accounts.map((account) => account.id)) }, order: { role: 'ASC' } });
  const bodies = <T>(kind: CatalogueKind) =>
    items.filter((item) => item.kind === kind).map((item) => JSON.parse(item.body) as T);
  return {
    operators: operators.map(({ id, name }) => ({
      id,
      name,
      rigs: rigs.filter((rig) => rig.operatorId === id).map((rig) => ({ id: rig.id, name: rig.name, zone: rig.zone })),
    })),
    heads: bodies('head'),
    procedures: bodies('procedure'),
    instruments: bodies('instrument'),
    people: accounts.map((account) => ({
      accountId: account.id,
      name: account.name,
      roles: roles.filter((each) => each.accountId === account.id).map((each) => each.role as Role),
      qualifications: JSON.parse(account.qualifications) as Catalogue['people'][number]['qualifications'],
    })),
  };
}
