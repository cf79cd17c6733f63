import type { Page } from '@playwright/test';
import { expect, expectFaults, stillfoot, studyId, test } from './journey.js';

const heading = (page: Page, name: string | RegExp) => page.getByRole('heading', { level: 1, name });
const link = (page: Page, name: string) =>
  page.getByRole('navigation', { name: 'Study' }).getByRole('link', { name, exact: true });

async function openMembers(page: Page): Promise<string> {
  const id = await studyId(page, 'Stillfoot');
  await page.goto(`/studies/${id}/members`);
  await expect(heading(page, 'Members')).toBeVisible();
  return id;
}

test('a page stays until the script of the next one is there', async ({ page, signIn }) => {
  await signIn(stillfoot.methodologist);
  await openMembers(page);
  let release = () => {};
  const held = new Promise<void>((resolve) => {
    release = resolve;
  });
  await page.route(/history-page.*\.js$/, async (route) => {
    await held;
    await route.continue();
  });
  const asked = page.waitForRequest(/history-page.*\.js$/);
  await link(page, 'History').click();
  await asked;
  await expect(heading(page, 'Members')).toBeVisible();
  release();
  await expect(heading(page, 'History')).toBeVisible();
  await expect(heading(page, 'Members')).toHaveCount(0);
});

test('a page whose script cannot be had says so, and the way back is open', async ({
  page,
  signIn,
  faults,
}) => {
  await signIn(stillfoot.methodologist);
  await openMembers(page);
  await page.route(/history-page.*\.js$/, (route) => route.abort('connectionfailed'));
  await link(page, 'History').click();
  await expect(heading(page, /The page could not be shown/)).toBeVisible();
  await page.goBack();
  await expect(heading(page, 'Members')).toBeVisible();
  await page.unroute(/history-page.*\.js$/);
  await page.goForward();
  await page.getByRole('button', { name: 'Try again' }).click();
  await expect(heading(page, 'History')).toBeVisible();
  expectFaults(faults, /ERR_CONNECTION_FAILED|Failed to fetch dynamically imported module/);
});

test('a new page starts at its top, and going back finds the old one where it was', async ({
  page,
  signIn,
}) => {
  await signIn(stillfoot.methodologist);
  const id = await studyId(page, 'Stillfoot');
  await page.setViewportSize({ width: 1440, height: 400 });
  await page.goto(`/studies/${id}/ledger`);
  await expect(heading(page, 'Ledger')).toBeVisible();
  await expect(page.getByText(/Set by/).first()).toBeVisible();
  await page.evaluate(() => scrollTo(0, 300));
  const scrolled = () => page.evaluate(() => scrollY);
  await expect.poll(scrolled).toBe(300);
  await link(page, 'Costs').focus();
  await page.keyboard.press('Enter');
  await expect(heading(page, 'Costs')).toBeVisible();
  await expect.poll(scrolled).toBe(0);
  await page.goBack();
  await expect(heading(page, 'Ledger')).toBeVisible();
  await expect.poll(scrolled).toBe(300);
});
