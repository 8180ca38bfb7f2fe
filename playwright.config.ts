import { defineConfig } from '@playwright/test';

process.env.TZ = process.env.TEST_TZ ?? 'Europe/London';

/** What measures time on a machine has it for itself: `npm run browser` runs these after all the others. */
const timed = ['**/prompts.spec.ts', '**/time.spec.ts', '**/hidden.spec.ts', '**/startTogether.spec.ts'];

// The built app in a real Chromium. `npm run browser` builds before it runs these.
export default defineConfig({
  testDir: 'test/browser',
  testMatch: '**/*.spec.ts',
  globalSetup: './test/browser/support/globalSetup.ts',
  outputDir: 'test-results',
  // A session mostly waits for its next prompt, so two go side by side on two cores.
  workers: 2,
  fullyParallel: true,
  retries: 0,
  forbidOnly: true,
  // As long as a machine with much to do may need; what waits for an event ends with it.
  timeout: 120_000,
  expect: { timeout: 20_000 },
  reporter: [['list'], ['json', { outputFile: '.cache/playwright.json' }]],
  projects: [
    { name: 'app', testIgnore: timed },
    { name: 'time', testMatch: timed, workers: 1 },
  ],
});
