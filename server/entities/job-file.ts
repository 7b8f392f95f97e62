import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { Account } from './account';

/** A file that was taken into a job: once per job, whoever sends it again. The bytes lie in the storage. */
@Entity('job_files')
export class JobFile {
  @PrimaryColumn({ name: 'job_id', type: 'char', length: 36 })
  jobId: string;

  @PrimaryColumn({ type: 'char', length: 64 })
  sha256: string;

  /** content type, found by content */
  @Column({ type: 'varchar', length: 40 })
  type: string;

  @Column({ type: 'int', unsigned: true })
  bytes: number;

  /** pixels of the upright picture; null for a recorder's file */
  @Column({ type: 'int', unsigned: true, nullable: true })
  width: number | null;

  @Column({ type: 'int', unsigned: true, nullable: true })
  height: number | null;

  /** who sent it first */
  @ForeignKey(() => Account, { name: 'job_files_account' })
  @Column({ name: 'uploaded_by', type: 'char', length: 36 })
  uploadedBy: string;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;
}
