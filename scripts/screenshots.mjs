import { mkdir } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import process from 'node:process';
import { chromium } from '@playwright/test';
import { ensureBuilt } from './lib/build.mjs';
import { chromiumRemedy, findChromium } from './lib/chromium.mjs';
import { Remedy, runScript } from './lib/progress.mjs';
import { ScratchServer } from './lib/scratch-server.mjs';

const widths = { 1440: 900, 1024: 768, 390: 844 };
const visitor = { study: 'Stillfoot', part: 'Methodologist, Stillfoot' };
const administrator = 'Administrator';

/** Where each picture is taken, from what the server says of the study. */
const screens = {
  'sign-in': () => '/sign-in',
  studies: () => '/',
  weigh: (study) => `/studies/${study}/weigh`,
  working: (study, options) => `/studies/${study}/options/${options[0].optionId}`,
  question: (study) => `/studies/${study}/question`,
  ledger: (study) => `/studies/${study}/ledger`,
  costs: (study) => `/studies/${study}/costs`,
  members: (study) => `/studies/${study}/members`,
  history: (study) => `/studies/${study}/history`,
  'new-study': () => '/studies/new',
  profile: () => '/profile',
  'not-found': () => '/no/such/page',
  people: () => '/admin',
};

await runScript(async () => {
  const [folder] = process.argv.slice(2).filter((argument) => !argument.startsWith('--'));
  if (!folder) throw new Remedy('Say where the pictures go: npm run screenshots -- <folder>');
  const executablePath = findChromium();
  if (!executablePath) throw new Remedy(chromiumRemedy);
  await ensureBuilt();
  await mkdir(folder, { recursive: true });
  const server = await ScratchServer.start({ STEELYARD_DEMO: 'on' });
  const browser = await chromium.launch({ executablePath, args: ['--no-sandbox', '--disable-gpu'] });
  try {
    for (const colorScheme of ['light', 'dark']) await takeAll(browser, server.origin, folder, colorScheme);
  } finally {
    await browser.close();
    await server.stop();
  }
});

async function takeAll(browser, origin, folder, colorScheme) {
  const context = await browser.newContext({ baseURL: origin, colorScheme, reducedMotion: 'reduce' });
  const page = await context.newPage();
  const addresses = { study: '', options: [] };
  for (const [name, path] of Object.entries(screens)) {
    if (name === 'studies') Object.assign(addresses, await visit(context.request));
    if (name === 'people') await signIn(context.request, administrator);
    await page.goto(path(addresses.study, addresses.options), { waitUntil: 'networkidle' });
    for (const [width, height] of Object.entries(widths)) {
      await page.setViewportSize({ width: Number(width), height });
      const file = join(folder, `${name}-${width}-${colorScheme}.png`);
      await page.screenshot({ path: file, fullPage: true });
      process.stdout.write(`${resolve(file)}\n`);
    }
  }
  await context.close();
}

async function visit(request) {
  await signIn(request, visitor.part);
  const { studies } = await (await request.get('/api/studies')).json();
  const { id } = studies.find(({ name }) => name === visitor.study);
  const { options } = await (await request.get(`/api/studies/${id}/weigh`)).json();
  return { study: id, options };
}

async function signIn(request, part) {
  const { demo } = await (await request.get('/api/access')).json();
  const { email } = demo.accounts.find((account) => account.part === part);
  await request.post('/api/session', { data: { email, password: demo.password } });
}
