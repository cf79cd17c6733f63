import { fileURLToPath } from 'node:url';
import { build } from 'vite';
import { appraisalRequests } from './appraisal-requests.js';
import { expect, stillfoot, test } from './journey.js';

const calc = fileURLToPath(new URL('../packages/calc/dist/index.js', import.meta.url));

interface CalcInTheBrowser {
  SteelyardCalc: { appraise(request: unknown): unknown };
}

/** calc as one script that a page can hold: its own build, bundled with nothing added. */
async function calcScript(): Promise<string> {
  const bundles = await build({
    configFile: false,
    logLevel: 'silent',
    build: { write: false, minify: false, lib: { entry: calc, name: 'SteelyardCalc', formats: ['iife'] } },
  });
  const [bundle] = Array.isArray(bundles) ? bundles : [bundles];
  if (!bundle || !('output' in bundle)) throw new Error('calc could not be bundled');
  return `${bundle.output[0].code}\nglobalThis.SteelyardCalc = SteelyardCalc;`;
}

/** Where two answers differ: whole numbers and flags must be equal, reals agree to 1e-9 relative. */
function differences(here: unknown, there: unknown, path = ''): string[] {
  if (typeof here === 'number' && typeof there === 'number') {
    const whole = Number.isInteger(here) && Number.isInteger(there);
    const close = Math.abs(here - there) <= 1e-9 * Math.max(Math.abs(here), Math.abs(there));
    return (whole ? here === there : close) ? [] : [`${path}: ${here} and ${there}`];
  }
  if (isRecord(here) && isRecord(there)) {
    const keys = new Set([...Object.keys(here), ...Object.keys(there)]);
    return [...keys].flatMap((key) => differences(here[key], there[key], `${path}/${key}`));
  }
  return Object.is(here, there) ? [] : [`${path}: ${JSON.stringify(here)} and ${JSON.stringify(there)}`];
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null;
}

test('appraisals of every family agree between the browser and the server', async ({ page, signIn }) => {
  await page.addInitScript({ content: await calcScript() });
  await signIn(stillfoot.methodologist);
  await page.goto('/');
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();

  for (const [title, request] of appraisalRequests) {
    const browser = await page.evaluate(
      (asked) => (window as unknown as CalcInTheBrowser).SteelyardCalc.appraise(asked),
      request,
    );
    const response = await page.request.post('/api/appraisals', { data: request });
    expect(response.status(), title).toBe(200);
    const server: unknown = await response.json();
    expect(server, title).toHaveProperty('feasible');
    expect(differences(browser, server), title).toEqual([]);
  }
});
