import { defineConfig } from '@playwright/test';

// Ports of its own, so that a running Raglan is not in the way.
process.env.RAGLAN_E2E_PORT ??= '3217';
process.env.RAGLAN_E2E_INBOX_PORT ??= '3218';
process.env.RAGLAN_E2E_SECOND_PORT ??= '3219';
const port = process.env.RAGLAN_E2E_PORT;
const inboxPort = process.env.RAGLAN_E2E_INBOX_PORT;
/** Where a test reads the e-mails that the application sent: GET /messages. */
process.env.RAGLAN_E2E_INBOX_URL = `http://127.0.0.1:${inboxPort}`;
/** A second web process on the same database. */
process.env.RAGLAN_E2E_SECOND_URL = `http://127.0.0.1:${process.env.RAGLAN_E2E_SECOND_PORT}`;

export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: 'test-results',
  timeout: 60_000,
  expect: { timeout: 10_000 },
  retries: 0,
  workers: 1,
  forbidOnly: Boolean(process.env.CI),
  reporter: [['list']],
  use: {
    baseURL: `http://127.0.0.1:${port}`,
    trace: 'off',
    screenshot: 'only-on-failure',
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
    // Builds the application when its sources have changed, then serves it on a database of its own.
    command: 'node scripts/e2e-server.mjs',
    url: `http://127.0.0.1:${port}/api/ready`,
    reuseExistingServer: false,
    timeout: 300_000,
    stdout: 'pipe',
    gracefulShutdown: { signal: 'SIGTERM', timeout: 30_000 },
  },
});
