import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { Account } from './account';

/** How many files an account has sent in the window of time that runs now. */
@Entity('upload_counts')
export class UploadCount {
  @ForeignKey(() => Account, { name: 'upload_counts_account' })
  @PrimaryColumn({ name: 'account_id', type: 'char', length: 36 })
  accountId: string;

  @Column({ name: 'window_start', type: 'datetime', precision: 3 })
  windowStart: Date;

  @Column({ type: 'int', unsigned: true })
  files: number;
}
