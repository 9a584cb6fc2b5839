import { defineConfig } from '@playwright/test';

/** Browsers are Debian's own: the tests never fetch one. */
const chromium = process.env['SEAMWRIGHT_CHROMIUM'] ?? '/usr/bin/chromium';

/** Nothing but what a test asks for leaves the browser. */
const quiet = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

const PATIENCE_MS = 60_000;

/** One worker and no retries: the specs play one plant's day, one after the other, on one database. */
export default defineConfig({
  testDir: './src',
  outputDir: '../../test-results/browser',
  globalSetup: './src/stack/global-setup.ts',
  workers: 1,
  retries: 0,
  fullyParallel: false,
  timeout: 4 * PATIENCE_MS,
  globalTimeout: 40 * PATIENCE_MS,
  expect: { timeout: PATIENCE_MS },
  use: {
    headless: true,
    locale: 'en-GB',
    timezoneId: 'Europe/London',
    viewport: { width: 1440, height: 900 },
    actionTimeout: PATIENCE_MS,
    navigationTimeout: PATIENCE_MS,
    screenshot: 'only-on-failure',
    // Filming every step would cost more than the steps.
    trace: { mode: 'retain-on-failure', screenshots: false },
    launchOptions: { executablePath: chromium, args: quiet },
  },
});
