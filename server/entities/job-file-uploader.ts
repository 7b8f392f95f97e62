import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { Account } from './account';

/** Everybody who sent a file to a job: a command may name only files that its own actor sent. */
@Entity('job_file_uploaders')
export class JobFileUploader {
  @PrimaryColumn({ name: 'job_id', type: 'char', length: 36 })
  jobId: string;

  @PrimaryColumn({ type: 'char', length: 64 })
  sha256: string;

  @ForeignKey(() => Account, { name: 'job_file_uploaders_account' })
  @PrimaryColumn({ name: 'account_id', type: 'char', length: 36 })
  accountId: string;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;
}
