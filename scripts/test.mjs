import { mkdirSync, rmSync } from 'node:fs';
import { build } from './build.mjs';
import { openDatabase } from './database.mjs';
import { failWith } from './fail.mjs';
import { ensureDebianPackage, ensurePackages, findProgram } from './install.mjs';
import { inProject } from './paths.mjs';
import { runNode } from './run.mjs';
import { playwrightCounts, vitestCounts } from './test-report.mjs';

const bin = (name, ...parts) => inProject('node_modules', name, ...parts);
/** Not in test-results/, which Playwright empties before it begins. */
const reports = inProject('.data', 'test-reports');
const unitReport = inProject('.data', 'test-reports', 'vitest.json');
const browserReport = inProject('.data', 'test-reports', 'playwright.json');

const checks = [
  ['Lint', [bin('eslint', 'bin', 'eslint.js'), '.', '--max-warnings', '0']],
  ...['shared', 'server', 'tests'].map((room) => [
    `Types of ${room}/`,
    [bin('typescript', 'bin', 'tsc'), '-p', `${room}/tsconfig.json`],
  ]),
  ['Types of src/', [bin('vue-tsc', 'bin', 'vue-tsc.js'), '-p', 'src/tsconfig.json']],
];

/** Runs one step and says whether it was good; a bad one does not keep the others from being seen. */
async function step(name, work) {
  console.log(`\n== ${name}`);
  const began = Date.now();
  const good = await work();
  console.log(`-- ${name}: ${good ? 'good' : 'FAILED'} (${((Date.now() - began) / 1000).toFixed(1)} s)`);
  return good;
}

const runTests = async (args, env) => (await runNode(args, { env })) === 0;

async function test() {
  await ensurePackages();
  if (!findProgram('chromium')) await ensureDebianPackage('chromium', ['chromium']);
  rmSync(reports, { recursive: true, force: true });
  mkdirSync(reports, { recursive: true });
  const database = await openDatabase('test-mariadb');
  const results = [];
  try {
    for (const [name, args] of checks) results.push(await step(name, () => runTests(args)));
    results.push(
      await step('Build', () =>
        build().then(
          () => true,
          (error) => (console.error(error.message), false),
        ),
      ),
    );
    const vitest = [bin('vitest', 'vitest.mjs'), 'run', '--reporter=default', '--reporter=json'];
    results.push(await step('Tests', () => runTests([...vitest, `--outputFile.json=${unitReport}`])));
    const playwright = [bin('@playwright', 'test', 'cli.js'), 'test', '--reporter=list,json'];
    const env = { PLAYWRIGHT_JSON_OUTPUT_FILE: browserReport };
    results.push(await step('Browser tests', () => runTests(playwright, env)));
  } finally {
    await database.close();
  }
  const counts = [vitestCounts(unitReport), playwrightCounts(browserReport)];
  const sum = (key) => counts.reduce((total, each) => total + (each?.[key] ?? 0), 0);
  const badSteps = results.filter((good) => !good).length;
  const ranAll = counts.every((each) => each !== undefined && each.passed + each.failed > 0);
  const passed = sum('passed');
  // a failed check is no test, yet a run that has one did not pass
  const failed = Math.max(sum('failed'), badSteps > 0 || !ranAll ? 1 : 0);
  console.log(`\n${passed} passed, ${failed} failed`);
  process.exit(failed === 0 && passed > 0 ? 0 : 1);
}

test().catch(failWith);
