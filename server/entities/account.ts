import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** A person who signs in. Accounts are deactivated, never deleted: the record names them for good. */
@Entity('accounts')
export class Account {
  @PrimaryColumn({ type: 'char', length: 36 })
  id: string;

  /** kept in lower case */
  @Index('accounts_email', { unique: true })
  @Column({ type: 'varchar', length: 254 })
  email: string;

  @Column({ type: 'varchar', length: 120 })
  name: string;

  @Column({ name: 'password_hash', type: 'varchar', length: 255 })
  passwordHash: string;

  @Column({ name: 'password_changed_at', type: 'datetime', precision: 3 })
  passwordChangedAt: Date;

  @Column({ name: 'pin_hash', type: 'varchar', length: 255, nullable: true })
  pinHash: string | null;

  @Column({ type: 'varchar', length: 5, default: 'en' })
  language: string;

  @Column({ type: 'varchar', length: 10, default: 'imperial' })
  units: string;

  @Column({ type: 'varchar', length: 10, default: 'system' })
  theme: string;

  /** processes a welder may use with the day of last use, as JSON */
  @Column({ type: 'mediumtext' })
  qualifications: string;

  /** its password is printed on a terminal: it signs in in demo mode only */
  @Column({ type: 'boolean', default: false })
  demo: boolean;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;

  @Column({ name: 'deactivated_at', type: 'datetime', precision: 3, nullable: true })
  deactivatedAt: Date | null;
}
