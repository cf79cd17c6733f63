import type { Page } from '@playwright/test';
import { enter, expect, expectFaults, studyId, test } from './journey.js';

const nimblegrip = { methodologist: 'Renske Aalderink', investigator: 'Oona Mackrell' };
const option = { letter: 'E', name: 'Three arms, larger control, Dunnett' };

const reason =
  'Two of the practices lost a fifth of those who came for eight sessions; the sheet alone lost hardly anybody.';

/** Opens the option on Weigh and gives the form it is edited in, which shows by itself where an edit was begun. */
async function openOption(page: Page, begun = false) {
  await page.goto(`/studies/${await studyId(page, 'Nimblegrip')}/weigh`);
  await page.getByRole('button', { name: new RegExp(`^${option.letter} `) }).click();
  if (!begun) await edit(page);
  return formOf(page);
}

const panelOf = (page: Page) => page.getByRole('region', { name: `Option ${option.letter}` });

const edit = (page: Page) => panelOf(page).getByRole('button', { name: 'Edit' }).click();

function formOf(page: Page) {
  const form = panelOf(page).getByRole('form', { name: 'Option' });
  return {
    form,
    name: form.getByLabel('Name', { exact: true }),
    attrition: form.getByLabel('Attrition, here'),
    reason: form.getByLabel('Reason for this Attrition'),
    override: form.getByRole('button', { name: 'Override Attrition' }),
    save: form.getByRole('button', { name: 'Save' }),
    told: form.getByRole('status'),
    conflict: form.getByRole('alert'),
  };
}

/** The two versions of what differs, as the conflict shows them. */
function sideBySide(page: Page, what: string) {
  const row = page
    .getByRole('table', { name: 'Both versions' })
    .getByRole('row')
    .filter({ has: page.getByRole('rowheader', { name: what, exact: true }) });
  return row.getByRole('cell');
}

test('of two people who edit one option the later one sees both versions, loses nothing and can finish', async ({
  page,
  elsewhere,
  faults,
}) => {
  await page.goto('/');
  await enter(page, nimblegrip.methodologist);
  await elsewhere.goto('/');
  await enter(elsewhere, nimblegrip.investigator);
  const mine = await openOption(page);
  const theirs = await openOption(elsewhere);

  await mine.name.fill('Advice, 2 and 8 sessions');
  await mine.override.click();
  await mine.attrition.fill('20');
  await mine.reason.fill(reason);
  await theirs.name.fill('Three arms without 4 sessions');
  await theirs.save.click();
  await expect(theirs.told).toHaveText('Saved');

  await mine.save.click();
  await expect(mine.conflict).toContainText(nimblegrip.investigator);
  await expect(sideBySide(page, 'Name')).toHaveText([
    'Advice, 2 and 8 sessions',
    'Three arms without 4 sessions',
  ]);
  await expect(sideBySide(page, 'Attrition, reason')).toHaveText([reason, 'not stated']);
  await expect(mine.name).toHaveValue('Advice, 2 and 8 sessions');
  await expect(mine.attrition).toHaveValue('20');
  await expect(mine.reason).toHaveValue(reason);
  expectFaults(faults, /status of 409/);

  await page.reload();
  await expect(mine.conflict).toBeVisible();
  await expect(mine.reason).toHaveValue(reason);
  await mine.form.getByRole('button', { name: 'Keep mine' }).click();
  await expect(mine.conflict).toHaveCount(0);
  await mine.save.click();
  await expect(mine.told).toHaveText('Saved');

  await theirs.name.fill('Three arms without 4 sessions, again');
  await theirs.save.click();
  await expect(theirs.conflict).toContainText(nimblegrip.methodologist);
  await expect(sideBySide(elsewhere, 'Attrition, reason')).toHaveText(['not stated', reason]);
  expectFaults(faults, /status of 409/);
  await theirs.form.getByRole('button', { name: 'Take theirs' }).click();
  await expect(theirs.name).toHaveValue('Advice, 2 and 8 sessions');
  await expect(theirs.reason).toHaveValue(reason);
  await expect(theirs.told).toHaveText('');

  await theirs.name.fill(option.name);
  await theirs.save.click();
  await expect(theirs.told).toHaveText('Saved');
  await page.reload();
  await edit(page);
  await expect(mine.name).toHaveValue(option.name);
  await expect(mine.reason).toHaveValue(reason);
});

