import { defineConfig, devices } from '@playwright/test';
import { findBrowser } from './tests/scripts/browser.mjs';

const executablePath = findBrowser();

export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: 'test-results/e2e',
  forbidOnly: Boolean(process.env.CI),
  workers: 1,
  timeout: 120_000,
  expect: { timeout: 20_000 },
  reporter: 'list',
  use: {
    ...devices['Desktop Chrome'],
    viewport: { width: 1440, height: 900 },
    actionTimeout: 30_000,
    trace: 'retain-on-failure',
    launchOptions: {
      ...(executablePath === undefined ? {} : { executablePath }),
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
});
