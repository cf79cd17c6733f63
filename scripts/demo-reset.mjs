import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { ensureBuilt } from './lib/build.mjs';
import { root } from './lib/commands.mjs';
import { ensureInstalled } from './lib/install.mjs';
import { runScript } from './lib/progress.mjs';

await runScript(async () => {
  await ensureInstalled();
  await ensureBuilt();
  await import(pathToFileURL(join(root, 'packages/api/dist/demo-reset.js')).href);
});
