import type { MigrationInterface, QueryRunner } from 'typeorm';

/** In the words in which MariaDB reads it back, so that no difference to the entities is seen where there is none. */
const kept = 'ON DELETE NO ACTION ON UPDATE NO ACTION';

const tables = [
  `CREATE TABLE accounts (
    id char(36) NOT NULL,
    email varchar(254) NOT NULL,
    name varchar(120) NOT NULL,
    password_hash varchar(255) NOT NULL,
    password_changed_at datetime(3) NOT NULL,
    pin_hash varchar(255) NULL,
    language varchar(5) NOT NULL DEFAULT 'en',
    units varchar(10) NOT NULL DEFAULT 'imperial',
    theme varchar(10) NOT NULL DEFAULT 'system',
    qualifications mediumtext NOT NULL,
    demo tinyint NOT NULL DEFAULT 0,
    created_at datetime(3) NOT NULL,
    deactivated_at datetime(3) NULL,
    PRIMARY KEY (id),
    UNIQUE INDEX accounts_email (email)
  ) ENGINE=InnoDB`,
  `CREATE TABLE operators (
    id char(36) NOT NULL,
    name varchar(120) NOT NULL,
    PRIMARY KEY (id),
    UNIQUE INDEX operators_name (name)
  ) ENGINE=InnoDB`,
  `CREATE TABLE account_roles (
    account_id char(36) NOT NULL,
    role varchar(20) NOT NULL,
    PRIMARY KEY (account_id, role),
    CONSTRAINT account_roles_account FOREIGN KEY (account_id) REFERENCES accounts (id) ${kept}
  ) ENGINE=InnoDB`,
  `CREATE TABLE operator_grants (
    account_id char(36) NOT NULL,
    operator_id char(36) NOT NULL,
    PRIMARY KEY (account_id, operator_id),
    CONSTRAINT operator_grants_account FOREIGN KEY (account_id) REFERENCES accounts (id) ${kept},
    CONSTRAINT operator_grants_operator FOREIGN KEY (operator_id) REFERENCES operators (id) ${kept}
  ) ENGINE=InnoDB`,
  `CREATE TABLE rigs (
    id char(36) NOT NULL,
    operator_id char(36) NOT NULL,
    name varchar(120) NOT NULL,
    zone varchar(64) NOT NULL,
    PRIMARY KEY (id),
    UNIQUE INDEX rigs_name (operator_id, name),
    CONSTRAINT rigs_operator FOREIGN KEY (operator_id) REFERENCES operators (id) ${kept}
  ) ENGINE=InnoDB`,
  `CREATE TABLE catalogue_items (
    id char(36) NOT NULL,
    kind varchar(20) NOT NULL,
    name varchar(160) NOT NULL,
    body mediumtext NOT NULL,
    retired_at datetime(3) NULL,
    PRIMARY KEY (id),
    UNIQUE INDEX catalogue_items_name (kind, name)
  ) ENGINE=InnoDB`,
  `CREATE TABLE sessions (
    id char(64) NOT NULL,
    handle char(36) NOT NULL,
    account_id char(36) NOT NULL,
    data mediumtext NOT NULL,
    user_agent varchar(200) NOT NULL,
    created_at datetime(3) NOT NULL,
    seen_at datetime(3) NOT NULL,
    PRIMARY KEY (id),
    UNIQUE INDEX sessions_handle (handle),
    INDEX sessions_account (account_id),
    CONSTRAINT sessions_account_fk FOREIGN KEY (account_id) REFERENCES accounts (id) ${kept}
  ) ENGINE=InnoDB`,
  `CREATE TABLE attempt_throttles (
    bucket char(64) NOT NULL,
    failures int UNSIGNED NOT NULL,
    locked_until datetime(3) NULL,
    last_at datetime(3) NOT NULL,
    PRIMARY KEY (bucket)
  ) ENGINE=InnoDB`,
];

/** Accounts with roles, grants and sessions, and what new jobs are made from. */
export class AccountsAndCatalogue0001 implements MigrationInterface {
  readonly name = 'AccountsAndCatalogue1700000000001';

  async up(runner: QueryRunner): Promise<void> {
    for (const table of tables) await runner.query(table);
  }

  async down(runner: QueryRunner): Promise<void> {
    const names = 'attempt_throttles sessions catalogue_items rigs operator_grants account_roles operators accounts';
    for (const name of names.split(' ')) await runner.query(`DROP TABLE ${name}`);
  }
}