test('limits that were typed and put away do not go over those that somebody else has set meanwhile', async ({
  page,
  elsewhere,
  faults,
}) => {
  await page.goto('/');
  await enter(page, nimblegrip.methodologist);
  await elsewhere.goto('/');
  await enter(elsewhere, nimblegrip.investigator);
  const address = `/studies/${await studyId(page, 'Nimblegrip')}/weigh`;
  const limitsOn = (browser: Page) => {
    const dialog = browser.getByRole('dialog', { name: 'Limits' });
    return {
      dialog,
      open: () => browser.getByRole('button', { name: /^≤ \d+ months$/ }).click(),
      months: dialog.getByLabel('Months'),
      set: dialog.getByRole('button', { name: 'Set the limits' }),
      chips: browser.getByRole('list', { name: 'Limits' }),
    };
  };
  const mine = limitsOn(page);
  const theirs = limitsOn(elsewhere);
  await page.goto(address);
  await mine.open();
  await mine.months.fill('60');
  await page.keyboard.press('Escape');
  await expect(mine.dialog).toHaveCount(0);

  await elsewhere.goto(address);
  await theirs.open();
  await theirs.months.fill('54');
  await theirs.set.click();
  await expect(theirs.chips).toContainText('54 months');

  await page.reload();
  await expect(mine.chips).toContainText('54 months');
  await mine.open();
  await expect(mine.months).toHaveValue('60');
  await mine.set.click();
  await expect(mine.dialog.getByRole('alert')).toContainText(nimblegrip.investigator);
  await expect(mine.dialog.getByRole('row', { name: 'Months 60 54' })).toBeVisible();
  await expect(mine.months).toHaveValue('60');
  expectFaults(faults, /status of 409/);
  await elsewhere.reload();
  await expect(theirs.chips).toContainText('54 months');

  await mine.dialog.getByRole('button', { name: 'Go on with mine' }).click();
  await mine.set.click();
  await expect(mine.dialog).toHaveCount(0);
  await expect(mine.chips).toContainText('60 months');

  await theirs.open();
  await theirs.months.fill('48');
  await theirs.set.click();
  await expect(theirs.dialog.getByRole('row', { name: 'Months 48 60' })).toBeVisible();
  expectFaults(faults, /status of 409/);
  await theirs.dialog.getByRole('button', { name: 'Take theirs' }).click();
  await expect(theirs.months).toHaveValue('60');
  await theirs.dialog.getByRole('button', { name: 'Cancel' }).click();
  await expect(theirs.chips).toContainText('60 months');
});

test('an edit that is not saved outlives a reload and a session that ends', async ({ page }) => {
  await page.goto('/');
  await enter(page, nimblegrip.methodologist);
  const { name, told, save } = await openOption(page);
  const address = page.url();
  await name.fill('Three arms, and a name for them');
  await expect(told).toHaveText('Edits not saved');

  await page.reload();
  await expect(name).toHaveValue('Three arms, and a name for them');
  await expect(told).toHaveText('Edits not saved');

  expect((await page.request.delete('/api/session')).status()).toBe(204);
  await save.click();
  await expect(page.getByText('Your session has ended')).toBeVisible();
  await enter(page, nimblegrip.methodologist);
  await expect(page).toHaveURL(address);
  await expect(name).toHaveValue('Three arms, and a name for them');
  await expect(told).toHaveText('Edits not saved');
  await save.click();
  await expect(told).toHaveText('Saved');
  await page.reload();
  await edit(page);
  await expect(name).toHaveValue('Three arms, and a name for them');
  await expect(told).toHaveText('');
});

test('a member removed while editing is told so, and finds the edit again once added back', async ({
  page,
  elsewhere,
  faults,
}) => {
  await page.goto('/');
  await enter(page, nimblegrip.methodologist);
  const id = await studyId(page, 'Nimblegrip');
  await page.goto(`/studies/${id}/members`);
  await elsewhere.goto('/');
  await enter(elsewhere, nimblegrip.investigator);
  const { name, save, told } = await openOption(elsewhere);
  await name.fill('Three arms, as the practices call them');

  await page.getByRole('button', { name: `Remove ${nimblegrip.investigator}` }).click();
  const question = page.getByRole('dialog');
  await question.getByRole('button', { name: /^Remove/ }).click();
  await expect(question).toHaveCount(0);
  await save.click();
  await expect(elsewhere.getByText('What you had typed and not saved is kept here')).toBeVisible();
  expectFaults(faults, /status of 404/);

  const form = page.getByRole('form', { name: 'Add a member' });
  await form.getByLabel('E-mail').fill('oona.mackrell@bristlecone.example');
  await form.getByRole('radio', { name: /^Investigator/ }).check();
  await form.getByRole('button', { name: 'Add the member' }).click();
  await expect(page.getByRole('button', { name: `Remove ${nimblegrip.investigator}` })).toBeVisible();
  await openOption(elsewhere, true);
  await expect(name).toHaveValue('Three arms, as the practices call them');
  await save.click();
  await expect(told).toHaveText('Saved');
});
