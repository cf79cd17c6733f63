import { existsSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import process from 'node:process';
import { lastLines, npm, root } from './commands.mjs';
import { requireNode } from './node-version.mjs';
import { during, Remedy } from './progress.mjs';

const compilers = {
  linux:
    'On Debian or Ubuntu: apt-get install -y build-essential python3; on Fedora: dnf install gcc-c++ make python3.',
  darwin: 'On macOS: xcode-select --install.',
  win32:
    'On Windows: install Python 3 and the Visual Studio Build Tools with “Desktop development with C++”.',
};

const causes = [
  {
    sign: /gyp ERR|not found: make|prebuild-install warn|No Xcode|find Python/i,
    remedy: (platform) =>
      `sqlite3 had to be compiled, because its ready-made file could not be fetched, and the compiler is missing or failed. ${compilers[platform] ?? compilers.linux}`,
  },
  {
    sign: /ENOSPC/,
    remedy: () => 'The disk is full. Free about 1 GB where this folder lies.',
  },
  {
    sign: /\bE(ACCES|PERM|ROFS)\b/,
    remedy: () => 'npm may not write here. Give yourself this folder, or move it to one that is yours.',
  },
  {
    sign: /can only install packages when your package\.json and package-lock\.json/,
    remedy: () =>
      'package.json and package-lock.json disagree. Fetch both anew, or run npm install to bring them together.',
  },
  {
    sign: /ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ECONNRESET|ETIMEDOUT|ERR_SOCKET_TIMEOUT|network|\bE(401|403|404)\b/,
    remedy: () =>
      'npm could not fetch the packages. Check the network, the proxy and npm config get registry.',
  },
];

/** One sentence with a remedy for what npm printed when it failed. */
export function installRemedy(output, platform = process.platform) {
  const cause = causes.find(({ sign }) => sign.test(output));
  const remedy = cause?.remedy(platform) ?? 'Its last lines above say why; --verbose shows all of them.';
  return `Installing the packages failed. ${remedy} Then run the same command again.`;
}

/**
 * Why an installation is due, or null: npm's own record of node_modules is held against package-lock.json.
 * What is optional may be absent: it is for other platforms.
 */
export function reasonToInstall(folder = root) {
  const record = join(folder, 'node_modules', '.package-lock.json');
  if (!existsSync(record)) return 'nothing is installed yet, so it takes a few minutes';
  const wanted = packagesIn(join(folder, 'package-lock.json'));
  const installed = packagesIn(record);
  const missing = Object.entries(wanted).some(
    ([path, { version, link, optional, devOptional, peer }]) =>
      path.includes('node_modules/') &&
      !link &&
      (installed[path]
        ? installed[path].version !== version || !existsSync(join(folder, path))
        : !(optional || devOptional || peer)),
  );
  return missing ? 'some differ from package-lock.json' : null;
}

function packagesIn(lockFile) {
  return JSON.parse(readFileSync(lockFile, 'utf8')).packages;
}

function sqliteLoads() {
  try {
    createRequire(join(root, 'package.json'))('sqlite3');
    return true;
  } catch {
    return false;
  }
}

/** Brings node_modules to what package-lock.json says, and makes sure that the database driver loads. */
export async function ensureInstalled() {
  requireNode();
  const reason = reasonToInstall();
  if (reason) await installOrExplain(`Installing packages (${reason})`, ['ci', '--include=dev']);
  if (sqliteLoads()) return;
  await installOrExplain('Compiling sqlite3', ['rebuild', 'sqlite3']);
  if (sqliteLoads()) return;
  throw new Remedy(
    'sqlite3 does not load: npm seems to be set to skip install scripts. Run: npm rebuild sqlite3 --ignore-scripts=false',
  );
}

async function installOrExplain(label, args) {
  const { code, output } = await during(label, () => npm(args));
  if (code === 0) return;
  process.stderr.write(`${lastLines(output, 15)}\n`);
  throw new Remedy(installRemedy(output));
}
