import process from 'node:process';
import { chromium } from '@playwright/test';
import { ensureBuilt } from './lib/build.mjs';
import { chromiumRemedy, findChromium } from './lib/chromium.mjs';
import { bytesOf, mostScript, scriptsOfFirstLoad } from './lib/first-load.mjs';
import { Remedy, runScript } from './lib/progress.mjs';
import { ScratchServer } from './lib/scratch-server.mjs';

const visitor = { study: 'Nimblegrip', part: 'Methodologist, Nimblegrip' };
const widths = { 1440: 900, 1024: 768, 390: 844 };

await runScript(async () => {
  const executablePath = findChromium();
  if (!executablePath) throw new Remedy(chromiumRemedy);
  await ensureBuilt();
  const server = await ScratchServer.start({ STEELYARD_DEMO: 'on' });
  const browser = await chromium.launch({ executablePath, args: ['--no-sandbox', '--disable-gpu'] });
  try {
    const loads = [];
    for (const [width, height] of Object.entries(widths)) {
      const viewport = { width: Number(width), height };
      loads.push(await firstLoad(browser, server.origin, viewport));
    }
    report(loads);
  } finally {
    await browser.close();
    await server.stop();
  }
});

async function firstLoad(browser, baseURL, viewport) {
  const context = await browser.newContext({ baseURL, viewport });
  const study = await visit(context.request);
  const page = await context.newPage();
  const scripts = await scriptsOfFirstLoad(page, `/studies/${study}/weigh`);
  await page.getByRole('table', { name: 'Options' }).waitFor();
  await context.close();
  return { width: viewport.width, scripts };
}

async function visit(request) {
  const { demo } = await (await request.get('/api/access')).json();
  const { email } = demo.accounts.find(({ part }) => part === visitor.part);
  await request.post('/api/session', { data: { email, password: demo.password } });
  const { studies } = await (await request.get('/api/studies')).json();
  return studies.find(({ name }) => name === visitor.study).id;
}

function report(loads) {
  const say = (text) => process.stdout.write(`${text}\n`);
  const kilobytes = (bytes) => `${(bytes / 1000).toFixed(1).padStart(6)} kB`;
  for (const { width, scripts } of loads) {
    const total = bytesOf(scripts);
    say(`First load of Weigh at ${width} px: ${kilobytes(total)} of scripts, ${scripts.size} files`);
    if (process.argv.includes('--files')) {
      for (const [name, bytes] of [...scripts].sort(([, a], [, b]) => b - a))
        say(`  ${kilobytes(bytes)}  ${name}`);
    }
    if (total > mostScript) {
      say(`  over the ${mostScript / 1000} kB that it may take`);
      process.exitCode = 1;
    }
  }
}
