import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    include: ['test/**/*.test.ts'],
    setupFiles: ['test/setup.ts'],
    // Property tests and quadratures take seconds on a busy machine.
    testTimeout: 60_000,
    reporters: ['default', ['json', { outputFile: 'reports/vitest.json' }]],
  },
});
