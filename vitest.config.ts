import { defineConfig } from 'vitest/config';

// Pure floors run in plain Node; tests of screens say `// @vitest-environment happy-dom` at their head.
export default defineConfig({
  test: {
    include: ['test/**/*.test.{ts,tsx}'],
    exclude: ['test/browser/**', 'node_modules/**'],
    environment: 'node',
    maxWorkers: 2,
  },
});
