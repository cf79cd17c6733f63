import { readFile } from 'node:fs/promises';
import type { Download, Locator, Page } from '@playwright/test';
import { expectAccessible, twoLooks } from './accessible.js';
import { expect, stillfoot, studyId, test } from './journey.js';

const card = (page: Page) => page.getByRole('region', { name: 'Trade-off', exact: true });
const marker = (page: Page, name: RegExp) => card(page).getByRole('slider', { name });
const row = (page: Page, name: RegExp) =>
  page.getByRole('table', { name: 'Options', exact: true }).getByRole('row', { name });

interface Weighed {
  options: {
    letter: string;
    appraisal: { units: number; power: number; costs: { total: number }; timeline: { months: number } };
  }[];
}

async function open(page: Page, study: string): Promise<string> {
  const id = await studyId(page, study);
  await page.goto(`/studies/${id}/weigh`);
  await expect(card(page).getByRole('slider').first()).toBeVisible();
  return id;
}

async function dragBy(page: Page, handle: Locator, right: number): Promise<void> {
  await handle.scrollIntoViewIfNeeded();
  const box = await handle.boundingBox();
  if (!box) throw new Error('The marker is not on the page');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x + right / 2, y, { steps: 4 });
  await page.mouse.move(x + right, y, { steps: 4 });
  await page.mouse.up();
}

test('a marker drags along its curve, and what is shown after saving is what the server computes', async ({
  page,
  signIn,
}) => {
  await signIn('Renske Aalderink');
  const id = await open(page, 'Nimblegrip');
  const handle = marker(page, /^A/);
  const before = Number(await handle.getAttribute('aria-valuenow'));
  await dragBy(page, handle, -70);
  await expect.poll(async () => Number(await handle.getAttribute('aria-valuenow'))).toBeLessThan(before);
  const units = Number(await handle.getAttribute('aria-valuenow'));

  await expect(
    page.getByRole('group', { name: 'Hold' }).getByRole('button', { name: 'Sizes' }),
  ).toHaveAttribute('aria-pressed', 'true');
  await expect(
    card(page)
      .getByText(/^A now 4 × \d+ participants.* less.*no longer reaches 90\s%/)
      .first(),
  ).toBeVisible();

  await card(page).getByRole('button', { name: 'Save the sizes' }).click();
  await expect(card(page).getByRole('region', { name: 'Sizes not saved' })).toBeHidden();

  const response = await page.request.get(`/api/studies/${id}/weigh`);
  const { options }: Weighed = await response.json();
  for (const { letter, appraisal } of options) {
    const { power, costs, timeline } = appraisal;
    const shown = row(page, new RegExp(`^${letter} `));
    await expect(shown).toContainText(`${(100 * power).toFixed(1)}\u00a0%`);
    await expect(shown).toContainText(`${Math.round(costs.total / 1000)}\u00a0k€`);
    await expect(shown).toContainText(String(Math.round(timeline.months)));
    const slider = marker(page, new RegExp(`^${letter} `));
    await expect(slider).toHaveAttribute('aria-valuenow', String(appraisal.units));
  }
  expect(options.find(({ letter }) => letter === 'A')?.appraisal.units).toBe(units);

  await page.reload();
  await expect(marker(page, /^A/)).toHaveAttribute('aria-valuenow', String(units));
});

