import { screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { openApp } from './open-app';
import { answer, person, problem, server } from './server';

/** A person as a server keeps them, with a version that every change raises. */
async function openProfile() {
  let profile = { ...person, version: 3 };
  const sent: unknown[] = [];
  server.use(
    answer.session(),
    answer.studies(),
    answer.access(),
    http.get('*/api/profile', () => HttpResponse.json(profile)),
    http.put('*/api/profile', async ({ request }) => {
      const body = (await request.json()) as { version: number; name: string };
      sent.push(body);
      if (body.version !== profile.version) return problem(409, 'stale', { current: profile });
      profile = { ...profile, name: body.name, version: profile.version + 1 };
      return HttpResponse.json(profile);
    }),
    http.put('*/api/profile/password', async ({ request }) => {
      sent.push(await request.json());
      profile = { ...profile, version: profile.version + 1 };
      return new HttpResponse(null, { status: 204 });
    }),
  );
  const app = openApp('/');
  await app.user.click(await screen.findByRole('button', { name: 'Account: Tomas Arrivel' }));
  await app.user.click(screen.getByRole('link', { name: 'Profile' }));
  await screen.findByRole('heading', { name: 'Profile' });
  const changeElsewhere = (name: string) => {
    profile = { ...profile, name, version: profile.version + 1 };
  };
  return { ...app, sent, changeElsewhere };
}

describe('The profile', () => {
  it('is reached from the account’s panel and changes the name wherever it is shown', async () => {
    const { user, sent, address } = await openProfile();
    expect(address()).toBe('/profile');
    expect(screen.getByText('You sign in as tomas.arrivel@brackwater.example.')).toBeVisible();
    expect(screen.queryByRole('link', { name: 'People' })).not.toBeInTheDocument();
    const name = screen.getByLabelText('Name');
    await user.clear(name);
    await user.type(name, 'Tomas Quill');
    await user.click(screen.getByRole('button', { name: 'Save the name' }));
    expect(await screen.findByText('Your name is saved.')).toBeVisible();
    expect(screen.getByRole('button', { name: 'Account: Tomas Quill' })).toBeVisible();
    expect(sent).toEqual([{ version: 3, name: 'Tomas Quill' }]);
    expect(document.title).toBe('Profile · Steelyard');
  });

  it('refuses an empty name at the field', async () => {
    const { user, sent } = await openProfile();
    await user.clear(screen.getByLabelText('Name'));
    await user.click(screen.getByRole('button', { name: 'Save the name' }));
    expect(await screen.findByText('Enter your name.')).toBeVisible();
    expect(sent).toEqual([]);
  });

  it('that was changed elsewhere shows both names, keeps the typed one and lets the person decide', async () => {
    const { user, changeElsewhere } = await openProfile();
    changeElsewhere('T. Arrivel');
    const name = screen.getByLabelText('Name');
    await user.clear(name);
    await user.type(name, 'Tomas Quill');
    await user.click(screen.getByRole('button', { name: 'Save the name' }));
    const conflict = within(await screen.findByRole('alert'));
    expect(conflict.getByText('Another session of yours saved first')).toBeVisible();
    expect(conflict.getByRole('row', { name: 'Name Tomas Quill T. Arrivel' })).toBeVisible();
    expect(name).toHaveValue('Tomas Quill');
    await user.click(conflict.getByRole('button', { name: 'Go on with mine' }));
    await user.click(screen.getByRole('button', { name: 'Save the name' }));
    expect(await screen.findByText('Your name is saved.')).toBeVisible();
    expect(screen.queryByRole('alert')).not.toBeInTheDocument();
  });

  it('takes a new password, and the name after it', async () => {
    const { user, sent } = await openProfile();
    await user.type(screen.getByLabelText('Current password'), 'steelyard-demo');
    await user.type(screen.getByLabelText('New password'), 'a barrel of brass weights');
    await user.click(screen.getByRole('button', { name: 'Change the password' }));
    expect(await screen.findByText(/Your password is changed/)).toBeVisible();
    expect(sent).toEqual([{ current: 'steelyard-demo', next: 'a barrel of brass weights' }]);
    expect(screen.getByLabelText('Current password')).toHaveValue('');
    await user.type(screen.getByLabelText('Name'), ' II');
    await user.click(screen.getByRole('button', { name: 'Save the name' }));
    expect(await screen.findByText('Your name is saved.')).toBeVisible();
  });

  it('says at the field that the new password is short, or the current one wrong', async () => {
    const { user } = await openProfile();
    server.use(
      http.put('*/api/profile/password', () =>
        problem(422, 'invalid', { issues: [{ path: 'current', message: 'This is not your password.' }] }),
      ),
    );
    await user.type(screen.getByLabelText('Current password'), 'wrong');
    await user.type(screen.getByLabelText('New password'), 'short');
    await user.click(screen.getByRole('button', { name: 'Change the password' }));
    expect(await screen.findByText('Choose a password of 12 characters or more.')).toBeVisible();
    await user.type(screen.getByLabelText('New password'), ' no more, long now');
    await user.click(screen.getByRole('button', { name: 'Change the password' }));
    expect(await screen.findByText('This is not your password.')).toBeVisible();
    expect(screen.getByLabelText('Current password')).toBeInvalid();
  });

  it('signs out everywhere', async () => {
    const { user, address, queryClient } = await openProfile();
    server.use(
      answer.session(null),
      http.delete('*/api/sessions', () => new HttpResponse(null, { status: 204 })),
    );
    await user.click(screen.getByRole('button', { name: 'Sign out everywhere' }));
    expect(await screen.findByRole('heading', { name: 'Sign in' })).toBeVisible();
    expect(address()).toBe('/sign-in');
    await waitFor(() => expect(queryClient.getQueryData(['profile'])).toBeUndefined());
  });

  it('says that signing out everywhere did not succeed', async () => {
    const { user } = await openProfile();
    server.use(http.delete('*/api/sessions', () => HttpResponse.error()));
    await user.click(screen.getByRole('button', { name: 'Sign out everywhere' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('The server cannot be reached.');
  });

  it('of a session that has ended leads to the sign-in page and back', async () => {
    const { user, address } = await openProfile();
    server.use(
      answer.session(null),
      http.put('*/api/profile', () => problem(401, 'signed-out')),
    );
    await user.click(screen.getByRole('button', { name: 'Save the name' }));
    await waitFor(() => expect(address()).toBe('/sign-in?from=%2Fprofile'));
  });
});
