import { createHash, randomBytes } from 'node:crypto';
import { chmodSync, existsSync, lstatSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { Unmet } from './fail.mjs';
import { dataFolder } from './paths.mjs';

/** A Unix socket's path may be this long, its end marker included (sun_path of Linux holds 108 bytes). */
const longestSocketPath = 107;

/**
 * A private folder for the socket under the system's temporary folder, named after the data folder:
 * a socket beside the data would be too long as soon as the project lies a few folders deep.
 */
function socketFolder(folder) {
  const name = `headfast-${createHash('sha256').update(folder).digest('hex').slice(0, 10)}`;
  const uid = process.getuid?.() ?? 0;
  const base = [os.tmpdir(), '/tmp'].find((each) => path.join(each, name, 'db.sock').length <= longestSocketPath);
  const place = path.join(base ?? '/tmp', name);
  mkdirSync(place, { recursive: true, mode: 0o700 });
  const stat = lstatSync(place);
  if (!stat.isDirectory() || stat.uid !== uid) throw new Unmet(`${place} belongs to somebody else; remove it first.`);
  chmodSync(place, 0o700);
  return place;
}

/** Every path that one database server uses. */
export function databaseFiles(name) {
  const folder = path.join(dataFolder, name);
  return {
    folder,
    temporary: path.join(dataFolder, `${name}-tmp`),
    users: path.join(dataFolder, `${name}-users`),
    log: path.join(dataFolder, `${name}.log`),
    lock: path.join(dataFolder, `${name}.lock`),
    settings: path.join(dataFolder, name === 'mariadb' ? 'database.json' : `${name}.json`),
    socket: path.join(socketFolder(folder), 'db.sock'),
    pid: path.join(dataFolder, `${name}.pid`),
  };
}

const password = () => randomBytes(24).toString('base64url');

/** Port and passwords of this installation, made at the first start and readable by its owner only. */
export function readSettings(file) {
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  return {
    port: 0,
    owner: { user: 'headfast_owner', password: password() },
    app: { user: 'headfast_app', password: password() },
  };
}

/** Writes the settings in one step: a reader sees the old file or the new one, never half of it. */
export function writeSettings(file, settings) {
  const draft = `${file}.${process.pid}.new`;
  writeFileSync(draft, `${JSON.stringify(settings, null, 2)}\n`, { mode: 0o600 });
  renameSync(draft, file);
}
