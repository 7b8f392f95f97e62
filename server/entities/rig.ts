import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { Operator } from './operator';

/** A drilling rig that works for an operator. */
@Entity('rigs')
@Index('rigs_name', ['operatorId', 'name'], { unique: true })
export class Rig {
  @PrimaryColumn({ type: 'char', length: 36 })
  id: string;

  @ForeignKey(() => Operator, { name: 'rigs_operator' })
  @Column({ name: 'operator_id', type: 'char', length: 36 })
  operatorId: string;

  @Column({ type: 'varchar', length: 120 })
  name: string;

  /** IANA zone of where it stands, offered to a new job */
  @Column({ type: 'varchar', length: 64 })
  zone: string;
}