test('someone with a keyboard and a screen reader resizes an option and learns what changed', async ({
  page,
  signIn,
}) => {
  await signIn(stillfoot.investigator);
  await open(page, 'Stillfoot');
  const spoken = card(page).getByRole('status').last();
  await expect(spoken).toBeEmpty();

  await card(page).getByRole('button', { name: 'Table of the trade-off' }).focus();
  for (let presses = 0; presses < 12; presses += 1) {
    await page.keyboard.press('Tab');
    if (await marker(page, /^C/).evaluate((element) => element === document.activeElement)) break;
  }
  await expect(marker(page, /^C/)).toBeFocused();
  await expect(marker(page, /^C/)).toMatchAriaSnapshot(
    '- slider "C Crossover, participants in each sequence"',
  );
  await expect(marker(page, /^C/)).toHaveAttribute('aria-valuetext', /power 90\.7\s%, 333\sk€, 18\.1 months/);

  await page.keyboard.press('ArrowLeft');
  await page.keyboard.press('ArrowLeft');
  await expect(marker(page, /^C/)).toHaveAttribute(
    'aria-valuetext',
    /^2 × 18 participants, two periods, power 8/,
  );
  await expect(spoken).toHaveText(
    /^C now 2 × 18 participants, two periods: power 8\d\.\d\s%, .* less, .* less, no longer reaches 90\s%\.$/,
  );
  await expect(row(page, /^C Crossover/)).toContainText('2 × 18 participants');

  await card(page).getByRole('button', { name: 'Undo' }).press('Enter');
  await expect(marker(page, /^C/)).toBeFocused();
  await expect(marker(page, /^C/)).toHaveAttribute('aria-valuenow', '20');
  await expect(spoken).toHaveText(/^Of the three options that reach 90\s%, C costs least/);
});

test('the picture zooms, and there is a way back', async ({ page, signIn }) => {
  await signIn(stillfoot.methodologist);
  await open(page, 'Stillfoot');
  const back = card(page).getByRole('button', { name: 'Whole picture' });
  await expect(back).toBeHidden();
  const before = await marker(page, /^A/).boundingBox();
  await card(page).getByRole('button', { name: 'Zoom in' }).click();
  await card(page).getByRole('button', { name: 'Zoom in' }).click();
  await expect(back).toBeVisible();
  expect(await marker(page, /^A/).boundingBox()).not.toEqual(before);
  await back.click();
  await expect(back).toBeHidden();
  expect(await marker(page, /^A/).boundingBox()).toEqual(before);
});

test('picture and figures can be saved as files', async ({ page, signIn }) => {
  await signIn(stillfoot.reader);
  await page.goto(`/studies/${await studyId(page, 'Stillfoot')}/weigh`);
  const save = async (kind: string): Promise<Download> => {
    const download = page.waitForEvent('download');
    await card(page).getByRole('button', { name: kind, exact: true }).click();
    return download;
  };
  const svg = await save('SVG');
  expect(svg.suggestedFilename()).toBe('stillfoot-trade-off.svg');
  const drawing = await readFile(await svg.path(), 'utf8');
  expect(drawing).toContain('<title>Stillfoot: Power over Cost</title>');
  expect(drawing).toContain('C Crossover');

  const png = await readFile(await (await save('PNG')).path());
  expect(png.subarray(1, 4).toString()).toBe('PNG');
  expect(png.readUInt32BE(16)).toBeGreaterThan(1500);

  const csv = await readFile(await (await save('CSV')).path(), 'utf8');
  expect(csv).toContain('"Cost (EUR)"');
  expect(csv.split('\r\n').find((line) => line.startsWith('"C"') && line.endsWith('"yes"'))).toContain(
    ',20,',
  );
});

test('those who may not edit see the markers and cannot move them', async ({ page, signIn }) => {
  await signIn(stillfoot.reader);
  await page.goto(`/studies/${await studyId(page, 'Stillfoot')}/weigh`);
  const told = card(page).getByRole('img', { name: /^A Parallel, unadjusted/ });
  await dragBy(page, told, 60);
  await expect(card(page).getByRole('slider')).toHaveCount(0);
  await expect(told).toHaveAccessibleName(/2 × 94 participants/);
  await expect(card(page).getByRole('button', { name: 'Undo' })).toHaveCount(0);
});

test('the canvas and its table are accessible while sizes are tried out', async ({ page, signIn }) => {
  await signIn('Jun Oyelaran');
  await open(page, 'Greenkettle');
  await marker(page, /^A/).press('PageDown');
  await expectAccessible(page);
  await card(page).getByRole('button', { name: 'Table of the trade-off' }).click();
  await expectAccessible(page, twoLooks);
});
