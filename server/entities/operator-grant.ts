import { Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { Account } from './account';
import { Operator } from './operator';

/** An operator whose sealed packets an account may read. */
@Entity('operator_grants')
export class OperatorGrant {
  @ForeignKey(() => Account, { name: 'operator_grants_account' })
  @PrimaryColumn({ name: 'account_id', type: 'char', length: 36 })
  accountId: string;

  @ForeignKey(() => Operator, { name: 'operator_grants_operator' })
  @PrimaryColumn({ name: 'operator_id', type: 'char', length: 36 })
  operatorId: string;
}
