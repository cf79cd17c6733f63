import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { expect, expectFaults, stillfoot, studyId, test } from './journey.js';

const standards = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa'];

/** Sentinels of Fluent's focus management: hidden, and passing the focus on the moment they get it. */
const focusSentinels = '[data-tabster-dummy]';

/** Looks at the page as it stands, in light and dark, at each width. */
async function expectAccessible(page: Page, widths: readonly number[] = [1440, 390]): Promise<void> {
  for (const colorScheme of ['light', 'dark'] as const) {
    for (const width of widths) {
      await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
      await page.setViewportSize({ width, height: 900 });
      await expect(page.locator('html')).toHaveCSS('color-scheme', colorScheme);
      await settled(page);
      const variant = `${colorScheme}, ${width} px`;
      const axe = new AxeBuilder({ page }).withTags(standards).exclude(focusSentinels);
      const { violations } = await axe.analyze();
      const found = violations.flatMap(({ id, nodes }) =>
        nodes.map(({ html, any }) => `${id}: ${html} ${any.map(({ message }) => message).join(' ')}`),
      );
      expect.soft(found, variant).toEqual([]);
      const overflow = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      expect.soft(overflow, `sideways scroll, ${variant}`).toBeLessThanOrEqual(0);
    }
  }
}

/** Colours fade, and an element's fading may set off its children's: nobody reads what is half way through. */
async function settled(page: Page): Promise<void> {
  await page.evaluate(async () => {
    const frame = () => new Promise((resolve) => requestAnimationFrame(resolve));
    // In what is folded away a fading stays on the list after its end.
    const moves = () => document.getAnimations().some(({ playState }) => playState !== 'finished');
    for (let still = 0; still < 5; still = moves() ? 0 : still + 1) await frame();
  });
}

test.describe.configure({ mode: 'parallel' });

test('the sign-in page', async ({ page }) => {
  await page.goto('/sign-in');
  await expect(page.getByRole('button', { name: /Tomas Arrivel/ })).toBeVisible();
  await expectAccessible(page);
});

test.describe('for those who make a study', () => {
  test.beforeEach(async ({ signIn }) => signIn('Jun Oyelaran'));

  const pages = [
    { path: 'question', heading: 'Question', holds: ['form', 'Question'] },
    { path: 'ledger', heading: 'Ledger', holds: ['list', 'Planning values'] },
    { path: 'costs', heading: 'Costs', holds: ['form', 'Costs and accrual'] },
    { path: 'members', heading: 'Members', holds: ['form', 'Add a member'] },
    { path: 'history', heading: 'History', holds: ['list', 'Changes'] },
  ] as const;
  for (const { path, heading, holds } of pages) {
    test(`the ${path} of a study`, async ({ page }) => {
      await page.goto(`/studies/${await studyId(page, 'Greenkettle')}/${path}`);
      await expect(page.getByRole('heading', { level: 1, name: heading })).toBeVisible();
      const [role, name] = holds;
      await expect(page.getByRole(role, { name })).toBeVisible();
      await expectAccessible(page);
    });
  }

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

  test('limits, a ruling and a dialog over them', async ({ page }) => {
    await page.goto(`/studies/${await studyId(page, 'Greenkettle')}/weigh`);
    await expect(page.getByText('Ruled out by Jun Oyelaran')).toBeVisible();
    await expectAccessible(page);
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

  test('the profile', async ({ page }) => {
    await page.goto('/profile');
    await expect(page.getByRole('heading', { level: 1, name: 'Profile' })).toBeVisible();
    await expectAccessible(page);
  });
});

test('the people, for the administrator', async ({ page, signIn }) => {
  await signIn('Sable Wexley');
  await page.goto('/admin');
  await expect(page.getByRole('form', { name: 'Add a person' })).toBeVisible();
  await expect(page.getByText('Tomas Arrivel').first()).toBeVisible();
  await expectAccessible(page);
});

test.describe('for someone signed in', () => {
  test.beforeEach(async ({ signIn }) => signIn(stillfoot.methodologist));

  test('the studies', async ({ page }) => {
    await page.goto('/');
    await expect(page.getByRole('link', { name: 'Stillfoot' })).toBeVisible();
    await expectAccessible(page);
    await page.getByRole('button', { name: 'Account: Tomas Arrivel' }).click();
    await expect(page.getByRole('button', { name: 'Sign out' })).toBeVisible();
    await expectAccessible(page);
  });

  test('the options weighed', async ({ page }) => {
    await page.goto(`/studies/${await studyId(page, 'Stillfoot')}/weigh`);
    await expect(page.getByRole('table', { name: 'Options', exact: true })).toBeVisible();
    await expectAccessible(page);
    await page.getByRole('button', { name: 'Table' }).click();
    await expectAccessible(page);
  });

  test('an option over the whole of a small screen, and its working', async ({ page }) => {
    await page.setViewportSize({ width: 390, height: 900 });
    await page.goto(`/studies/${await studyId(page, 'Stillfoot')}/weigh`);
    await page.getByRole('button', { name: 'C Crossover' }).click();
    const sheet = page.getByRole('dialog', { name: 'C Crossover' });
    await expect(sheet).toBeVisible();
    await expectAccessible(page, [390]);
    await sheet.getByRole('link', { name: 'Working' }).click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText('Crossover');
    await expectAccessible(page);
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
