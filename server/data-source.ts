import 'reflect-metadata';
import { DataSource } from 'typeorm';
import type { MysqlDriver } from 'typeorm/driver/mysql/MysqlDriver.js';
import { migrations } from '../migrations';
import type { Config } from './config';
import { entities } from './entities';

/** The database does not keep what the house promises; the server does not start on it. */
export class UnfitDatabase extends Error {}

/**
 * The connection to MariaDB, not yet opened.
 * @param as `app` for the server; `owner` for migrations and grants
 */
export function makeDataSource(config: Config, as: 'app' | 'owner' = 'app'): DataSource {
  const { host, port, name, user, password, ownerUser, ownerPassword, pool } = config.database;
  return new DataSource({
    type: 'mariadb',
    host,
    port,
    database: name,
    username: as === 'app' ? user : (ownerUser ?? user),
    password: as === 'app' ? password : (ownerPassword ?? password),
    charset: 'utf8mb4_unicode_ci',
    timezone: 'Z',
    dateStrings: ['DATE'],
    supportBigNumbers: true,
    bigNumberStrings: true,
    connectTimeout: 5_000,
    // migrations hold one connection for their lock while another works
    poolSize: as === 'owner' ? Math.max(2, pool) : pool,
    isolationLevel: 'READ COMMITTED',
    entities,
    migrations,
    migrationsTableName: 'migrations',
    synchronize: false,
    logging: false,
  });
}

interface Pool {
  on(event: 'connection', listener: (connection: { query(sql: string): void }) => void): void;
}

/** Opens the connection, makes every pooled one READ COMMITTED, and checks what durability and times rest on. */
export async function openDataSource(dataSource: DataSource): Promise<DataSource> {
  await dataSource.initialize();
  try {
    const { pool } = dataSource.driver as MysqlDriver as unknown as { pool: Pool };
    pool.on('connection', (connection) => connection.query('SET SESSION TRANSACTION ISOLATION LEVEL READ COMMITTED'));
    await checkPromises(dataSource);
  } catch (error) {
    await dataSource.destroy();
    throw error;
  }
  return dataSource;
}

/** Refuses a server that may lose an acknowledged commit, or whose clock would move the times of the record. */
export async function checkPromises(dataSource: DataSource): Promise<void> {
  const [found] = await dataSource.query<Record<'flush' | 'zone' | 'mode', string | number>[]>(
    'SELECT @@GLOBAL.innodb_flush_log_at_trx_commit AS flush, @@SESSION.time_zone AS zone, @@SESSION.sql_mode AS mode',
  );
  if (Number(found?.flush) !== 1) {
    throw new UnfitDatabase(
      'MariaDB must run with innodb_flush_log_at_trx_commit=1: what is acknowledged must be on disk.',
    );
  }
  if (found?.zone !== '+00:00') {
    throw new UnfitDatabase('MariaDB must run with default-time-zone=+00:00: every time of the record is UTC.');
  }
  if (!String(found?.mode).includes('STRICT_TRANS_TABLES')) {
    throw new UnfitDatabase('MariaDB must run in strict mode: it must refuse what does not fit, not cut it.');
  }
}
