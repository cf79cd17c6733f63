import { mkdir } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import process from 'node:process';
import { chromium } from '@playwright/test';
import { ensureBuilt } from './lib/build.mjs';
import { chromiumRemedy, findChromium } from './lib/chromium.mjs';
import { root } from './lib/commands.mjs';
import { Remedy, runScript } from './lib/progress.mjs';
import { ScratchServer } from './lib/scratch-server.mjs';

const widths = { 1920: 1080, 1440: 900, 1024: 768, 390: 844 };
/** The demo's studies; every page is taken of the first, Weigh and a working of each. */
const studies = ['Stillfoot', 'Greenkettle', 'Nimblegrip'];
const methodologistOf = (study) => `Methodologist, ${study}`;
const administrator = 'Administrator';

/** Where each picture is taken, from what the server says of the study. */
const screens = {
  'sign-in': () => '/sign-in',
  studies: () => '/',
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

const compared = {
  weigh: (study) => `/studies/${study}/weigh`,
  working: (study, options) => `/studies/${study}/options/${options[0].optionId}`,
};

/** The picture that the README shows. */
const shownFirst = {
  study: 'Greenkettle',
  option: 1,
  size: { width: 1440, height: 1130 },
  file: join(root, 'packages/web/docs/weigh.png'),
};

await runScript(async () => {
  const readme = process.argv.includes('--readme');
  const [folder] = process.argv.slice(2).filter((argument) => !argument.startsWith('--'));
  if (!folder && !readme) {
    throw new Remedy(
      'Say where the pictures go: npm run screenshots -- <folder>, or --readme for the one the README shows',
    );
  }
  const executablePath = findChromium();
  if (!executablePath) throw new Remedy(chromiumRemedy);
  await ensureBuilt();
  const server = await ScratchServer.start({ STEELYARD_DEMO: 'on' });
  const browser = await chromium.launch({ executablePath, args: ['--no-sandbox', '--disable-gpu'] });
  try {
    if (readme) await takeFirst(browser, server.origin);
    if (folder) await mkdir(folder, { recursive: true });
    for (const colorScheme of folder ? ['light', 'dark'] : []) {
      await takeAll(browser, server.origin, folder, colorScheme);
    }
  } finally {
    await browser.close();
    await server.stop();
  }
});

async function takeFirst(browser, origin) {
  const { study, option, size, file } = shownFirst;
  const context = await browser.newContext({ baseURL: origin, viewport: size, reducedMotion: 'reduce' });
  const { id, options } = await visit(context.request, study);
  const page = await context.newPage();
  await page.goto(`${compared.weigh(id)}?option=${options[option].optionId}`, { waitUntil: 'networkidle' });
  await page.screenshot({ path: file });
  process.stdout.write(`${file}\n`);
  await context.close();
}

async function takeAll(browser, origin, folder, colorScheme) {
  const context = await browser.newContext({ baseURL: origin, colorScheme, reducedMotion: 'reduce' });
  const page = await context.newPage();
  const take = async (name, path) => {
    await page.goto(path, { waitUntil: 'networkidle' });
    for (const [width, height] of Object.entries(widths)) {
      await page.setViewportSize({ width: Number(width), height });
      const file = join(folder, `${name}-${width}-${colorScheme}.png`);
      await page.screenshot({ path: file, fullPage: true });
      process.stdout.write(`${resolve(file)}\n`);
    }
  };
  for (const study of studies) {
    const { id, options } = await visit(context.request, study);
    for (const [name, path] of Object.entries(compared)) {
      await take(`${name}-${study.toLowerCase()}`, path(id, options));
    }
  }
  await context.clearCookies();
  let id = '';
  for (const [name, path] of Object.entries(screens)) {
    if (name === 'studies') ({ id } = await visit(context.request, studies[0]));
    if (name === 'people') await signIn(context.request, administrator);
    await take(name, path(id));
  }
  await context.close();
}

/** Signs in as the study's methodologist; its id, and its options as the server weighs them. */
async function visit(request, study) {
  await signIn(request, methodologistOf(study));
  const { studies: list } = await (await request.get('/api/studies')).json();
  const { id } = list.find(({ name }) => name === study);
  const { options } = await (await request.get(`/api/studies/${id}/weigh`)).json();
  return { id, options };
}

async function signIn(request, part) {
  const { demo } = await (await request.get('/api/access')).json();
  const { email } = demo.accounts.find((account) => account.part === part);
  await request.post('/api/session', { data: { email, password: demo.password } });
}
