import { defineConfig } from '@playwright/test';
import tests from '../../playwright.config.ts';

/** Measured as the browser tests test: the built app in a real Chromium, one at a time. */
export default defineConfig({
  ...tests,
  testDir: '.',
  testMatch: '**/*.live.ts',
  globalSetup: '../../test/browser/support/globalSetup.ts',
  outputDir: '../../.cache/bench-results',
  timeout: 600_000,
  reporter: [['json', { outputFile: '../../.cache/bench.json' }]],
});
