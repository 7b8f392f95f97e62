import type { MigrationInterface, QueryRunner } from 'typeorm';

const tables = [
  `CREATE TABLE job_heads (
    job_id char(36) NOT NULL,
    seq int UNSIGNED NOT NULL,
    hash char(64) NOT NULL,
    created_at datetime(3) NOT NULL,
    PRIMARY KEY (job_id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE job_events (
    job_id char(36) NOT NULL,
    seq int UNSIGNED NOT NULL,
    command_id char(36) NOT NULL,
    type varchar(40) NOT NULL,
    schema_version int UNSIGNED NOT NULL,
    body mediumtext NOT NULL,
    prev_hash char(64) NOT NULL,
    hash char(64) NOT NULL,
    PRIMARY KEY (job_id, seq),
    CONSTRAINT job_events_head FOREIGN KEY (job_id) REFERENCES job_heads (job_id) ON DELETE NO ACTION ON UPDATE NO ACTION
  ) ENGINE=InnoDB`,
  `CREATE TABLE command_receipts (
    command_id char(36) NOT NULL,
    account_id char(36) NOT NULL,
    job_id char(36) NULL,
    body_hash char(64) NOT NULL,
    status int UNSIGNED NOT NULL,
    answer mediumtext NOT NULL,
    created_at datetime(3) NOT NULL,
    PRIMARY KEY (command_id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE jobs_view (
    id char(36) NOT NULL,
    operator_id varchar(200) NOT NULL,
    operator varchar(200) NOT NULL,
    rig varchar(200) NOT NULL,
    well varchar(200) NOT NULL,
    zone varchar(200) NOT NULL,
    casing varchar(260) NOT NULL,
    head varchar(200) NOT NULL,
    status varchar(12) NOT NULL,
    point varchar(60) NULL,
    point_status varchar(12) NULL,
    strip mediumtext NOT NULL,
    waits_for varchar(20) NULL,
    hot tinyint NOT NULL,
    stopped tinyint NOT NULL,
    concessions int UNSIGNED NOT NULL,
    reopenings int UNSIGNED NOT NULL,
    planned_at datetime(3) NOT NULL,
    moved_at datetime(3) NOT NULL,
    ended_at datetime(3) NULL,
    seq int UNSIGNED NOT NULL,
    search varchar(1000) NOT NULL,
    PRIMARY KEY (id),
    INDEX jobs_view_moved (status, moved_at, id),
    INDEX jobs_view_ended (ended_at, id),
    INDEX jobs_view_operator (operator_id, ended_at, id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE job_people_view (
    job_id char(36) NOT NULL,
    account_id char(36) NOT NULL,
    role varchar(20) NOT NULL,
    PRIMARY KEY (job_id, account_id, role),
    INDEX job_people_view_account (account_id, role, job_id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE desk_view (
    job_id char(36) NOT NULL,
    point varchar(60) NOT NULL,
    owner_role varchar(20) NOT NULL,
    presented_at datetime(3) NOT NULL,
    presented_by varchar(200) NOT NULL,
    hot tinyint NOT NULL,
    outside int UNSIGNED NOT NULL,
    unconceded int UNSIGNED NOT NULL,
    PRIMARY KEY (job_id),
    INDEX desk_view_wait (hot, presented_at, job_id)
  ) ENGINE=InnoDB`,
];

/** The chain of every job with its head and receipts, and the projections that lists are read from. */
export class Jobs0002 implements MigrationInterface {
  readonly name = 'Jobs1700000000002';

  async up(runner: QueryRunner): Promise<void> {
    for (const table of tables) await runner.query(table);
  }

  async down(runner: QueryRunner): Promise<void> {
    const names = 'desk_view job_people_view jobs_view command_receipts job_events job_heads';
    for (const name of names.split(' ')) await runner.query(`DROP TABLE ${name}`);
  }
}
