import { cpus } from 'node:os';
import process from 'node:process';
import { chromium } from '@playwright/test';
import { ensureBuilt } from './lib/build.mjs';
import { chromiumRemedy, findChromium } from './lib/chromium.mjs';
import { Remedy, runScript } from './lib/progress.mjs';
import { ScratchServer } from './lib/scratch-server.mjs';

const visitor = { study: 'Nimblegrip', part: 'Methodologist, Nimblegrip' };
const options = 6;
const frames = 300;
const most = { median: 16, p95: 33 };

await runScript(async () => {
  const executablePath = findChromium();
  if (!executablePath) throw new Remedy(chromiumRemedy);
  if (!process.argv.includes('--built')) await ensureBuilt();
  const server = await ScratchServer.start({ STEELYARD_DEMO: 'on' });
  const browser = await chromium.launch({ executablePath, args: ['--no-sandbox', '--disable-gpu'] });
  try {
    const context = await browser.newContext({
      baseURL: server.origin,
      viewport: { width: 1440, height: 1100 },
    });
    const study = await visit(context.request);
    const page = await context.newPage();
    await page.addInitScript(timeFrames);
    await page.goto(`/studies/${study}/weigh`, { waitUntil: 'networkidle' });
    report(await drag(page));
  } finally {
    await browser.close();
    await server.stop();
  }
});

/** A study with as many options as the bench is about. */
async function visit(request) {
  const { demo } = await (await request.get('/api/access')).json();
  const { email } = demo.accounts.find(({ part }) => part === visitor.part);
  await request.post('/api/session', { data: { email, password: demo.password } });
  const { studies } = await (await request.get('/api/studies')).json();
  const { id } = studies.find(({ name }) => name === visitor.study);
  const set = await (await request.get(`/api/studies/${id}/design-set`)).json();
  for (let more = set.options.length; more < options; more += 1) {
    await request.post(`/api/studies/${id}/options/${set.options[0].id}/duplicate`, { data: {} });
  }
  return id;
}

/** In the page: how long each frame's own work takes, computing, rendering and drawing alike. */
function timeFrames() {
  const inFrame = window.requestAnimationFrame.bind(window);
  window.frameTimes = [];
  window.requestAnimationFrame = (work) =>
    inFrame((time) => {
      const began = performance.now();
      work(time);
      window.frameTimes.push(performance.now() - began);
    });
}

/** Drags a marker to and fro, a step a frame, and gives what the frames took that moved it. */
async function drag(page) {
  const marker = page.getByRole('slider').first();
  await marker.scrollIntoViewIfNeeded();
  const { x, y, width, height } = await marker.boundingBox();
  const [left, top] = [x + width / 2, y + height / 2];
  await page.mouse.move(left, top);
  await page.mouse.down();
  await page.mouse.move(left + 20, top);
  await page.waitForTimeout(500);
  await page.evaluate(() => window.frameTimes.splice(0));
  const moved = [];
  for (let step = 0; moved.length < frames && step < 4 * frames; step += 1) {
    await page.mouse.move(left + 120 * Math.sin(step / 15), top + 4);
    const { times, size } = await page.evaluate(
      () =>
        new Promise((resolve) => {
          requestAnimationFrame(() =>
            setTimeout(() => {
              const now = document.querySelector('[role="slider"]').getAttribute('aria-valuenow');
              resolve({ times: window.frameTimes.splice(0), size: now });
            }),
          );
        }),
    );
    if (size !== moved.at(-1)?.size) moved.push({ size, time: Math.max(...times) });
  }
  await page.mouse.up();
  return moved.map(({ time }) => time);
}

function report(times) {
  const sorted = times.toSorted((a, b) => a - b);
  const at = (share) => sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))];
  const [median, p95] = [at(0.5), at(0.95)];
  const say = (text) => process.stdout.write(`${text}\n`);
  say(`Drag frames with ${options} options on ${cpus().length} cores: ${times.length}`);
  say(`  median           ${median.toFixed(1).padStart(6)} ms, at most ${most.median}`);
  say(`  95th centile     ${p95.toFixed(1).padStart(6)} ms, at most ${most.p95}`);
  say(`  longest          ${sorted.at(-1).toFixed(1).padStart(6)} ms`);
  if (median > most.median || p95 > most.p95) process.exitCode = 1;
}
