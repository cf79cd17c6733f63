import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import process from 'node:process';
import { lastLines, run } from './commands.mjs';
import { during } from './progress.mjs';

const commands = ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome'];
const elsewhere = [
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  ...[process.env.PROGRAMFILES, process.env['PROGRAMFILES(X86)'], process.env.LOCALAPPDATA]
    .filter(Boolean)
    .map((folder) => join(folder, 'Google', 'Chrome', 'Application', 'chrome.exe')),
];

export const chromiumRemedy =
  'No Chromium was found. Install it (on Debian as root: apt-get update && apt-get install -y chromium), install Google Chrome, or set CHROMIUM_PATH to a browser of that family.';

/** The path of an installed Chromium or Chrome, or null; CHROMIUM_PATH speaks first. */
export function findChromium({ CHROMIUM_PATH, PATH = '' } = process.env) {
  if (CHROMIUM_PATH) return existsSync(CHROMIUM_PATH) ? CHROMIUM_PATH : null;
  const onPath = PATH.split(delimiter).flatMap((folder) => commands.map((name) => join(folder, name)));
  return [...onPath, ...elsewhere].find((path) => existsSync(path)) ?? null;
}

/** Installs Debian's Chromium where that is possible and none is there yet. */
export async function ensureChromium() {
  const mayInstall =
    process.platform === 'linux' && process.getuid?.() === 0 && existsSync('/usr/bin/apt-get');
  if (findChromium() || process.env.CHROMIUM_PATH || !mayInstall) return findChromium();
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  const { code, output } = await during('Installing Chromium from the Debian packages', async () => {
    const update = await run('apt-get', ['update'], { env });
    return update.code === 0 ? run('apt-get', ['install', '-y', 'chromium'], { env }) : update;
  });
  if (code !== 0) process.stderr.write(`${lastLines(output, 10)}\n`);
  return findChromium();
}
