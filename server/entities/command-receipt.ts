import { Column, Entity, PrimaryColumn } from 'typeorm';

/** What was answered to a command: the same id and body get the same answer for good. */
@Entity('command_receipts')
export class CommandReceipt {
  @PrimaryColumn({ name: 'command_id', type: 'char', length: 36 })
  commandId: string;

  @Column({ name: 'account_id', type: 'char', length: 36 })
  accountId: string;

  @Column({ name: 'job_id', type: 'char', length: 36, nullable: true })
  jobId: string | null;

  /** SHA-256 over the canonical JSON of what was sent; no secret is in it */
  @Column({ name: 'body_hash', type: 'char', length: 64 })
  bodyHash: string;

  @Column({ type: 'int', unsigned: true })
  status: number;

  @Column({ type: 'mediumtext' })
  answer: string;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;
}
