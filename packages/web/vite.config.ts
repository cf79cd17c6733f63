import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  plugins: [react()],
  build: {
    assetsInlineLimit: 0,
    rolldownOptions: {
      output: {
        codeSplitting: {
          groups: [
            {
              name: 'react',
              test: /node_modules[\\/](react|react-dom|scheduler|react-router|react-router-dom)[\\/]/,
            },
            { name: 'zod', test: /node_modules[\\/]zod[\\/]/ },
            {
              name: 'fluent',
              test: /node_modules[\\/](@fluentui|@griffel|@floating-ui|tabster|keyborg)[\\/]/,
              minShareCount: 3,
            },
          ],
        },
      },
    },
  },
  server: { proxy: { '/api': 'http://127.0.0.1:4310' } },
  test: {
    environment: 'jsdom',
    // One set of modules for all files: each brings the server and the preferences back to their start.
    isolate: false,
    setupFiles: ['test/setup.ts'],
    // The first page of a file brings the whole interface with it, on a busy machine in seconds.
    testTimeout: 20_000,
    reporters: ['default', ['json', { outputFile: 'reports/vitest.json' }]],
  },
});
