import { Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { Account } from './account';

/** One role of one account. */
@Entity('account_roles')
export class AccountRole {
  @ForeignKey(() => Account, { name: 'account_roles_account' })
  @PrimaryColumn({ name: 'account_id', type: 'char', length: 36 })
  accountId: string;

  @PrimaryColumn({ type: 'varchar', length: 20 })
  role: string;
}
