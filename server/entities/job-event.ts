import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { JobHead } from './job-head';

/** One link of a job's chain. Rows are added and read, never changed: grants and triggers see to it. */
@Entity('job_events')
export class JobEventRow {
  @ForeignKey(() => JobHead, { name: 'job_events_head' })
  @PrimaryColumn({ name: 'job_id', type: 'char', length: 36 })
  jobId: string;

  @PrimaryColumn({ type: 'int', unsigned: true })
  seq: number;

  @Column({ name: 'command_id', type: 'char', length: 36 })
  commandId: string;

  @Column({ type: 'varchar', length: 40 })
  type: string;

  @Column({ name: 'schema_version', type: 'int', unsigned: true })
  schemaVersion: number;

  /** canonical JSON, kept as the text that was hashed */
  @Column({ type: 'mediumtext' })
  body: string;

  @Column({ name: 'prev_hash', type: 'char', length: 64 })
  prevHash: string;

  @Column({ type: 'char', length: 64 })
  hash: string;
}
