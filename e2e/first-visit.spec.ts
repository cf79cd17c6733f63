import { ScratchServer } from '../scripts/lib/scratch-server.mjs';
import { expect, expectFaults, test } from './journey.js';

const administrator = {
  name: 'Wilma Tarn',
  email: 'wilma.tarn@example.org',
  password: 'a quiet lake at dusk',
};

test('the first visit to an empty installation creates its administrator, once', async ({ page, faults }) => {
  const server = await ScratchServer.start({ STEELYARD_DEMO: 'off' });
  try {
    const link = server.output.match(/http\S+\/welcome\/(\S+)/);
    const code = link?.[1] ?? '';
    expect(code.length, server.output).toBeGreaterThan(15);
    expect(server.output).not.toContain('Demo accounts');

    await page.goto(server.origin);
    await expect(page).toHaveURL(/\/sign-in$/);
    await page.getByLabel('Code from the server’s console').fill(code);
    await page.getByRole('button', { name: 'Go on' }).click();
    const form = page.getByRole('form', { name: 'Create the administrator' });
    await form.getByLabel('Name').fill(administrator.name);
    await form.getByLabel('E-mail').fill(administrator.email);
    await form.getByLabel('Password').fill(administrator.password);
    await form.getByLabel('Code from the server’s console').fill('not the code');
    await form.getByRole('button', { name: 'Create the administrator' }).click();
    await expect(form.getByLabel('Code from the server’s console')).toBeFocused();
    await expect(form.getByLabel('Name')).toHaveValue(administrator.name);
    expectFaults(faults, /status of 422/);

    await form.getByLabel('Code from the server’s console').fill(code);
    await form.getByRole('button', { name: 'Create the administrator' }).click();
    await expect(page.getByRole('heading', { name: 'No studies yet' })).toBeVisible();
    await expect(page.getByRole('button', { name: `Account: ${administrator.name}` })).toBeVisible();

    const again = await page.request.post(`${server.origin}/api/first-visit`, {
      data: { ...administrator, email: 'someone.else@example.org', code },
    });
    expect(again.ok()).toBe(false);
    const access = await page.request.get(`${server.origin}/api/access`);
    expect(await access.json()).toEqual({ firstVisit: false, demo: null });
  } finally {
    await server.stop();
  }
});
