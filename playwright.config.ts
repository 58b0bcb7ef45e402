import { defineConfig, devices } from '@playwright/test';

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--use-fake-device-for-media-stream',
  '--use-fake-ui-for-media-stream',
];

const FAULTS = /faults\.spec\.ts/;

/** A real browser, the one of the machine, on the two sizes that people hold and sit at. */
export default defineConfig({
  testDir: 'tests/e2e',
  workers: 2,
  retries: 0,
  timeout: 90_000,
  expect: { timeout: 10_000 },
  forbidOnly: true,
  outputDir: 'test-results',
  use: {
    baseURL: process.env.BASE_URL,
    launchOptions: { executablePath: '/usr/bin/chromium', args: FLAGS },
    trace: 'off',
    screenshot: 'only-on-failure',
  },
  projects: [
    {
      name: 'phone',
      use: { ...devices['Pixel 7'], viewport: { width: 390, height: 844 }, deviceScaleFactor: 2 },
      testIgnore: FAULTS,
    },
    {
      name: 'desktop',
      use: { viewport: { width: 1440, height: 900 } },
      testMatch: /\.desktop\.spec\.ts|journey\.spec\.ts|axe\.spec\.ts/,
    },
    // Kills what the others stand on, so it waits for them; together they would fail for nothing.
    {
      name: 'faults',
      use: { viewport: { width: 1440, height: 900 } },
      testMatch: FAULTS,
      dependencies: ['phone', 'desktop'],
      fullyParallel: false,
    },
  ],
});
