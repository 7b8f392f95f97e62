import { existsSync, readFileSync } from 'node:fs';

const read = (file) => (existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : undefined);

/** Counts of the unit, component and API tests; a file that could not even be loaded is a failure of its own. */
export function vitestCounts(file) {
  const report = read(file);
  if (!report) return undefined;
  const unloaded = report.testResults.filter((each) => each.status === 'failed' && each.assertionResults.length === 0);
  return { passed: report.numPassedTests, failed: report.numFailedTests + unloaded.length };
}

/** Counts of the browser tests; one that passed only when tried again counts as failed. */
export function playwrightCounts(file) {
  const report = read(file);
  if (!report) return undefined;
  const { expected, unexpected, flaky } = report.stats;
  return { passed: expected, failed: unexpected + flaky + (unexpected === 0 ? report.errors.length : 0) };
}
