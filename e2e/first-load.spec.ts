import { bytesOf, mostScript, scriptsOfFirstLoad } from '../scripts/lib/first-load.mjs';
import { expect, stillfoot, studyId, test } from './journey.js';

test('the first load of Weigh takes few scripts', async ({ page, signIn }) => {
  await signIn(stillfoot.methodologist);
  const scripts = await scriptsOfFirstLoad(page, `/studies/${await studyId(page, 'Stillfoot')}/weigh`);
  await expect(page.getByRole('table', { name: 'Options' })).toBeVisible();
  await expect(page.getByRole('region', { name: /^Option [A-Z]$/ })).toBeVisible();
  const bytes = bytesOf(scripts);
  expect(bytes, 'the scripts were counted').toBeGreaterThan(100_000);
  expect(bytes).toBeLessThan(mostScript);
});
