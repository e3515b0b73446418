import { existsSync } from 'node:fs';
import { defineConfig } from '@playwright/test';

const SYSTEM_CHROMIUM = '/usr/bin/chromium';

export default defineConfig({
  testDir: '.',
  testMatch: '*.journey.ts',
  outputDir: '../../test-results',
  fullyParallel: true,
  workers: 2,
  retries: 0,
  timeout: 120_000,
  expect: { timeout: 15_000 },
  reporter: [['list'], ['json']],
  use: {
    timezoneId: 'Europe/London',
    locale: 'en-GB',
    actionTimeout: 15_000,
    viewport: { width: 1180, height: 820 },
    launchOptions: {
      ...(existsSync(SYSTEM_CHROMIUM) ? { executablePath: SYSTEM_CHROMIUM } : {}),
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
