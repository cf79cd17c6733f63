import { expect, expectFaults, studyId, test } from './journey.js';

const newcomer = {
  name: 'Edda Marrow',
  email: 'edda.marrow@bristlecone.example',
  password: 'eleven herons on a jetty',
};

test('somebody comes in by a one-time link, once, and sees the study they are added to', async ({
  page,
  elsewhere,
  context,
  signIn,
  faults,
}) => {
  await signIn('Sable Wexley');
  await page.goto('/admin');
  const account = page.getByRole('form', { name: 'Add a person' });
  await account.getByLabel('Name').fill(newcomer.name);
  await account.getByLabel('E-mail').fill(newcomer.email);
  await account.getByRole('button', { name: 'Add the person' }).click();
  const told = page.getByRole('dialog', { name: `Link for ${newcomer.name}` });
  const link = await told.getByLabel('One-time link').inputValue();
  await told.getByRole('button', { name: 'Done' }).click();
  await expect(page.getByRole('list', { name: 'Record' }).getByRole('listitem').first()).toContainText(
    newcomer.name,
  );

  await elsewhere.goto(link);
  await expect(elsewhere.getByText(newcomer.email)).toBeVisible();
  await elsewhere.getByLabel('Password').fill(newcomer.password);
  await elsewhere.getByRole('button', { name: 'Set the password and sign in' }).click();
  await expect(elsewhere.getByRole('heading', { name: 'No studies yet' })).toBeVisible();
  await elsewhere.getByRole('button', { name: `Account: ${newcomer.name}` }).click();
  await elsewhere.getByRole('button', { name: 'Sign out' }).click();
  await elsewhere.goto(link);
  await expect(elsewhere.getByText('This link lets nobody in any more')).toBeVisible();
  expectFaults(faults, /status of 404/);

  await context.clearCookies();
  await signIn('Renske Aalderink');
  await page.goto(`/studies/${await studyId(page, 'Nimblegrip')}/members`);
  const membership = page.getByRole('form', { name: 'Add a member' });
  await membership.getByLabel('E-mail').fill(newcomer.email);
  await membership.getByRole('radio', { name: /^Reader/ }).check();
  await membership.getByRole('button', { name: 'Add the member' }).click();
  await expect(page.getByText(`Added ${newcomer.email} as reader.`)).toBeVisible();

  await elsewhere.goto('/sign-in');
  const form = elsewhere.getByRole('form', { name: 'Sign in' });
  await form.getByLabel('E-mail').fill(newcomer.email);
  await form.getByLabel('Password').fill(newcomer.password);
  await form.getByRole('button', { name: 'Sign in' }).click();
  const studies = elsewhere.getByRole('list', { name: 'Studies' }).getByRole('listitem');
  await expect(studies).toHaveCount(1);
  await studies.getByRole('link', { name: 'Nimblegrip' }).click();
  await expect(elsewhere.getByRole('table', { name: 'Options', exact: true })).toBeVisible();
});
