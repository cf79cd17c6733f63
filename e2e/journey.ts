import { type BrowserContext, test as base, type Cookie, expect, type Page } from '@playwright/test';
import { ScratchServer } from '../scripts/lib/scratch-server.mjs';

export { expect };

/** The people of the demo study Stillfoot, by their part in it. */
export const stillfoot = {
  methodologist: 'Tomas Arrivel',
  investigator: 'Ilse Quennell',
  funder: 'Priya Venn',
  reader: 'Lotte Brannick',
};

interface Access {
  demo: { password: string; accounts: { name: string; email: string }[] };
}

interface JourneyFixtures {
  /** Signs in as one of the demo's people without going through the page. */
  signIn(name: string): Promise<void>;
  /** What went wrong on any page of the journey: console and script errors, requests to another origin. */
  faults: string[];
  /** A page in a second browser, which shares nothing with the first but the server. */
  elsewhere: Page;
}

interface WorkerFixtures {
  /** The built application with the demo, shared by a worker's journeys. */
  demo: ScratchServer;
  /** Cookies of those who signed in before: attempts to sign in are counted and limited. */
  sessions: Map<string, Cookie[]>;
}

export const test = base.extend<JourneyFixtures, WorkerFixtures>({
  demo: [
    // biome-ignore lint/correctness/noEmptyPattern: Playwright reads what a fixture needs from this pattern.
    async ({}, use) => {
      const server = await ScratchServer.start({ STEELYARD_DEMO: 'on' });
      await use(server);
      await server.stop();
    },
    { scope: 'worker' },
  ],
  // biome-ignore lint/correctness/noEmptyPattern: as above.
  sessions: [async ({}, use) => use(new Map()), { scope: 'worker' }],
  baseURL: async ({ demo }, use) => use(demo.origin),
  faults: [
    async ({ context }, use) => {
      const faults: string[] = [];
      watchAll(context, faults);
      await use(faults);
      expect(faults, 'faults seen on the pages').toEqual([]);
    },
    { auto: true },
  ],
  elsewhere: async ({ browser, faults, baseURL }, use) => {
    const context = await browser.newContext({ ...(baseURL ? { baseURL } : {}) });
    watchAll(context, faults);
    await use(await context.newPage());
    await context.close();
  },
  signIn: async ({ context, sessions, baseURL }, use) => {
    await use(async (name) => {
      const known = sessions.get(name);
      if (known) return context.addCookies(known);
      const access = await context.request.get(`${baseURL}/api/access`);
      const { demo }: Access = await access.json();
      const email = demo.accounts.find((account) => account.name === name)?.email;
      const data = { email, password: demo.password };
      const response = await context.request.post(`${baseURL}/api/session`, { data });
      expect(response.status(), `${name} signs in`).toBe(201);
      sessions.set(name, await context.cookies());
    });
  },
});

function watchAll(context: BrowserContext, faults: string[]): void {
  context.on('page', (page) => watch(page, faults));
}

function watch(page: Page, faults: string[]): void {
  page.on('pageerror', (error) => faults.push(error.message));
  page.on('console', (message) => {
    if (message.type() !== 'error') return;
    const { pathname } = new URL(message.location().url || 'about:blank');
    // How a page learns that nobody is signed in; browsers log it and cannot be told not to.
    if (pathname.startsWith('/api/') && message.text().includes('status of 401')) return;
    faults.push(`${message.text()} ${pathname}`);
  });
  page.on('request', (request) => {
    const { protocol, hostname } = new URL(request.url());
    if (protocol.startsWith('http') && hostname !== '127.0.0.1') faults.push(`asked for ${request.url()}`);
  });
}

/** The id of a demo study, as the signed-in person's list gives it. */
export async function studyId(page: Page, name: string): Promise<string> {
  const response = await page.request.get('/api/studies');
  const { studies }: { studies: { id: string; name: string }[] } = await response.json();
  const study = studies.find((candidate) => candidate.name === name);
  if (!study) throw new Error(`${name} is not among the studies`);
  return study.id;
}

/** Signs in through the page, by the demo's strip. */
export async function enter(page: Page, name: string): Promise<void> {
  await page.getByRole('button', { name: new RegExp(name) }).click();
  await expect(page.getByRole('button', { name: `Account: ${name}` })).toBeVisible();
}

/** Takes the faults that a journey provokes off the list; there must be such, and any others stay. */
export function expectFaults(faults: string[], provoked: RegExp): void {
  const others = faults.filter((fault) => !provoked.test(fault));
  expect(others.length, `faults like ${provoked}`).toBeLessThan(faults.length);
  faults.splice(0, faults.length, ...others);
}
