import type { Page } from '@playwright/test';
import { ScratchServer } from '../scripts/lib/scratch-server.mjs';
import { enter, expect, studyId, test } from './journey.js';

/** How many sheets a page comes to on paper, by the objects that the PDF lists. */
async function sheets(page: Page): Promise<number> {
  const pdf = await page.pdf({ preferCSSPageSize: true, printBackground: true });
  return [...pdf.toString('latin1').matchAll(/\/Type\s*\/Page\b/g)].length;
}

const shown = async (page: Page, study: string) => {
  await page.goto(`/studies/${study}/weigh`);
  await expect(page.getByRole('table', { name: 'Options', exact: true })).toBeVisible();
  await expect(page.getByRole('region', { name: 'Trade-off' })).toBeVisible();
};

for (const [name, methodologist] of [
  ['Stillfoot', 'Tomas Arrivel'],
  ['Greenkettle', 'Jun Oyelaran'],
  ['Nimblegrip', 'Renske Aalderink'],
] as const) {
  test(`${name} weighed goes on one sheet, without its controls`, async ({ page, signIn }) => {
    await signIn(methodologist);
    await shown(page, await studyId(page, name));
    expect(await sheets(page)).toBe(1);
    await page.emulateMedia({ media: 'print' });
    await expect(page.getByRole('region', { name: 'Verdict' })).toBeVisible();
    await expect(page.getByRole('list', { name: 'Limits' })).toHaveText(/\S/);
    for (const control of ['Add option', 'Record the choice', 'Table', 'Change what is held', 'Save']) {
      await expect(page.getByRole('button', { name: control, exact: true })).toHaveCount(0);
    }
    await expect(page.getByRole('navigation')).toHaveCount(0);
  });
}

test('six options and a recorded choice go on one sheet too', async ({ page }) => {
  const server = await ScratchServer.start({ STEELYARD_DEMO: 'on' });
  try {
    await page.goto(server.origin);
    await enter(page, 'Renske Aalderink');
    const api = `${server.origin}/api/studies`;
    const { studies } = await (await page.request.get(api)).json();
    const study = (studies as { id: string; name: string }[]).find(({ name }) => name === 'Nimblegrip')?.id;
    const designSet = async () => (await page.request.get(`${api}/${study}/design-set`)).json();
    while ((await designSet()).options.length < 6) {
      const [first] = (await designSet()).options as { id: string }[];
      await page.request.post(`${api}/${study}/options/${first?.id}/duplicate`, { data: {} });
    }
    const { version, options } = (await designSet()) as { version: number; options: { id: string }[] };
    const [chosen, ...others] = options;
    const why = 'It keeps to the budget and to the date, and answers what the team asked of every dose.';
    const recorded = await page.request.put(`${api}/${study}/choice`, {
      data: { version, optionId: chosen?.id, why, whyNot: others.map(({ id }) => ({ optionId: id, why })) },
    });
    expect(recorded.status()).toBe(200);
    await page.goto(`${server.origin}/studies/${study}/weigh`);
    await expect(page.getByRole('region', { name: 'Choice' })).toBeVisible();
    await expect(page.getByRole('region', { name: 'Trade-off' })).toBeVisible();
    expect(await sheets(page)).toBe(1);
  } finally {
    await server.stop();
  }
});
