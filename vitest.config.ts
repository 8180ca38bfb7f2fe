import { defineConfig } from 'vitest/config';

// A zone with summer time, wherever the machine stands; TEST_TZ runs the same tests in another.
process.env.TZ = process.env.TEST_TZ ?? 'Europe/London';

// Pure floors run in plain Node; tests of screens say `// @vitest-environment happy-dom` at their head.
export default defineConfig({
  test: {
    include: ['test/**/*.test.{ts,tsx}'],
    exclude: ['test/browser/**', 'node_modules/**'],
    environment: 'node',
    maxWorkers: 2,
    // A bound for what hangs, not a measure: a busy machine may be slow.
    testTimeout: 30_000,
    retry: 0,
    allowOnly: false,
  },
});
