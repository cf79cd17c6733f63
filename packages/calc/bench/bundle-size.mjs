import { fileURLToPath } from 'node:url';
import { gzipSync } from 'node:zlib';
import { build } from 'vite';
import { report } from './measure.mjs';

/** Kilobytes of gzip that the whole public surface adds to an application, minified. */
async function kilobytes(external) {
  const entry = fileURLToPath(new URL('../dist/index.js', import.meta.url));
  const { output } = await build({
    logLevel: 'silent',
    configFile: false,
    build: {
      write: false,
      minify: true,
      lib: { entry, formats: ['es'], fileName: 'calc' },
      rolldownOptions: { external },
    },
  }).then((built) => (Array.isArray(built) ? built[0] : built));
  return output.reduce((sum, { code = '' }) => sum + gzipSync(code, { level: 9 }).length, 0) / 1000;
}

export async function bundleSize() {
  const [alone, withZod] = [await kilobytes(['zod']), await kilobytes([])];
  report(
    'what calc adds to an application',
    `${alone.toFixed(1)} kB gzip without zod, ${withZod.toFixed(1)} kB with`,
    {
      aim: '60 kB without',
      kept: alone <= 60,
    },
  );
}
