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
