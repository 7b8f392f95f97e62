import { ensureBuilt } from './build.mjs';
import { choosePort } from './choose-port.mjs';
import { openDatabase } from './database.mjs';
import { failWith } from './fail.mjs';
import { firstFreePort } from './free-port.mjs';
import { ensurePackages } from './install.mjs';
import { claimProject } from './one-at-a-time.mjs';
import { inProject } from './paths.mjs';
import { prepareDatabase } from './prepare-database.mjs';
import { startServerProcess } from './server-process.mjs';
import { untilStopped } from './until-stopped.mjs';

/** Database, server and client with hot reload, on the same data as `npm start`. */
async function develop() {
  claimProject();
  const port = await choosePort('127.0.0.1');
  await ensurePackages();
  await ensureBuilt();
  const clientPort = await firstFreePort(5173);
  const database = await openDatabase();
  let code;
  try {
    const env = { HOST: '127.0.0.1', PORT: String(port), DEMO: '1', LOG_LEVEL: process.env.LOG_LEVEL ?? 'info' };
    await prepareDatabase(database, 'headfast', env);
    const tsx = [inProject('node_modules', 'tsx', 'dist', 'cli.mjs'), 'watch', '--clear-screen=false'];
    const server = startServerProcess([...tsx, '--tsconfig', 'server/tsconfig.json', 'server/main.ts'], {
      ...env,
      ...database.environment('headfast'),
    });
    const client = startServerProcess([inProject('node_modules', 'vite', 'bin', 'vite.js')], {
      VITE_PORT: String(clientPort),
      SERVER_ADDRESS: `http://127.0.0.1:${port}`,
    });
    code = await untilStopped(server.ended, client.ended);
    await Promise.all([server.stop(), client.stop()]);
  } finally {
    await database.close();
  }
  process.exit(code);
}

develop().catch(failWith);
