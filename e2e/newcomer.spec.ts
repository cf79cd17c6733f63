import { expect, stillfoot, studyId, test } from './journey.js';
import { beamsCard, figuresShown } from './options-table.js';

/** What the demo's design says of Stillfoot at power 90 %: money to the nearest 1 000 EUR, whole months. */
const expected = [
  { name: 'A Parallel, unadjusted', analysed: 188, recruited: 214, money: 490_000, months: 41 },
  { name: 'B Parallel, baseline-adjusted', analysed: 132, recruited: 150, money: 446_000, months: 31 },
  { name: 'C Crossover', analysed: 40, recruited: 50, money: 333_000, months: 18 },
];

interface Weighed {
  options: {
    letter: string;
    name: string;
    appraisal: {
      participants: number;
      recruited: number;
      power: number;
      costs: { total: number };
      timeline: { months: number };
    };
  }[];
}

test('a newcomer signs in through the demo, sees Stillfoot weighed, opens a working and signs out', async ({
  page,
}) => {
  await page.goto('/');
  await expect(page).toHaveURL(/\/sign-in$/);
  await expect(page.getByText('Your session has ended')).toHaveCount(0);
  await page.getByRole('button', { name: /Tomas Arrivel.*Methodologist, Stillfoot/ }).click();
  await page.getByRole('link', { name: 'Stillfoot' }).click();

  const options = page.getByRole('table', { name: 'Options', exact: true });
  const beams = [
    ['A Parallel, unadjusted', '490 k€', '41'],
    ['B Parallel, baseline-adjusted', '446 k€', '31'],
    ['C Crossover', '333 k€', '18'],
  ] as const;
  for (const [title, money, months] of beams) {
    const row = options.getByRole('row').filter({ has: page.getByRole('rowheader', { name: title }) });
    await expect(row.getByRole('cell', { name: money, exact: true })).toBeVisible();
    await expect(row.getByRole('cell', { name: months, exact: true })).toBeVisible();
  }

  await beamsCard(page).getByRole('button', { name: 'Table' }).click();
  const shown = await figuresShown(page);
  expect(
    shown.map(({ power, byArm, money, months, ...exact }) => ({
      ...exact,
      money: 1_000 * Math.round(money / 1_000),
      months: Math.round(months),
    })),
  ).toEqual(expected);
  for (const { power } of shown) expect(power).toBeGreaterThanOrEqual(90);

  await page.getByRole('region', { name: 'Option A' }).getByRole('link', { name: 'Working' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Parallel, unadjusted');
  await expect(page.getByRole('main').getByRole('math').first()).toBeVisible();
  const working = page.url();

  await page.getByRole('button', { name: 'Account: Tomas Arrivel' }).click();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page).toHaveURL(/\/sign-in$/);

  await page.goto(working);
  await expect(page).toHaveURL(/\/sign-in\?from=/);
  const form = page.getByRole('form', { name: 'Sign in' });
  await form.getByLabel('E-mail').fill('tomas.arrivel@brackwater.example');
  await form.getByLabel('Password').fill('steelyard-demo');
  await form.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).toHaveURL(working);
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Parallel, unadjusted');
});

test('the page, which computes for itself, shows what the server answers', async ({ page, signIn }) => {
  await signIn(stillfoot.methodologist);
  const id = await studyId(page, 'Stillfoot');
  await page.goto(`/studies/${id}/weigh`);
  await beamsCard(page).getByRole('button', { name: 'Table' }).click();
  const { options }: Weighed = await (await page.request.get(`/api/studies/${id}/weigh`)).json();
  expect(options).toHaveLength(3);
  const rounded = (value: number, places: number) => Number(value.toFixed(places));
  const shown = await figuresShown(page);
  expect(shown.map(({ byArm, ...figures }) => figures)).toEqual(
    options.map(({ letter, name, appraisal }) => ({
      name: `${letter} ${name}`,
      analysed: appraisal.participants,
      recruited: appraisal.recruited,
      power: rounded(100 * appraisal.power, 1),
      money: rounded(appraisal.costs.total, 0),
      months: rounded(appraisal.timeline.months, 1),
    })),
  );
});
