import { Entity, Index, PrimaryColumn } from 'typeorm';

/** Who is on which job in which role. A projection of the events. */
@Entity('job_people_view')
@Index('job_people_view_account', ['accountId', 'role', 'jobId'])
export class JobPersonView {
  @PrimaryColumn({ name: 'job_id', type: 'char', length: 36 })
  jobId: string;

  @PrimaryColumn({ name: 'account_id', type: 'char', length: 36 })
  accountId: string;

  @PrimaryColumn({ type: 'varchar', length: 20 })
  role: string;
}
