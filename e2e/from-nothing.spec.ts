import type { Locator, Page } from '@playwright/test';
import { ScratchServer } from '../scripts/lib/scratch-server.mjs';
import { enter, expect, test } from './journey.js';
import { beamsCard, figuresShown } from './options-table.js';

const person = 'Tomas Arrivel';
const question = 'Does a daily walk on the ward shorten the days to safe discharge by 5?';

/**
 * Sizes at power 90 % from noncentral t in R, for a standard deviation of 10, a correlation with the baseline of 0.5,
 * one within persons of 0.5, an ICC of 0.05 over wards of 20 with a coefficient of variation of 0.3 and attrition of
 * 10 %. Money and months by hand: 100,000 + 2,000 a month + 300 for each one recruited; 6 months to start, 10 people
 * a month, 6 of follow-up (in the crossover two periods of 6 and a month between them), 4 to close.
 */
const expected = [
  ['A Parallel', 172, 192, 228_000, 35.2, 'No walk 114,000 €; Daily walk 114,000 €'],
  ['B Adjusted for the first week', 130, 146, 205_000, 30.6, 'No walk 102,500 €; Daily walk 102,500 €'],
  [
    'C Multi-arm',
    303,
    339,
    301_500,
    49.9,
    'No walk 100,500 €; Daily walk 100,500 €; Walk and stairs 100,500 €',
  ],
  ['D Crossover', 46, 52, 172_000, 28.2, 'No walk 86,000 €; Daily walk 86,000 €'],
  ['E Cluster', 400, 460, 362_000, 62, 'No walk 181,000 €; Daily walk 181,000 €'],
];

const shared =
  'Patience has limits on a ward: those who may not walk see their neighbours do it, and follow.';
const why = 'It asks the fewest people for an answer, and the wards can keep to two periods.';
const whyNot = {
  A: 'Four times as many people for the same answer.',
  B: 'The first week says less of the later ones than we assumed.',
  C: 'It breaks both limits; the stairs can wait for a study of their own.',
};

/** Newest first. */
const deeds = [
  'chose option “Crossover”',
  'ruled on option “Cluster”',
  'added limits',
  'added planning value “CV of cluster size”',
  'added planning value “ICC”',
  'added option “Cluster”',
  'added option “Crossover”',
  'added option “Multi-arm”',
  'changed option “Parallel 2”',
  'added option “Parallel 2”',
  'changed the question',
  'created the study',
];

const side = (page: Page) => page.getByRole('navigation', { name: 'Study' });
const options = (page: Page) => page.getByRole('table', { name: 'Options', exact: true });
const rowOf = (page: Page, title: string): Locator =>
  options(page)
    .getByRole('row')
    .filter({ has: page.getByRole('rowheader', { name: title }) });

async function startStudy(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'New study' }).click();
  const form = page.getByRole('form', { name: 'New study' });
  await form.getByRole('textbox', { name: 'Question', exact: true }).fill(question);
  await form.getByRole('textbox', { name: 'Name of the study', exact: true }).fill('Wardwalk');
  await form.getByRole('textbox', { name: 'Organisation', exact: true }).fill('Pennywell General Hospital');
  await form.getByRole('textbox', { name: 'Control', exact: true }).fill('No walk');
  await form.getByRole('textbox', { name: 'Active treatment', exact: true }).fill('Daily walk');
  await form.getByRole('textbox', { name: 'Outcome', exact: true }).fill('Days to safe discharge');
  await form.getByRole('textbox', { name: 'Unit', exact: true }).fill('days');
  await form.getByRole('textbox', { name: 'Target difference', exact: true }).fill('-5');
  await form.getByRole('textbox', { name: 'Standard deviation', exact: true }).fill('10');
  await form.getByRole('button', { name: 'Start weighing' }).click();
}

/** A third treatment and a word for clusters, without which some families cannot be added. */
async function widenQuestion(page: Page): Promise<void> {
  await side(page).getByRole('link', { name: 'Question' }).click();
  const form = page.getByRole('form', { name: 'Question' });
  await form.getByRole('button', { name: 'Add a treatment' }).click();
  await form.getByRole('textbox', { name: 'Active treatment 2', exact: true }).fill('Walk and stairs');
  await form.getByRole('textbox', { name: 'One cluster', exact: true }).fill('ward');
  await form.getByRole('textbox', { name: 'Several clusters', exact: true }).fill('wards');
  await form.getByRole('button', { name: 'Save the question' }).click();
  await expect(form.getByText('Saved. No option moved.')).toBeVisible();
  await side(page).getByRole('link', { name: 'Weigh' }).click();
}

