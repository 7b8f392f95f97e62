import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** A job as lists show it. A projection: dropped and made again from the events at any time. */
@Entity('jobs_view')
@Index('jobs_view_moved', ['status', 'movedAt', 'id'])
@Index('jobs_view_ended', ['endedAt', 'id'])
@Index('jobs_view_operator', ['operatorId', 'endedAt', 'id'])
export class JobView {
  @PrimaryColumn({ type: 'char', length: 36 })
  id: string;

  @Column({ name: 'operator_id', type: 'varchar', length: 200 })
  operatorId: string;

  @Column({ type: 'varchar', length: 200 })
  operator: string;

  @Column({ type: 'varchar', length: 200 })
  rig: string;

  @Column({ type: 'varchar', length: 200 })
  well: string;

  /** IANA zone of the site */
  @Column({ type: 'varchar', length: 200 })
  zone: string;

  @Column({ type: 'varchar', length: 260 })
  casing: string;

  @Column({ type: 'varchar', length: 200 })
  head: string;

  @Column({ type: 'varchar', length: 12 })
  status: string;

  /** the open or presented hold point */
  @Column({ type: 'varchar', length: 60, nullable: true })
  point: string | null;

  @Column({ name: 'point_status', type: 'varchar', length: 12, nullable: true })
  pointStatus: string | null;

  /** every hold point that counts, with its status, as JSON */
  @Column({ type: 'mediumtext' })
  strip: string;

  /** whose turn it is */
  @Column({ name: 'waits_for', type: 'varchar', length: 20, nullable: true })
  waitsFor: string | null;

  /** the joint is under heat: whoever is waited for should not let it wait */
  @Column({ type: 'boolean' })
  hot: boolean;

  @Column({ type: 'boolean' })
  stopped: boolean;

  @Column({ type: 'int', unsigned: true })
  concessions: number;

  @Column({ type: 'int', unsigned: true })
  reopenings: number;

  @Column({ name: 'planned_at', type: 'datetime', precision: 3 })
  plannedAt: Date;

  @Column({ name: 'moved_at', type: 'datetime', precision: 3 })
  movedAt: Date;

  /** sealed or called off */
  @Column({ name: 'ended_at', type: 'datetime', precision: 3, nullable: true })
  endedAt: Date | null;

  @Column({ type: 'int', unsigned: true })
  seq: number;

  /** what the search field of the packets looks through */
  @Column({ type: 'varchar', length: 1000 })
  search: string;
}
