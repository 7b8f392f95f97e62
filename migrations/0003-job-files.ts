import type { MigrationInterface, QueryRunner } from 'typeorm';

/** The files of a job, who sent them, and how many an account sends at a time. */
export class JobFiles0003 implements MigrationInterface {
  readonly name = 'JobFiles1700000000003';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE job_files (
      job_id char(36) NOT NULL,
      sha256 char(64) NOT NULL,
      type varchar(40) NOT NULL,
      bytes int unsigned NOT NULL,
      width int unsigned NULL,
      height int unsigned NULL,
      uploaded_by char(36) NOT NULL,
      created_at datetime(3) NOT NULL,
      PRIMARY KEY (job_id, sha256),
      CONSTRAINT job_files_account FOREIGN KEY (uploaded_by) REFERENCES accounts (id) ON DELETE NO ACTION ON UPDATE NO ACTION
    ) ENGINE=InnoDB`);
    await runner.query(`CREATE TABLE job_file_uploaders (
      job_id char(36) NOT NULL,
      sha256 char(64) NOT NULL,
      account_id char(36) NOT NULL,
      created_at datetime(3) NOT NULL,
      PRIMARY KEY (job_id, sha256, account_id),
      CONSTRAINT job_file_uploaders_account FOREIGN KEY (account_id) REFERENCES accounts (id) ON DELETE NO ACTION ON UPDATE NO ACTION
    ) ENGINE=InnoDB`);
    await runner.query(`CREATE TABLE upload_counts (
      account_id char(36) NOT NULL,
      window_start datetime(3) NOT NULL,
      files int unsigned NOT NULL,
      PRIMARY KEY (account_id),
      CONSTRAINT upload_counts_account FOREIGN KEY (account_id) REFERENCES accounts (id) ON DELETE NO ACTION ON UPDATE NO ACTION
    ) ENGINE=InnoDB`);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const table of ['upload_counts', 'job_file_uploaders', 'job_files']) await runner.query(`DROP TABLE ${table}`);
  }
}
