import { ensureBuilt } from './build.mjs';
import { choosePort, hostAndMode } from './choose-port.mjs';
import { openDatabase } from './database.mjs';
import { failWith, Unmet } from './fail.mjs';
import { ensurePackages } from './install.mjs';
import { claimProject } from './one-at-a-time.mjs';
import { inProject } from './paths.mjs';
import { prepareDatabase } from './prepare-database.mjs';
import { printDemoAccounts } from './print-demo.mjs';
import { startServerProcess } from './server-process.mjs';
import { untilStopped } from './until-stopped.mjs';

/** From a clean clone to a running installation; started again it finds its data as it left them. */
async function start() {
  claimProject();
  const { host, demo } = hostAndMode();
  const port = await choosePort(host);
  await ensurePackages();
  await ensureBuilt();
  const stopped = untilStopped();
  const database = await openDatabase();
  let code;
  try {
    const env = { HOST: host, PORT: String(port), DEMO: demo, LOG_LEVEL: process.env.LOG_LEVEL ?? 'warn' };
    await prepareDatabase(database, 'headfast', env);
    const entry = ['--enable-source-maps', inProject('dist', 'server', 'main.js')];
    const server = startServerProcess(entry, { NODE_ENV: 'production', ...env, ...database.environment('headfast') });
    if (!(await Promise.race([server.ready, stopped.then(() => true)]))) throw new Unmet('The server did not start.');
    const secure = process.env.TLS_CERT ? 'https' : 'http';
    const address = `${secure}://${host.includes(':') ? `[${host}]` : host}:${port}`;
    if (demo === '1' && secure === 'http') await printDemoAccounts(address);
    console.log(`\nHeadfast is ready at ${process.env.PUBLIC_ORIGIN ?? address}\nCtrl-C stops it; the data stay.\n`);
    code = await Promise.race([stopped, server.ended]);
    console.log('\nStopping ...');
    await server.stop();
  } finally {
    await database.close();
  }
  process.exit(code);
}

start().catch(failWith);
