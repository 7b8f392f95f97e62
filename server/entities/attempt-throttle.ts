import { Column, Entity, PrimaryColumn } from 'typeorm';

/** How often something secret was tried in a row: by account, by address, by signer. */
@Entity('attempt_throttles')
export class AttemptThrottle {
  /** SHA-256 of what is counted, so that no address or e-mail stands here in the clear */
  @PrimaryColumn({ type: 'char', length: 64 })
  bucket: string;

  @Column({ type: 'int', unsigned: true })
  failures: number;

  @Column({ name: 'locked_until', type: 'datetime', precision: 3, nullable: true })
  lockedUntil: Date | null;

  @Column({ name: 'last_at', type: 'datetime', precision: 3 })
  lastAt: Date;
}