async function addOption(page: Page, family: string, letter: string): Promise<void> {
  await page.getByRole('button', { name: 'Add option' }).click();
  const dialog = page.getByRole('dialog', { name: 'Add an option' });
  await dialog.getByRole('button', { name: family, exact: true }).click();
  await expect(page.getByRole('region', { name: `Option ${letter}` })).toBeVisible();
  await expect(dialog).toHaveCount(0);
}

async function state(page: Page, label: string, value: string, source: string): Promise<void> {
  await page.getByRole('button', { name: `State ${label}`, exact: true }).click();
  const form = page.getByRole('form', { name: `Set ${label}` });
  await form.getByRole('textbox', { name: 'Value', exact: true }).fill(value);
  await form.getByRole('textbox', { name: 'Source', exact: true }).fill(source);
  await form.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByRole('button', { name: `Change ${label}`, exact: true })).toBeVisible();
}

/** What has been decided, as Weigh shows it. */
async function expectDecisions(page: Page): Promise<void> {
  await expect(page.getByRole('region', { name: 'Verdict' })).toContainText(
    'A, B and D fit every limit; D costs least, ends first and recruits the fewest participants.',
  );
  const limits = page.getByRole('list', { name: 'Limits' }).getByRole('listitem');
  await expect(limits).toHaveText(['≤ 24 wards', '≤ 30 each', '≤ 251 k€', '≤ 40 months'].map(spaced));
  await expect(rowOf(page, 'D Crossover')).toContainText('Fits');
  await expect(rowOf(page, 'C Multi-arm')).toContainText(/51.k€, 9\.9 months over/);
  await expect(rowOf(page, 'E Cluster')).toContainText(`Not admissible: ${shared}`);
  await expect(rowOf(page, 'E Cluster')).toContainText(`Ruled out by ${person}`);
  const choice = page.getByRole('region', { name: 'Choice' });
  await expect(choice).toContainText('Crossover');
  await expect(choice).toContainText(why);
  await expect(choice).toContainText(`Recorded by ${person}`);
  const against = choice.getByRole('list', { name: 'Why not the others' }).getByRole('listitem');
  await expect(against).toHaveCount(4);
  for (const [at, reason] of [...Object.values(whyNot), shared].entries()) {
    await expect(against.nth(at)).toContainText(reason);
  }
}

const spaced = (text: string) => new RegExp(`^${text.replaceAll(' ', '\\s')}$`);

