import { expectAccessible, twoLooks } from './accessible.js';
import { expect, expectFaults, stillfoot, studyId, test } from './journey.js';
import { beamsCard } from './options-table.js';

// States of a page that its visit does not meet; every-route.spec.ts looks at each page as it opens.

test.describe.configure({ mode: 'parallel' });

test.describe('for those who make a study', () => {
  test.beforeEach(async ({ signIn }) => signIn('Jun Oyelaran'));

  test('a planning value being set, with what it does to the options', async ({ page }) => {
    await page.goto(`/studies/${await studyId(page, 'Greenkettle')}/ledger`);
    await page.getByRole('button', { name: 'Change ICC' }).click();
    const form = page.getByRole('form', { name: 'Set ICC' });
    await form.getByLabel('Value').fill('0.05');
    await form.getByLabel('Source').clear();
    await form.getByRole('button', { name: 'Save' }).click();
    await expect(form.getByRole('alert')).toBeVisible();
    await expect(form.getByRole('table')).toBeVisible();
    await page.getByRole('button', { name: 'History of ICC' }).click();
    await expect(page.getByRole('table', { name: 'History of ICC' })).toBeVisible();
    await expectAccessible(page);
  });

  test('a choice that is refused in its dialog', async ({ page }) => {
    await page.goto(`/studies/${await studyId(page, 'Greenkettle')}/weigh`);
    await page.getByRole('button', { name: 'Record the choice' }).click();
    const dialog = page.getByRole('dialog', { name: 'Record the choice' });
    await dialog.getByRole('button', { name: 'Record the choice' }).click();
    await expect(dialog.getByText('Say why this option')).toBeVisible();
    await expectAccessible(page);
  });

  test('a new study', async ({ page }) => {
    await page.goto('/studies/new');
    const form = page.getByRole('form', { name: 'New study' });
    await form.getByRole('button', { name: 'Start weighing' }).click();
    await expect(form.getByRole('alert').first()).toBeVisible();
    await expectAccessible(page);
  });
});

test.describe('for someone signed in', () => {
  test.beforeEach(async ({ signIn }) => signIn(stillfoot.methodologist));

  test('the account’s menu', async ({ page }) => {
    await page.goto('/');
    await page.getByRole('button', { name: 'Account: Tomas Arrivel' }).click();
    await expect(page.getByRole('button', { name: 'Sign out' })).toBeVisible();
    await expectAccessible(page);
  });

  test('the options told against one of them, as beams and as a table', async ({ page }) => {
    await page.goto(`/studies/${await studyId(page, 'Stillfoot')}/weigh?beams=months`);
    await page.getByRole('combobox', { name: 'Told' }).selectOption({ label: 'Against A' });
    await expect(page.getByRole('button', { name: 'Back to the limits' })).toBeVisible();
    await page
      .getByRole('button', { name: /^Months by phase: / })
      .first()
      .focus();
    await expect(page.getByRole('table', { name: 'Parts by phase' })).toBeVisible();
    await expectAccessible(page);
    await beamsCard(page).getByRole('button', { name: 'Table' }).click();
    await expect(page.getByRole('table', { name: 'Options as a table' })).toBeVisible();
    await expectAccessible(page);
  });

  test('an option over the whole of a small screen', async ({ page }) => {
    await page.setViewportSize({ width: 390, height: 900 });
    await page.goto(`/studies/${await studyId(page, 'Stillfoot')}/weigh`);
    await page.getByRole('button', { name: 'C Crossover' }).click();
    const sheet = page.getByRole('dialog', { name: 'C Crossover' });
    await expect(sheet).toBeVisible();
    await expectAccessible(page, twoLooks.slice(1));
    await sheet.getByRole('link', { name: 'Working' }).click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText('Crossover');
  });

  test('an address without a page', async ({ page }) => {
    await page.goto('/no/such/page');
    await expect(page.getByRole('heading', { name: 'There is no page at this address' })).toBeVisible();
    await expectAccessible(page);
  });

  test('a study that is not there', async ({ page, faults }) => {
    await page.goto('/studies/6d0f7d0c-3a54-4c0e-9a53-0d9c8a3f1b22/weigh');
    await expect(page.getByText('There is no study here')).toBeVisible();
    await expectAccessible(page);
    expectFaults(faults, /status of 404|There is no such study/);
  });

  test('a page whose server has gone', async ({ page, demo, faults }) => {
    await page.goto('/');
    await expect(page.getByRole('link', { name: 'Stillfoot' })).toBeVisible();
    await demo.kill();
    try {
      await page.getByRole('link', { name: 'Stillfoot' }).click();
      await expect(page.getByText('could not be shown')).toBeVisible();
      await expectAccessible(page);
    } finally {
      await demo.launch();
    }
    expect(faults.length).toBeGreaterThan(0);
    faults.length = 0;
    await page.reload();
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  });
});
