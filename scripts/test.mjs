import { rmSync } from 'node:fs';
import { join } from 'node:path';
import process from 'node:process';
import { ensureBuilt } from './lib/build.mjs';
import { chromiumRemedy, ensureChromium } from './lib/chromium.mjs';
import { lastLines, npm, root, tool } from './lib/commands.mjs';
import { ensureInstalled } from './lib/install.mjs';
import { during, runScript } from './lib/progress.mjs';
import { browserResults, tally, unitResults } from './lib/reports.mjs';

const packages = ['calc', 'api', 'web'];
const settings = ['biome.json', 'package.json', 'playwright.config.ts', 'tsconfig.json', 'turbo.json'];
/** How long a runner may take: one that hangs has failed. */
const minutes = 15;
const totals = { passed: 0, failed: 0 };

function record({ passed, failures }) {
  totals.passed += passed;
  totals.failed += failures.length;
  process.stdout.write(`  ${passed} passed, ${failures.length} failed\n`);
  for (const { title, message } of failures) {
    process.stdout.write(`\n  ✗ ${title}\n${essence(message).replace(/^/gm, '    ')}\n\n`);
  }
}

/** Some runners print a whole page with a failure: its beginning says what failed, its end where. */
function essence(message) {
  const lines = message.trimEnd().split('\n');
  return (lines.length > 50 ? [...lines.slice(0, 30), '…', ...lines.slice(-10)] : lines).join('\n');
}

/** What has to be done before anything can be checked: it says itself what it is doing and counts when it fails. */
async function prepare(title, work) {
  try {
    await work();
    return true;
  } catch ({ message }) {
    record({ passed: 0, failures: [{ title, message }] });
    return false;
  }
}

/** A phase of many checks: a failure here does not keep the later phases from running. */
async function phase(label, work) {
  record(
    await during(label, work).catch(({ message }) => ({ passed: 0, failures: [{ title: label, message }] })),
  );
}

/** Commands that are one check each. */
async function checks(commands) {
  const found = { passed: 0, failures: [] };
  for (const [title, command] of commands) {
    const { code, output } = await command();
    if (code === 0) found.passed += 1;
    else found.failures.push({ title, message: lastLines(output, 45) });
  }
  return found;
}

/** A runner writes its report anew: one left by an earlier run must not speak for this one. */
async function reported(file, read, command) {
  const path = join(root, file);
  rmSync(path, { force: true });
  const { code, output } = await command(path);
  return tally(path, read, { code, output: lastLines(output) });
}

const lint = (...paths) => tool('@biomejs/biome', ['ci', '--colors=off', ...paths]);

const withVitest = (file, script) =>
  reported(file, unitResults, (path) =>
    npm([...script, '--', '--reporter=default', '--reporter=json', `--outputFile.json=${path}`], { minutes }),
  );

const withJest = (file, script) =>
  reported(file, unitResults, (path) =>
    npm([...script, '--', '--json', `--outputFile=${path}`], { minutes }),
  );

async function withPlaywright(file, chromium) {
  if (chromium) {
    return reported(file, browserResults, (path) =>
      tool('@playwright/test', ['test', '--reporter=list,json'], {
        env: { CHROMIUM_PATH: chromium, PLAYWRIGHT_JSON_OUTPUT_FILE: path },
        minutes,
      }),
    );
  }
  const { output } = await tool('@playwright/test', ['test', '--list', '--reporter=json']);
  const missed = browserResults(JSON.parse(output));
  return { passed: 0, failures: missed.map(({ title }) => ({ title, message: chromiumRemedy })) };
}

async function runEverything() {
  if (!(await prepare('Installing', ensureInstalled))) return;
  const chromium = await ensureChromium();
  await prepare('Building', ensureBuilt);
  await phase('Lint', () =>
    checks([
      ...packages.map((name) => [`packages/${name} is clean`, () => lint(`packages/${name}`)]),
      ['scripts, journeys and settings are clean', () => lint('scripts', 'e2e', ...settings)],
    ]),
  );
  await phase('Types', () =>
    checks([
      ...packages.map((name) => [
        `${name} type-checks`,
        () => npm(['run', 'types', '-w', `@steelyard/${name}`]),
      ]),
      ['the journeys type-check', () => tool('typescript', ['-p', 'e2e', '--noEmit'])],
    ]),
  );
  await phase('Scripts and dependency rules', () =>
    withVitest('scripts/reports/vitest.json', ['run', 'test:scripts']),
  );
  await phase('Tests of calc', () =>
    withVitest('packages/calc/reports/vitest.json', ['test', '-w', '@steelyard/calc']),
  );
  await phase('Tests of web', () =>
    withVitest('packages/web/reports/vitest.json', ['test', '-w', '@steelyard/web']),
  );
  await phase('Tests of api', () =>
    withJest('packages/api/reports/jest.json', ['test', '-w', '@steelyard/api']),
  );
  await phase('Journeys in the browser', () => withPlaywright('e2e/reports/playwright.json', chromium));
}

await runScript(async () => {
  const started = Date.now();
  await runEverything();
  process.stdout.write(`\nEverything took ${Math.round((Date.now() - started) / 1000)} s.\n`);
  process.stdout.write(`${totals.passed} passed, ${totals.failed} failed\n`);
  process.exitCode = totals.failed === 0 ? 0 : 1;
});
