import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { Account } from './account';

/** One device that is signed in. The key is the SHA-256 of the cookie's id: who reads the table cannot sign in with it. */
@Entity('sessions')
export class SessionRow {
  @PrimaryColumn({ type: 'char', length: 64 })
  id: string;

  /** what the person sees of it in the list of devices */
  @Index('sessions_handle', { unique: true })
  @Column({ type: 'char', length: 36 })
  handle: string;

  @Index('sessions_account')
  @ForeignKey(() => Account, { name: 'sessions_account_fk' })
  @Column({ name: 'account_id', type: 'char', length: 36 })
  accountId: string;

  @Column({ type: 'mediumtext' })
  data: string;

  @Column({ name: 'user_agent', type: 'varchar', length: 200 })
  userAgent: string;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;

  @Column({ name: 'seen_at', type: 'datetime', precision: 3 })
  seenAt: Date;
}
