import { Column, Entity, PrimaryColumn } from 'typeorm';

/**
 * The end of a job's chain, and the row that is locked before anything is decided. It is no projection: it says how
 * long the chain must be, so that a chain cut short is noticed.
 */
@Entity('job_heads')
export class JobHead {
  @PrimaryColumn({ name: 'job_id', type: 'char', length: 36 })
  jobId: string;

  /** number of the last event; 0 while the job is being planned */
  @Column({ type: 'int', unsigned: true })
  seq: number;

  @Column({ type: 'char', length: 64 })
  hash: string;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;
}
