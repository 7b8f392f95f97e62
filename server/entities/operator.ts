import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** The company that owns the well. */
@Entity('operators')
export class Operator {
  @PrimaryColumn({ type: 'char', length: 36 })
  id: string;

  @Index('operators_name', { unique: true })
  @Column({ type: 'varchar', length: 120 })
  name: string;
}
