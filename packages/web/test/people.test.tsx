import { cleanup, screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it, vi } from 'vitest';
import { openApp } from './open-app';
import { answer, person, problem, server } from './server';

const ada = { ...person, name: 'Ada Merrow', email: 'ada.merrow@example.org', administrator: true };
const until = new Date(Date.now() + 6 * 86_400_000).toISOString();

function openPeople(who: object = ada, path = '/') {
  const people: object[] = [{ ...ada, linkExpiresAt: null }];
  const sent: unknown[] = [];
  const invited = { id: '33333333-3333-4333-8333-333333333333', administrator: false, linkExpiresAt: until };
  server.use(
    answer.session(who),
    answer.studies(),
    http.get('*/api/people', () => HttpResponse.json({ people })),
    http.get('*/api/audit', () =>
      HttpResponse.json({
        entries: [
          {
            id: 5,
            at: new Date().toISOString(),
            by: 'Ilse Quennell',
            action: 'welcomed',
            what: 'account of Ilse Quennell <ilse@example.org>',
            before: null,
            after: null,
          },
          {
            id: 4,
            at: new Date(Date.now() - 2 * 86_400_000).toISOString(),
            by: 'Ada Merrow',
            action: 'added',
            what: 'account of Ilse Quennell <ilse@example.org>',
            before: null,
            after: { email: 'ilse@example.org' },
          },
        ],
        next: null,
      }),
    ),
    http.post('*/api/people', async ({ request }) => {
      const body = (await request.json()) as object;
      sent.push(body);
      const account = { ...invited, ...body };
      people.push(account);
      return HttpResponse.json({ person: account, link: '/welcome/tok-1' }, { status: 201 });
    }),
    http.post('*/api/people/:id/link', ({ params }) => {
      sent.push(params.id);
      return HttpResponse.json(
        { person: { ...ada, linkExpiresAt: until }, link: '/welcome/tok-2' },
        { status: 201 },
      );
    }),
  );
  return { ...openApp(path), sent };
}

async function goToPeople(who?: object) {
  const app = openPeople(who);
  await app.user.click(await screen.findByRole('button', { name: 'Account: Ada Merrow' }));
  await app.user.click(screen.getByRole('link', { name: 'People' }));
  await screen.findByRole('list', { name: 'People' });
  return app;
}

async function addIlse(user: ReturnType<typeof openApp>['user']) {
  await user.type(screen.getByLabelText('Name'), 'Ilse Quennell');
  await user.type(screen.getByLabelText('E-mail'), 'Ilse@example.org');
  await user.click(screen.getByRole('button', { name: 'Add the person' }));
}

