import { ensureBuilt } from './build.mjs';
import { openDatabase } from './database.mjs';
import { failWith } from './fail.mjs';
import { ensurePackages } from './install.mjs';
import { inProject } from './paths.mjs';
import { runNode } from './run.mjs';

/** Makes every list again from the events alone. The server may run meanwhile: each job is done under its own lock. */
async function rebuild() {
  await ensurePackages();
  await ensureBuilt();
  const database = await openDatabase();
  try {
    process.exitCode = await runNode([inProject('dist', 'server', 'rebuild.js')], {
      env: database.environment('headfast'),
    });
  } finally {
    await database.close();
  }
}

rebuild().catch(failWith);
