import { ScratchServer } from '../scripts/lib/scratch-server.mjs';
import { expect, test } from './journey.js';

test('a power cut signs nobody out and loses nothing', async ({ page }) => {
  const server = await ScratchServer.start({ STEELYARD_DEMO: 'on' });
  try {
    await page.goto(server.origin);
    await page.getByRole('button', { name: /Tomas Arrivel/ }).click();
    await page.getByRole('link', { name: 'Stillfoot' }).click();
    const options = page.getByRole('table', { name: 'Options', exact: true });
    await expect(options.getByRole('row')).toHaveCount(4);
    const before = await options.textContent();
    const address = page.url();

    await server.kill();
    await server.launch();

    await page.reload();
    await expect(page).toHaveURL(address);
    await expect(options.getByRole('row')).toHaveCount(4);
    expect(await options.textContent()).toBe(before);
    await expect(page.getByRole('button', { name: 'Account: Tomas Arrivel' })).toBeVisible();
  } finally {
    await server.stop();
  }
});
