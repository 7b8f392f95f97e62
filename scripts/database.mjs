import { mkdirSync, rmSync, readFileSync, writeFileSync } from 'node:fs';
import { setTimeout as wait } from 'node:timers/promises';
import { databaseFiles, readSettings, writeSettings } from './database-files.mjs';
import { Unmet } from './fail.mjs';
import { anyFreePort, portIsFree } from './free-port.mjs';
import { ensureDebianPackage } from './install.mjs';
import { isAlive, signIn, signOutAndSeeOthers } from './live-pids.mjs';
import { administer, runningServer, startServer, stopServer } from './mariadb-process.mjs';
import { dataFolder } from './paths.mjs';

/** Only one process at a time starts or stops a database server; a lock left by a dead one is taken over. */
async function alone(files, work) {
  for (let tries = 0; ; tries += 1) {
    try {
      writeFileSync(files.lock, String(process.pid), { flag: 'wx' });
      break;
    } catch (error) {
      if (error.code !== 'EEXIST') throw error;
      if (tries > 1200) throw new Unmet(`Another process holds ${files.lock}. Remove it when none is running.`);
      const holder = Number(readFileSync(files.lock, { encoding: 'utf8', flag: 'a+' }));
      if (holder > 0 && !isAlive(holder)) rmSync(files.lock, { force: true });
      else await wait(50);
    }
  }
  try {
    return await work();
  } finally {
    rmSync(files.lock, { force: true });
  }
}

/** A database with its owner (migrations); what the application may do is granted table by table afterwards. */
function makeDatabase(files, settings, database) {
  const account = ({ user, password }) =>
    `CREATE USER IF NOT EXISTS '${user}'@'127.0.0.1' IDENTIFIED BY '${password}';
     ALTER USER '${user}'@'127.0.0.1' IDENTIFIED BY '${password}';`;
  administer(
    files,
    `CREATE DATABASE IF NOT EXISTS \`${database}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci;
     ${account(settings.owner)}
     ${account(settings.app)}
     GRANT ALL PRIVILEGES ON \`${database}\`.* TO '${settings.owner.user}'@'127.0.0.1' WITH GRANT OPTION;`,
  );
}

/** The environment that tells the server where its database is; the owner's account goes to migrations only. */
function environmentOf(settings, database) {
  return {
    DATABASE_HOST: '127.0.0.1',
    DATABASE_PORT: String(settings.port),
    DATABASE_NAME: database,
    DATABASE_USER: settings.app.user,
    DATABASE_PASSWORD: settings.app.password,
  };
}

/** What can be done with a running database server. */
function handleOf(files, settings) {
  return {
    port: settings.port,
    owner: settings.owner,
    app: settings.app,
    createDatabase: (database) => makeDatabase(files, settings, database),
    dropDatabase: (database) => void administer(files, `DROP DATABASE IF EXISTS \`${database}\`;`),
    administer: (statements) => administer(files, statements),
    environment: (database) => environmentOf(settings, database),
    ownerEnvironment: (database) => ({
      ...environmentOf(settings, database),
      DATABASE_OWNER_USER: settings.owner.user,
      DATABASE_OWNER_PASSWORD: settings.owner.password,
    }),
    close: () =>
      alone(files, async () => {
        if (!signOutAndSeeOthers(files.users)) await stopServer(files);
      }),
  };
}

/**
 * Starts the project's own MariaDB, or joins it when it runs already. The last one to close it stops it.
 * @param {string} [name] folder under .data: `mariadb` for work, `test-mariadb` for tests
 */
export async function openDatabase(name = 'mariadb') {
  await ensureDebianPackage('mariadb-server', ['mariadbd', 'mariadb-install-db', 'mariadb', 'mariadb-admin']);
  mkdirSync(dataFolder, { recursive: true, mode: 0o700 });
  const files = databaseFiles(name);
  const settings = await alone(files, async () => {
    const found = readSettings(files.settings);
    if (runningServer(files) === undefined) {
      const keeps = found.port > 0 && (await portIsFree(found.port));
      if (!keeps) found.port = await anyFreePort();
      writeSettings(files.settings, found);
      await startServer(files, found.port);
    }
    signIn(files.users);
    return found;
  });
  return handleOf(files, settings);
}

/** The server that another process of this run holds open; it is not kept alive by this one. */
export function runningDatabase(name = 'mariadb') {
  const files = databaseFiles(name);
  if (runningServer(files) === undefined) throw new Unmet(`The database ${name} does not run.`);
  return handleOf(files, readSettings(files.settings));
}
