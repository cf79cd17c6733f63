import type { Page } from '@playwright/test';
import { expect, stillfoot, studyId, test } from './journey.js';
import { beamsCard, figuresShown } from './options-table.js';

/**
 * Analysed and recruited at power 90 %, from noncentral t in R: at a standard deviation of 2.1, as the demo states it,
 * and of 2.5, as somebody else might.
 */
const planned = [
  ['A Parallel, unadjusted', 188, 214],
  ['B Parallel, baseline-adjusted', 132, 150],
  ['C Crossover', 40, 50],
];
const replanned = [
  ['A Parallel, unadjusted', 266, 304],
  ['B Parallel, baseline-adjusted', 186, 212],
  ['C Crossover', 56, 70],
];

const pilot = 'Pilot of 30: 1.9, taken up to its upper limit';
const register = 'Register of 412 outpatients, 2019 to 2024';

/** What Weigh shows, by option. */
async function weighed(page: Page, id: string) {
  await page.goto(`/studies/${id}/weigh`);
  await beamsCard(page).getByRole('button', { name: 'Table' }).click();
  return figuresShown(page);
}

async function setStandardDeviation(page: Page, value: string, source: string): Promise<void> {
  await page.getByRole('button', { name: 'Change Standard deviation', exact: true }).click();
  const form = page.getByRole('form', { name: 'Set Standard deviation' });
  await form.getByLabel('Value').fill(value);
  await form.getByLabel('Source').fill(source);
}

test('a planning value moves every option, keeps its history for the reader and can be moved back', async ({
  page,
  context,
  signIn,
}) => {
  await signIn(stillfoot.methodologist);
  const id = await studyId(page, 'Stillfoot');
  const before = await weighed(page, id);
  const sizes = (shown: typeof before) => shown.map((row) => [row.name, row.analysed, row.recruited]);
  expect(sizes(before)).toEqual(planned);

  await page.getByRole('navigation', { name: 'Study' }).getByRole('link', { name: 'Ledger' }).click();
  const line = page
    .getByRole('list', { name: 'Planning values' })
    .getByRole('listitem')
    .filter({ has: page.getByRole('heading', { name: 'Standard deviation', exact: true }) });
  await setStandardDeviation(page, '2,5', register);
  const preview = page.getByRole('table', { name: 'Options before and after Standard deviation changes' });
  const recruitedOf = (table: typeof preview, option: string) =>
    table
      .getByRole('row')
      .filter({ has: page.getByRole('rowheader', { name: option }) })
      .getByRole('cell')
      .first();
  for (const [at, [name, , recruited]] of replanned.entries()) {
    await expect(recruitedOf(preview, String(name))).toHaveText(`${planned[at]?.[2]} → ${recruited}`);
  }
  await line.getByRole('button', { name: 'Save' }).click();
  const outcome = page.getByRole('table', { name: 'Options before and after the change' });
  for (const [at, [name, , recruited]] of replanned.entries()) {
    await expect(recruitedOf(outcome, String(name))).toHaveText(`${planned[at]?.[2]} → ${recruited}`);
  }
  await expect(line).toContainText(register);
  expect(sizes(await weighed(page, id))).toEqual(replanned);

  await context.clearCookies();
  await signIn(stillfoot.reader);
  await page.goto(`/studies/${id}/ledger`);
  await expect(line).toContainText(register);
  await expect(page.getByRole('button', { name: /^Change/ })).toHaveCount(0);
  await line.getByRole('button', { name: 'History of Standard deviation' }).click();
  const history = page.getByRole('table', { name: 'History of Standard deviation' });
  const versions = history.getByRole('row');
  await expect(versions).toHaveCount(3);
  for (const [row, told] of [
    [1, ['2.5', register, stillfoot.methodologist]],
    [2, ['2.1', pilot, stillfoot.methodologist]],
  ] as const) {
    for (const fact of told) await expect(versions.nth(row)).toContainText(fact);
  }
  expect(sizes(await weighed(page, id))).toEqual(replanned);

  await context.clearCookies();
  await signIn(stillfoot.methodologist);
  await page.goto(`/studies/${id}/ledger`);
  await setStandardDeviation(page, '2.1', pilot);
  await line.getByRole('button', { name: 'Save' }).click();
  await expect(outcome).toBeVisible();
  expect(await weighed(page, id)).toEqual(before);
});

test('the first click on Save tells of a field left empty and goes to it', async ({ page, signIn }) => {
  await signIn(stillfoot.methodologist);
  await page.goto(`/studies/${await studyId(page, 'Stillfoot')}/ledger`);
  await setStandardDeviation(page, '2.5', '');
  const form = page.getByRole('form', { name: 'Set Standard deviation' });
  await form.getByRole('button', { name: 'Save' }).click();
  await expect(form.getByText('Say where the value comes from.')).toBeVisible();
  await expect(form.getByLabel('Source')).toBeFocused();
});
