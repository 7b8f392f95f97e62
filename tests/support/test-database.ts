import type { DataSource } from 'typeorm';
import { runningDatabase } from '../../scripts/database.mjs';
import { readConfig } from '../../server/config';
import type { Config } from '../../server/config';
import { makeDataSource, openDataSource } from '../../server/data-source';
import { migrateDatabase } from '../../server/migrate-database';
import { aFolder } from './a-folder';

export interface TestDatabase {
  /** as the application signs in: reading and adding only on event tables */
  app: DataSource;
  /** as migrations sign in */
  owner: DataSource;
  config: Config;
  environment: Record<string, string>;
  drop(): Promise<void>;
}

let made = 0;

/** A database of its own, migrated and empty, on the MariaDB of this run. */
export async function aDatabase(settings: Record<string, string> = {}, port?: number): Promise<TestDatabase> {
  const server = runningDatabase('test-mariadb');
  made += 1;
  const name = `headfast${process.pid}x${made}`;
  server.createDatabase(name);
  const folder = aFolder();
  const environment = {
    ...server.ownerEnvironment(name),
    HEADFAST_HOME: folder.path,
    DATABASE_POOL: '10',
    LOG_LEVEL: 'silent',
    DEMO: '1',
    ...settings,
    ...(port !== undefined && { DATABASE_PORT: String(port) }),
  };
  const config = readConfig(environment);
  const direct = readConfig({ ...environment, DATABASE_PORT: String(server.port) });
  const owner = await makeDataSource(direct, 'owner').initialize();
  await migrateDatabase(owner, config.database.user);
  const app = await openDataSource(makeDataSource(config));
  return {
    app,
    owner,
    config,
    environment,
    drop: async () => {
      if (app.isInitialized) await app.destroy();
      await owner.destroy();
      server.dropDatabase(name);
      folder.remove();
    },
  };
}
