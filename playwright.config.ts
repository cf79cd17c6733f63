import { defineConfig } from '@playwright/test';
import { findChromium } from './scripts/lib/chromium.mjs';

export default defineConfig({
  testDir: 'e2e',
  outputDir: 'e2e/reports/artefacts',
  forbidOnly: true,
  workers: 2,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: [['list']],
  use: {
    browserName: 'chromium',
    locale: 'en-GB',
    timezoneId: 'Europe/London',
    viewport: { width: 1440, height: 900 },
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath: findChromium() ?? undefined,
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