test('a study made from nothing is weighed, limited, ruled on and settled, and outlives a power cut', async ({
  page,
}) => {
  test.setTimeout(120_000);
  const server = await ScratchServer.start({ STEELYARD_DEMO: 'on' });
  try {
    await page.goto(server.origin);
    await enter(page, person);

    await test.step('a new study lands on Weigh with a first option drawn', async () => {
      await startStudy(page);
      await expect(page).toHaveURL(/\/studies\/[^/]+\/weigh$/);
      await expect(page.getByRole('heading', { level: 1 })).toHaveText(question);
      await expect(options(page).getByRole('row')).toHaveCount(2);
      const beam = rowOf(page, 'A Parallel').getByRole('button', { name: /^Cost by arm/ });
      await expect(beam).toHaveAccessibleName(/No walk 114.k€, Daily walk 114.k€/);
    });

    await test.step('an option of each family joins it', async () => {
      await widenQuestion(page);
      await addOption(page, 'Parallel', 'B');
      const panel = page.getByRole('region', { name: 'Option B' });
      await panel.getByRole('button', { name: 'Edit' }).click();
      const form = panel.getByRole('form', { name: 'Option' });
      await form.getByRole('textbox', { name: 'Name', exact: true }).fill('Adjusted for the first week');
      await form.getByLabel(/^Measured more than once/).check();
      await form.getByRole('button', { name: 'Save' }).click();
      await expect(form.getByRole('status')).toHaveText('Saved');
      await addOption(page, 'Multi-arm', 'C');
      await addOption(page, 'Crossover', 'D');
      await addOption(page, 'Cluster', 'E');
      await expect(rowOf(page, 'E Cluster')).toContainText('ICC');
      await side(page).getByRole('link', { name: 'Ledger' }).click();
      await state(page, 'ICC', '0.05', 'Twelve wards of last winter');
      await state(page, 'CV of cluster size', '0.3', 'Beds of the wards');
      await side(page).getByRole('link', { name: 'Weigh' }).click();
    });

    await test.step('the cost of every arm is told', async () => {
      await beamsCard(page).getByRole('button', { name: 'Table' }).click();
      const shown = await figuresShown(page);
      expect(
        shown.map((row) => [row.name, row.analysed, row.recruited, row.money, row.months, row.byArm]),
      ).toEqual(expected);
      await beamsCard(page).getByRole('button', { name: 'Table' }).click();
    });

    await test.step('limits are set, one option is ruled out and another chosen', async () => {
      await page.getByRole('button', { name: 'Set limits' }).click();
      const limits = page.getByRole('dialog', { name: 'Limits' });
      await limits.getByRole('textbox', { name: 'Wards', exact: true }).fill('24');
      await limits.getByRole('textbox', { name: 'Participants in each ward', exact: true }).fill('30');
      await limits.getByRole('textbox', { name: 'Money', exact: true }).fill('250,500');
      await limits.getByRole('textbox', { name: 'Months', exact: true }).fill('40');
      await limits.getByRole('button', { name: 'Set the limits' }).click();
      await expect(limits).toHaveCount(0);

      await page.getByRole('button', { name: /^E Cluster/ }).click();
      await page
        .getByRole('region', { name: 'Option E' })
        .getByRole('button', { name: 'Rule on it' })
        .click();
      const ruling = page.getByRole('dialog', { name: 'Ruling on Cluster' });
      await ruling.getByRole('radio', { name: 'Not admissible' }).check();
      await ruling.getByRole('textbox', { name: 'Reason', exact: true }).fill(shared);
      await ruling.getByRole('button', { name: 'Rule', exact: true }).click();
      await expect(ruling).toHaveCount(0);

      await page
        .getByRole('region', { name: 'Verdict' })
        .getByRole('button', { name: 'Record the choice' })
        .click();
      const choice = page.getByRole('dialog', { name: 'Record the choice' });
      await expect(choice.getByRole('radio')).toHaveCount(4);
      await choice.getByRole('radio', { name: 'D, Crossover' }).check();
      await choice.getByRole('textbox', { name: 'Why this one', exact: true }).fill(why);
      for (const [letter, reason] of Object.entries(whyNot)) {
        await choice.getByLabel(new RegExp(`^Why not ${letter},`)).fill(reason);
      }
      await choice.getByRole('button', { name: 'Record the choice' }).click();
      await expect(choice).toHaveCount(0);
      await expectDecisions(page);
    });

    const weighed = await options(page).textContent();
    const address = page.url();
    await page.getByRole('button', { name: `Account: ${person}` }).click();
    await page.getByRole('button', { name: 'Sign out' }).click();
    await expect(page).toHaveURL(/\/sign-in$/);
    await expect(page.getByRole('button', { name: new RegExp(person) })).toBeVisible();
    await server.kill();
    await server.launch();

    await test.step('after the power cut all of it is there', async () => {
      await page.goto(server.origin);
      await enter(page, person);
      const study = page
        .getByRole('list', { name: 'Studies' })
        .getByRole('listitem')
        .filter({ hasText: 'Wardwalk' });
      await expect(study).toContainText('Methodologist');
      await expect(study).toContainText('Chosen: D, Crossover');
      await study.getByRole('link', { name: 'Wardwalk' }).click();
      await expectDecisions(page);
      expect(await options(page).textContent()).toBe(weighed);
      expect(new URL(page.url()).pathname).toBe(new URL(address).pathname);

      await side(page).getByRole('link', { name: 'History' }).click();
      const entries = page.getByRole('list', { name: 'Changes' }).getByRole('listitem');
      await expect(entries).toContainText(deeds.map((deed) => `${person} ${deed}`));
      for (const reason of Object.values(whyNot)) await expect(entries.first()).toContainText(reason);
      await expect(entries.nth(1)).toContainText(shared);
    });
  } finally {
    await server.stop();
  }
});
