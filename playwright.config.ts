import { defineConfig } from '@playwright/test';

const port = Number(process.env.BROWSER_TEST_PORT ?? 4197);

/** The whole product in Debian's Chromium: built client, built server, a MariaDB of the tests' own. */
export default defineConfig({
  testDir: 'tests/browser',
  outputDir: 'test-results/browser',
  fullyParallel: false,
  workers: 1,
  timeout: 300_000,
  expect: { timeout: 15_000 },
  reporter: 'list',
  use: {
    baseURL: `http://127.0.0.1:${port}`,
    trace: 'retain-on-failure',
    locale: 'en-US',
    timezoneId: 'America/Chicago',
    launchOptions: {
      executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
      ],
    },
  },
  webServer: {
    command: 'node scripts/serve-for-browser-tests.mjs',
    env: { PORT: String(port) },
    url: `http://127.0.0.1:${port}/readyz`,
    timeout: 180_000,
    reuseExistingServer: false,
    gracefulShutdown: { signal: 'SIGTERM', timeout: 15_000 },
  },
});
