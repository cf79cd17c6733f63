import { expect, expectFaults, stillfoot, studyId, test } from './journey.js';

test('a reader opens the draft', async ({ page, signIn }) => {
  await signIn(stillfoot.reader);
  await page.goto('/');
  const studies = page.getByRole('list', { name: 'Studies' }).getByRole('listitem');
  await expect(studies).toHaveCount(1);
  await expect(studies).toContainText('Reader');
  await studies.getByRole('link', { name: 'Stillfoot' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('vantholine foot gel');
});

test('a reader reads all that was entered and finds nothing to change', async ({ page, signIn }) => {
  await signIn(stillfoot.reader);
  const id = await studyId(page, 'Stillfoot');
  const told = {
    question: 'Mean pain, 0–10, over the last 7 days of a 6-week period',
    ledger: 'Set by Tomas Arrivel',
    costs: '239,000',
    weigh: 'Parallel, baseline-adjusted',
    members: 'Ilse Quennell',
    history: 'created the study',
  };
  for (const [path, text] of Object.entries(told)) {
    await page.goto(`/studies/${id}/${path}`);
    await expect(page.getByRole('main').getByText(text).first(), path).toBeVisible();
    await expect(page.getByRole('textbox'), path).toHaveCount(0);
    const deeds = page.getByRole('button', {
      name: /^(Save|Set|Change|State|Add|Remove|Duplicate|Rule|Record)/,
    });
    await expect(deeds, path).toHaveCount(0);
  }
});

test('a funder sees that nothing is submitted yet, and no draft', async ({ page, signIn, faults }) => {
  await signIn(stillfoot.funder);
  await page.goto('/');
  const study = page.getByRole('list', { name: 'Studies' }).getByRole('listitem');
  await expect(study.getByRole('heading', { name: 'Stillfoot' })).toBeVisible();
  await expect(study).toContainText('Nothing has been submitted to you yet');
  await expect(study.getByRole('link')).toHaveCount(0);

  const id = await studyId(page, 'Stillfoot');
  for (const part of ['', '/planning-values', '/costs', '/design-set', '/weigh']) {
    expect((await page.request.get(`/api/studies/${id}${part}`)).status()).toBe(404);
  }
  await page.goto(`/studies/${id}/weigh`);
  await expect(page.getByText('There is no study here')).toBeVisible();
  await expect(page.getByText('vantholine')).toHaveCount(0);
  expectFaults(faults, /status of 404|There is no such study/);
});
