import { spawn, spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { Unmet } from './fail.mjs';
import { findProgram } from './install.mjs';
import { isAlive } from './live-pids.mjs';

const asRoot = process.getuid?.() === 0 ? ['--user=root'] : [];
const person = os.userInfo().username;

/** The process number of the running database server of these files, if it runs. */
export function runningServer(files) {
  if (!existsSync(files.pid)) return undefined;
  const pid = Number(readFileSync(files.pid, 'utf8'));
  return Number.isInteger(pid) && pid > 0 && isAlive(pid) ? pid : undefined;
}

/** Makes the data folder; whoever owns the project is the database's administrator, through the socket alone. */
function makeDataFolder(files) {
  if (existsSync(path.join(files.folder, 'mysql'))) return;
  rmSync(files.folder, { recursive: true, force: true });
  const made = spawnSync(
    findProgram('mariadb-install-db'),
    [
      '--no-defaults',
      ...asRoot,
      `--datadir=${files.folder}`,
      '--auth-root-authentication-method=socket',
      `--auth-root-socket-user=${person}`,
      '--skip-test-db',
    ],
    { encoding: 'utf8' },
  );
  if (made.status === 0) return;
  rmSync(files.folder, { recursive: true, force: true });
  throw new Unmet(`The database's folder could not be made:\n${made.stdout}\n${made.stderr}`);
}

/**
 * Starts MariaDB on loopback and comes back when it answers. It runs in a process group of its own, so that
 * Ctrl-C reaches the command that started it and not the database, which is then stopped in order.
 */
export async function startServer(files, port) {
  makeDataFolder(files);
  mkdirSync(files.temporary, { recursive: true });
  const server = spawn(
    findProgram('mariadbd', 'mysqld'),
    [
      '--no-defaults',
      ...asRoot,
      `--datadir=${files.folder}`,
      `--socket=${files.socket}`,
      `--pid-file=${files.pid}`,
      `--tmpdir=${files.temporary}`,
      `--port=${port}`,
      '--bind-address=127.0.0.1',
      '--skip-name-resolve',
      '--character-set-server=utf8mb4',
      '--collation-server=utf8mb4_unicode_ci',
      '--default-time-zone=+00:00',
      '--innodb-flush-log-at-trx-commit=1',
      '--transaction-isolation=READ-COMMITTED',
      `--log-error=${files.log}`,
    ],
    { detached: true, stdio: 'ignore' },
  );
  let ended = false;
  server.once('exit', () => (ended = true));
  server.unref();
  for (let tries = 0; tries < 600 && !ended; tries += 1) {
    if (existsSync(files.socket) && answers(files)) return;
    await wait(100);
  }
  const log = existsSync(files.log) ? readFileSync(files.log, 'utf8').split('\n').slice(-12).join('\n') : '';
  throw new Unmet(`The database did not start. The end of ${files.log}:\n${log}`);
}

const client = (files, args, input) =>
  spawnSync(
    findProgram(...args[0]),
    ['--no-defaults', `--socket=${files.socket}`, `--user=${person}`, ...args.slice(1)],
    {
      encoding: 'utf8',
      input,
    },
  );

const answers = (files) => client(files, [['mariadb', 'mysql'], '--batch', '-e', 'SELECT 1']).status === 0;

/** Runs statements as the database's administrator; they go in by standard input because they may hold passwords. */
export function administer(files, statements) {
  const done = client(files, [['mariadb', 'mysql'], '--batch', '--skip-column-names'], statements);
  if (done.status !== 0) throw new Error(`The database refused: ${done.stderr}`);
  return done.stdout.trim();
}

/** Asks the database to end, waits until it has, and clears what it leaves when it was killed. */
export async function stopServer(files) {
  const pid = runningServer(files);
  if (pid === undefined) return;
  client(files, [['mariadb-admin', 'mysqladmin'], 'shutdown']);
  for (let tries = 0; tries < 300 && isAlive(pid); tries += 1) await wait(50);
  rmSync(files.pid, { force: true });
}