describe('The people of an installation', () => {
  it('are listed for an administrator, with what was done to them', async () => {
    const { address } = await goToPeople();
    expect(address()).toBe('/admin');
    const row = within(screen.getByRole('list', { name: 'People' })).getByRole('listitem');
    expect(row).toHaveTextContent('Ada Merrow');
    expect(row).toHaveTextContent('ada.merrow@example.org');
    expect(within(row).getByText('Administrator')).toBeVisible();
    const record = await screen.findByRole('list', { name: 'Record' });
    expect(record).toHaveTextContent('Ada Merrow added account of Ilse Quennell <ilse@example.org>');
    expect(record).toHaveTextContent(
      'Ilse Quennell came in by the one-time link for account of Ilse Quennell',
    );
    expect(within(record).getByRole('row', { name: 'E-mail ilse@example.org' })).toBeVisible();
  });

  it('that cannot be had leave the record to be read, and the other way round', async () => {
    openPeople(ada, '/admin');
    server.use(http.get('*/api/people', () => problem(403, 'forbidden', { title: 'Not now' })));
    expect(await screen.findByText(/The list of people could not be shown/)).toBeVisible();
    expect(await screen.findByRole('list', { name: 'Record' })).toBeVisible();
    cleanup();
    openPeople(ada, '/admin');
    server.use(http.get('*/api/audit', () => problem(403, 'forbidden', { title: 'Not now' })));
    expect(await screen.findByText(/The record could not be shown/)).toBeVisible();
    expect(await screen.findByRole('list', { name: 'People' })).toBeVisible();
  });

  it('are nobody else’s business', async () => {
    server.use(answer.session(), answer.studies());
    openApp('/admin');
    expect(await screen.findByRole('heading', { name: 'This page is for administrators' })).toBeVisible();
    expect(screen.queryByRole('list', { name: 'People' })).not.toBeInTheDocument();
  });

  it('grow by a link that is shown once and can be copied', async () => {
    const { user, sent } = await goToPeople();
    await addIlse(user);
    const dialog = within(await screen.findByRole('dialog', { name: 'Link for Ilse Quennell' }));
    const link = new URL('/welcome/tok-1', location.origin).href;
    expect(dialog.getByLabelText('One-time link')).toHaveValue(link);
    await user.click(dialog.getByRole('button', { name: 'Copy the link' }));
    expect(await dialog.findByText('Copied.')).toBeVisible();
    expect(await navigator.clipboard.readText()).toBe(link);
    await user.click(dialog.getByRole('button', { name: 'Done' }));
    expect(sent).toEqual([{ name: 'Ilse Quennell', email: 'ilse@example.org', administrator: false }]);
    await waitFor(() => expect(screen.queryByDisplayValue(link)).not.toBeInTheDocument());
    expect(await screen.findByText(/Has a link that was not used yet; it works until/)).toBeVisible();
    expect(screen.getByLabelText('Name')).toHaveValue('');
  });

  it('get a link that can be copied by hand where the browser refuses', async () => {
    const { user } = await goToPeople();
    vi.spyOn(navigator.clipboard, 'writeText').mockRejectedValueOnce(new Error('not allowed'));
    await addIlse(user);
    await user.click(await screen.findByRole('button', { name: 'Copy the link' }));
    expect(await screen.findByText(/copy it by hand/)).toBeVisible();
    const field = screen.getByLabelText<HTMLInputElement>('One-time link');
    expect(field.selectionEnd).toBe(field.value.length);
  });

  it('are refused at the field without a name, or with an address that somebody has', async () => {
    const { user } = await goToPeople();
    server.use(
      http.post('*/api/people', () =>
        problem(422, 'invalid', {
          issues: [{ path: 'email', message: 'Somebody has this e-mail address already.' }],
        }),
      ),
    );
    await user.type(screen.getByLabelText('E-mail'), 'ada.merrow@example.org');
    await user.click(screen.getByRole('button', { name: 'Add the person' }));
    expect(await screen.findByText('Enter the person’s name.')).toBeVisible();
    await user.type(screen.getByLabelText('Name'), 'Ada');
    await user.click(screen.getByRole('button', { name: 'Add the person' }));
    expect(await screen.findByText('Somebody has this e-mail address already.')).toBeVisible();
    expect(screen.getByLabelText('E-mail')).toHaveValue('ada.merrow@example.org');
  });

  it('get a new link once what it does has been read', async () => {
    const { user, sent } = await goToPeople();
    await user.click(screen.getByRole('button', { name: 'New link for Ada Merrow' }));
    const question = within(await screen.findByRole('dialog', { name: 'A new link for Ada Merrow?' }));
    expect(question.getByText(/A link made before stops working/)).toBeVisible();
    expect(sent).toEqual([]);
    await user.click(question.getByRole('button', { name: 'Make the link' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Link for Ada Merrow' }));
    expect(dialog.getByLabelText('One-time link')).toHaveValue(
      new URL('/welcome/tok-2', location.origin).href,
    );
    expect(sent).toEqual([ada.id]);
  });
});

describe('Somebody with a one-time link', () => {
  const welcome = (status: 'open' | 'over') =>
    server.use(
      answer.access(),
      answer.studies(),
      http.get('*/api/welcome/tok-1', () =>
        status === 'open'
          ? HttpResponse.json({ name: 'Ilse Quennell', email: 'ilse@example.org' })
          : problem(404, 'not-found'),
      ),
    );

  it('sees whose account it is, chooses a password and is in', async () => {
    welcome('open');
    let sent: unknown;
    server.use(
      http.post('*/api/welcome/tok-1', async ({ request }) => {
        sent = await request.json();
        return HttpResponse.json({ ...person, name: 'Ilse Quennell' });
      }),
    );
    const { user, address } = openApp('/welcome/tok-1');
    expect(await screen.findByText('Ilse Quennell')).toBeVisible();
    expect(screen.getByText(/ilse@example\.org/)).toBeVisible();
    await user.type(screen.getByLabelText('Password'), 'short');
    await user.click(screen.getByRole('button', { name: 'Set the password and sign in' }));
    expect(await screen.findByText('Choose a password of 12 characters or more.')).toBeVisible();
    await user.type(screen.getByLabelText('Password'), ' no more, long now');
    await user.click(screen.getByRole('button', { name: 'Set the password and sign in' }));
    expect(await screen.findByRole('button', { name: 'Account: Ilse Quennell' })).toBeVisible();
    expect(address()).toBe('/');
    expect(sent).toEqual({ password: 'short no more, long now' });
  });

  it('learns that it was used or is too old, and where to go', async () => {
    welcome('over');
    openApp('/welcome/tok-1');
    expect(await screen.findByText(/This link lets nobody in any more/)).toBeVisible();
    expect(screen.getByRole('link', { name: 'Sign in' })).toHaveAttribute('href', '/sign-in');
  });
});
