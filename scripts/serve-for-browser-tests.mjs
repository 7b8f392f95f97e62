import { ensureBuilt } from './build.mjs';
import { openDatabase } from './database.mjs';
import { failWith, Unmet } from './fail.mjs';
import { inProject } from './paths.mjs';
import { prepareDatabase } from './prepare-database.mjs';
import { startServerProcess } from './server-process.mjs';
import { untilStopped } from './until-stopped.mjs';
import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

/** The built server with a fresh demo on a database of the tests, at PORT, until it is stopped: Playwright's web server. */
async function serve() {
  const stopped = untilStopped();
  await ensureBuilt();
  const database = await openDatabase('test-mariadb');
  const name = `headfastbrowser${process.pid}`;
  const folder = mkdtempSync(path.join(os.tmpdir(), 'headfast-browser-'));
  let code;
  try {
    const env = {
      HOST: '127.0.0.1',
      PORT: process.env.PORT ?? '4190',
      DEMO: '1',
      LOG_LEVEL: 'error',
      KEYS_DIR: path.join(folder, 'keys'),
      UPLOADS_DIR: path.join(folder, 'uploads'),
    };
    await prepareDatabase(database, name, env);
    const server = startServerProcess(['--enable-source-maps', inProject('dist', 'server', 'main.js')], {
      NODE_ENV: 'production',
      ...env,
      ...database.environment(name),
    });
    if (!(await server.ready)) throw new Unmet('The server for the browser tests did not start.');
    code = await Promise.race([stopped, server.ended]);
    await server.stop();
  } finally {
    database.dropDatabase(name);
    await database.close();
    rmSync(folder, { recursive: true, force: true });
  }
  process.exit(code);
}

serve().catch(failWith);
