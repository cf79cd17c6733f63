import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { ensureBuilt } from './lib/build.mjs';
import { root } from './lib/commands.mjs';
import { ensureInstalled } from './lib/install.mjs';
import { runScript } from './lib/progress.mjs';

await runScript(async () => {
  await ensureInstalled();
  await ensureBuilt();
  // In this process, so that every signal reaches the server itself.
  await import(pathToFileURL(join(root, 'packages/api/dist/main.js')).href);
});
