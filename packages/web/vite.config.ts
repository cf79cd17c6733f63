import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';
import { lighterFluent } from './vite/lighter-fluent.ts';
import { themeCss } from './vite/theme-css.ts';
import { zodWithoutJsonSchema } from './vite/zod-without-json-schema.ts';

export default defineConfig({
  plugins: [react(), themeCss(), lighterFluent(), zodWithoutJsonSchema()],
  build: {
    assetsInlineLimit: 0,
    // Browsers preload modules themselves; one that does not fetches them a little later.
    modulePreload: { polyfill: false },
    rolldownOptions: {
      output: {
        codeSplitting: {
          groups: [
            {
              name: 'react',
              test: /node_modules[\\/](react|react-dom|scheduler|react-router|react-router-dom)[\\/]/,
              priority: 3,
            },
            { name: 'zod', test: /node_modules[\\/]zod[\\/]/, priority: 3 },
            {
              name: 'fluent',
              test: /node_modules[\\/](@fluentui[\\/](?!react-(checkbox|field|input|label|radio|select|textarea)[\\/])|@griffel|tabster|keyborg)/,
              priority: 2,
            },
            // But what only the page of the working asks of it: that goes there.
            {
              name: 'calc',
              test: /packages[\\/]calc[\\/]dist[\\/](?!explain(\.js|[\\/](test|multiplicity)-steps\.js))/,
            },
            // What most pages share, in one piece; the fields go with the forms.
            {
              name: 'shared',
              test: /packages[\\/]web[\\/]src[\\/](shared[\\/](format|api|ui[\\/](?!form|number-field|radio-field|text-area))|app[\\/]layout|features[\\/](access|studies)[\\/]api)/,
            },
            // What forms alone are made of: no page that opens without one waits for it.
            {
              name: 'fields',
              test: /node_modules[\\/](react-hook-form|@hookform|@fluentui[\\/]react-(checkbox|field|input|label|radio|select|textarea))[\\/]/,
              priority: 1,
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
