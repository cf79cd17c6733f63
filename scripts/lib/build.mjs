import process from 'node:process';
import { lastLines, root, run, tool } from './commands.mjs';
import { during, Remedy } from './progress.mjs';

const quiet = { TURBO_TELEMETRY_DISABLED: '1', TURBO_NO_UPDATE_NOTIFIER: '1' };

/** Builds the packages whose sources have changed since they were built last. */
export async function ensureBuilt() {
  const { code, output } = await during('Building what has changed', async () => {
    const force = (await gitIgnoresThis()) ? ['--force'] : [];
    return tool('turbo', ['run', 'build', '--output-logs=errors-only', ...force], { env: quiet });
  });
  if (code === 0) return;
  process.stderr.write(`${lastLines(output)}\n`);
  throw new Remedy('The build failed; the messages above say where.');
}

/** In a folder that an enclosing git checkout ignores, turbo sees no change and would serve an old build. */
async function gitIgnoresThis() {
  const { code } = await run('git', ['check-ignore', '--quiet', root]);
  return code === 0;
}
