import { defineConfig } from '@playwright/test';
import { browserPath } from './e2e/browser';

/** Journeys in a real browser against the built server on demo data; see e2e/start-server.ts. */
export default defineConfig({
  testDir: 'e2e',
  testMatch: '**/*.journey.ts',
  globalSetup: './e2e/start-server.ts',
  outputDir: 'test-results',
  timeout: 45_000,
  expect: { timeout: 10_000 },
  workers: 2,
  retries: 0,
  forbidOnly: true,
  reporter: [['list']],
  use: {
    browserName: 'chromium',
    viewport: { width: 1280, height: 800 },
    locale: 'en-GB',
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath: await browserPath(),
      args: [
        '--headless',
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
