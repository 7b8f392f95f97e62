import { inProject } from './paths.mjs';
import { Unmet } from './fail.mjs';
import { runNode } from './run.mjs';

/**
 * Brings one database up to date with the built program: tables and grants under the owner's account, then the demo
 * under the application's.
 * @param {import('./database.mjs').DatabaseServer} server
 * @param {string} database
 * @param {Record<string, string>} env
 */
export async function prepareDatabase(server, database, env) {
  server.createDatabase(database);
  const steps = [
    ['migrate.js', server.ownerEnvironment(database), 'The tables could not be brought up to date.'],
    ['demo.js', server.environment(database), 'The demo could not be loaded.'],
  ];
  for (const [entry, account, failure] of steps) {
    const code = await runNode(['--enable-source-maps', inProject('dist', 'server', entry)], {
      env: { ...env, ...account },
    });
    if (code !== 0) throw new Unmet(`${failure} The reason is above.`);
  }
}
