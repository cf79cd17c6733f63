import type { Locator, Page } from '@playwright/test';
import { expect, test } from './journey.js';

/** Presses Tab until the focus is there, as a person without a mouse does. */
async function tabTo(page: Page, target: Locator): Promise<void> {
  await expect(target).toBeVisible();
  for (let presses = 0; presses < 80; presses += 1) {
    await page.keyboard.press('Tab');
    if (await target.evaluate((element) => element === document.activeElement)) return;
  }
  throw new Error(`80 presses of Tab did not reach ${target}`);
}

test('the keyboard alone signs in, reaches the second option and opens its working', async ({ page }) => {
  await page.goto('/');
  await tabTo(page, page.getByLabel('E-mail'));
  await page.keyboard.type('tomas.arrivel@brackwater.example');
  await tabTo(page, page.getByLabel('Password'));
  await page.keyboard.type('steelyard-demo');
  await page.keyboard.press('Enter');

  await tabTo(page, page.getByRole('link', { name: 'Stillfoot' }));
  await page.keyboard.press('Enter');

  const options = page.getByRole('table', { name: 'Options', exact: true });
  const second = options.getByRole('button', { name: 'B Parallel, baseline-adjusted' });
  await tabTo(page, options.getByRole('button', { name: 'A Parallel, unadjusted' }));
  await page.keyboard.press('ArrowDown');
  await expect(second).toBeFocused();
  await page.keyboard.press('Enter');
  await expect(second).toHaveAttribute('aria-pressed', 'true');

  await tabTo(page, page.getByRole('region', { name: 'Option B' }).getByRole('link', { name: 'Working' }));
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Parallel, baseline-adjusted');
});
