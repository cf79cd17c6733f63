import type { Page } from '@playwright/test';
import { paths } from '../packages/web/src/app/paths.js';
import { expectAccessible, twoLooks } from './accessible.js';
import { expect, expectFaults, studyId, test } from './journey.js';

const methodologist = 'Jun Oyelaran';
const administrator = 'Sable Wexley';

interface Place {
  study: string;
  option: string;
}

interface Visit {
  /** Who goes there; nobody has signed in where it is null. */
  as: string | null;
  at: (place: Place) => string;
  /** Buttons that open a dialog each. */
  dialogs?: readonly string[];
  /** Shows what a study holds, and so has an empty state. */
  holdsStudy?: true;
  /** What the server refuses there, which browsers log. */
  provokes?: RegExp;
  /** Asks the server for nothing when it opens. */
  asksNothing?: true;
}

const inStudy = (at: (place: Place) => string, dialogs: readonly string[] = []): Visit => ({
  as: methodologist,
  at,
  dialogs,
  holdsStudy: true,
});

/** How each page is visited; the test below fails for one that is not here. */
const visits: Record<keyof typeof paths, Visit> = {
  signIn: { as: null, at: () => paths.signIn },
  welcome: { as: null, at: () => paths.welcome('no-such-code'), provokes: /status of 404/ },
  studies: { as: methodologist, at: () => paths.studies },
  newStudy: { as: methodologist, at: () => paths.newStudy, asksNothing: true },
  profile: { as: methodologist, at: () => paths.profile },
  admin: { as: administrator, at: () => paths.admin, dialogs: ['New link for Tomas Arrivel'] },
  question: inStudy(({ study }) => paths.question(study)),
  ledger: inStudy(({ study }) => paths.ledger(study)),
  costs: inStudy(({ study }) => paths.costs(study)),
  weigh: inStudy(
    ({ study }) => paths.weigh(study),
    ['Add option', 'Record the choice', 'Change what is held', '≤ 32 catchments', 'Rule on it'],
  ),
  members: inStudy(
    ({ study }) => paths.members(study),
    ['Change the role of Amara Doss', 'Remove Amara Doss'],
  ),
  history: inStudy(({ study }) => paths.history(study)),
  working: { ...inStudy(({ study, option }) => paths.working(study, option)) },
};

/** The first option of the study, for pages that show one. */
async function optionOf(page: Page, study: string): Promise<string> {
  const { options }: { options: { id: string }[] } = await (
    await page.request.get(`/api/studies/${study}/design-set`)
  ).json();
  return options[0]?.id ?? 'none';
}

async function placeOf(page: Page, { as }: Visit): Promise<Place> {
  if (as !== methodologist) return { study: '', option: '' };
  const study = await studyId(page, 'Greenkettle');
  return { study, option: await optionOf(page, study) };
}

/** Past its skeletons, whatever it then shows. */
async function expectShown(page: Page): Promise<void> {
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await expect(page.getByLabel(/^Loading/)).toHaveCount(0);
}

test.describe.configure({ mode: 'parallel' });

for (const name of Object.keys(paths) as (keyof typeof paths)[]) {
  const visit = visits[name];

  test.describe(`the page ${name}`, () => {
    test.beforeEach(async ({ signIn }) => {
      if (visit.as) await signIn(visit.as);
    });

    test('is accessible with the demo in it, light and dark, wide and narrow', async ({ page, faults }) => {
      await page.goto(visit.at(await placeOf(page, visit)));
      await expectShown(page);
      await expectAccessible(page);
      if (visit.provokes) expectFaults(faults, visit.provokes);
    });

    if (visit.dialogs?.length) {
      test('is accessible under each of its dialogs', async ({ page }) => {
        test.setTimeout(120_000);
        await page.goto(visit.at(await placeOf(page, visit)));
        for (const opener of visit.dialogs ?? []) {
          await page.getByRole('button', { name: opener, exact: true }).first().click();
          await expect(page.getByRole('dialog')).toBeVisible();
          await expectAccessible(page, twoLooks);
          await page.setViewportSize({ width: 1440, height: 900 });
          await page.keyboard.press('Escape');
          await expect(page.getByRole('dialog')).toHaveCount(0);
        }
      });
    }

    if (!visit.asksNothing) {
      test('is accessible when the server cannot be reached', async ({ page, faults }) => {
        const at = visit.at(await placeOf(page, visit));
        await page.route(/\/api\/(?!session)/, (route) => route.abort('connectionfailed'));
        await page.goto(at);
        await expect(page.getByText(/could not be (shown|loaded|reached)/).first()).toBeVisible();
        await expectAccessible(page, twoLooks);
        expect(faults.length).toBeGreaterThan(0);
        faults.length = 0;
      });
    }
  });
}

test('the pages of a study that holds nothing are accessible', async ({ page, signIn }) => {
  test.setTimeout(180_000);
  await signIn(methodologist);
  const study = await emptyStudy(page);
  for (const { at, holdsStudy } of Object.values(visits)) {
    if (!holdsStudy) continue;
    await page.goto(at({ study, option: 'none' }));
    await expectShown(page);
    await expectAccessible(page, twoLooks);
  }
});

test('the list of studies is accessible for somebody who is in none', async ({ page, signIn }) => {
  await signIn(administrator);
  await page.goto(paths.studies);
  await expectShown(page);
  await expectAccessible(page, twoLooks);
});

/** A study from which the option that it began with has been taken away. */
async function emptyStudy(page: Page): Promise<string> {
  const started = await page.request.post('/api/studies', {
    data: {
      name: 'Nothing yet',
      organisation: 'Hollow Hill Clinic',
      question: 'Does anything help?',
      outcome: { kind: 'continuous', label: 'help', unit: 'points', difference: 1, better: 'higher' },
      sd: 2,
      participants: { one: 'participant', many: 'participants' },
      clusters: null,
      treatments: [{ name: 'nothing' }, { name: 'anything' }],
    },
  });
  expect(started.status()).toBe(201);
  const { id }: { id: string } = await started.json();
  const set = await (await page.request.get(`/api/studies/${id}/design-set`)).json();
  for (const option of (set as { options: { id: string; version: number }[] }).options) {
    const data = { version: option.version };
    const removed = await page.request.delete(`/api/studies/${id}/options/${option.id}`, { data });
    expect(removed.status()).toBe(200);
  }
  return id;
}
