import { defineConfig } from '@playwright/test';

process.env.TZ = process.env.TEST_TZ ?? 'Europe/London';

// The built app in a real Chromium. `npm run browser` builds before it runs these.
export default defineConfig({
  testDir: 'test/browser',
  testMatch: '**/*.spec.ts',
  globalSetup: './test/browser/support/globalSetup.ts',
  outputDir: 'test-results',
  // One browser at a time: times on two cores mean nothing otherwise.
  workers: 1,
  fullyParallel: false,
  retries: 0,
  forbidOnly: true,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: [['list'], ['json', { outputFile: '.cache/playwright.json' }]],
});
