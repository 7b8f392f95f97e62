import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** A hold point that has been presented and waits for its owner. A projection of the events; a job has one at most. */
@Entity('desk_view')
@Index('desk_view_wait', ['hot', 'presentedAt', 'jobId'])
export class DeskView {
  @PrimaryColumn({ name: 'job_id', type: 'char', length: 36 })
  jobId: string;

  @Column({ type: 'varchar', length: 60 })
  point: string;

  /** whose signature releases it */
  @Column({ name: 'owner_role', type: 'varchar', length: 20 })
  ownerRole: string;

  @Column({ name: 'presented_at', type: 'datetime', precision: 3 })
  presentedAt: Date;

  @Column({ name: 'presented_by', type: 'varchar', length: 200 })
  presentedBy: string;

  /** 1 while the joint is under heat */
  @Column({ type: 'boolean' })
  hot: boolean;

  /** readings outside a limit */
  @Column({ type: 'int', unsigned: true })
  outside: number;

  /** those of them that nobody has conceded yet */
  @Column({ type: 'int', unsigned: true })
  unconceded: number;
}
