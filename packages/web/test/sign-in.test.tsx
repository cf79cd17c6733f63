import { screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { openApp } from './open-app';
import { answer, person, problem, server } from './server';

const demo = {
  password: 'steelyard-demo',
  accounts: [
    { name: 'Tomas Arrivel', email: person.email, part: 'Methodologist, Stillfoot' },
    { name: 'Priya Venn', email: 'priya.venn@hollin-fund.example', part: 'Funder, Stillfoot' },
  ],
};

/** A server that lets one person in and remembers what it was sent. */
function doorFor(email: string, password: string) {
  const sent: unknown[] = [];
  let inside = false;
  server.use(
    answer.studies(),
    http.get('*/api/session', () => (inside ? HttpResponse.json(person) : problem(401, 'signed-out'))),
    http.post('*/api/session', async ({ request }) => {
      const body = (await request.json()) as { email: string; password: string };
      sent.push(body);
      inside = body.email === email && body.password === password;
      return inside
        ? HttpResponse.json(person, { status: 201 })
        : problem(401, 'signed-out', { detail: 'That e-mail address and password do not belong together.' });
    }),
  );
  return sent;
}

async function fillIn(user: ReturnType<typeof openApp>['user'], email: string, password: string) {
  await user.type(await screen.findByLabelText('E-mail'), email);
  await user.type(screen.getByLabelText('Password'), password);
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
}

describe('Signing in', () => {
  it('leads back to where one came from', async () => {
    server.use(answer.access());
    const sent = doorFor(person.email, 'a long enough password');
    const { user, address } = openApp('/somewhere?option=7');
    await screen.findByRole('heading', { name: 'Sign in' });
    expect(address()).toBe('/sign-in?from=%2Fsomewhere%3Foption%3D7');
    expect(document.title).toBe('Sign in · Steelyard');
    await fillIn(user, ' Tomas.Arrivel@brackwater.example', 'a long enough password');
    await waitFor(() => expect(address()).toBe('/somewhere?option=7'));
    expect(sent).toEqual([{ email: person.email, password: 'a long enough password' }]);
  });

  it('leads to the studies rather than to another site', async () => {
    server.use(answer.access());
    doorFor(person.email, 'a long enough password');
    const { user, address } = openApp('/sign-in?from=//elsewhere.example/studies');
    await fillIn(user, person.email, 'a long enough password');
    await screen.findByRole('heading', { name: 'Studies' });
    expect(address()).toBe('/');
  });

  it('shows a refusal at the form and keeps what was typed', async () => {
    server.use(answer.access());
    doorFor(person.email, 'a long enough password');
    const { user } = openApp('/sign-in');
    await fillIn(user, person.email, 'a wrong one');
    const form = screen.getByRole('form', { name: 'Sign in' });
    expect(await within(form).findByRole('alert')).toHaveTextContent(
      'That e-mail address and password do not belong together.',
    );
    expect(screen.getByLabelText('E-mail')).toHaveValue(person.email);
  });

  it('says when to try again after too many attempts', async () => {
    server.use(
      answer.access(),
      http.post('*/api/session', () => problem(429, 'too-many-attempts', { retryAfterSeconds: 40 })),
    );
    const { user } = openApp('/sign-in');
    await fillIn(user, person.email, 'a wrong one');
    expect(await screen.findByRole('alert')).toHaveTextContent(
      /Too many attempts\. Try again in 40 seconds, from \d\d:\d\d:\d\d on\./,
    );
  });

  it('asks for an e-mail address and a password before it asks the server', async () => {
    server.use(answer.access());
    const sent = doorFor(person.email, 'a long enough password');
    const { user } = openApp('/sign-in');
    await fillIn(user, 'tomas', ' {Backspace}');
    expect(await screen.findByText('Enter an e-mail address, such as ada@example.org.')).toBeVisible();
    expect(screen.getByText('Enter your password.')).toBeVisible();
    expect(screen.getByLabelText('E-mail')).toBeInvalid();
    expect(sent).toEqual([]);
  });

  it('says that the server cannot be reached', async () => {
    server.use(
      answer.access(),
      http.post('*/api/session', () => HttpResponse.error()),
    );
    const { user } = openApp('/sign-in');
    await fillIn(user, person.email, 'a long enough password');
    expect(await screen.findByRole('alert')).toHaveTextContent('The server cannot be reached.');
  });

  it('offers each part of the demo and says that all is fictional', async () => {
    server.use(answer.access(demo));
    const sent = doorFor(demo.accounts[1]?.email as string, demo.password);
    const { user, address } = openApp('/sign-in');
    const strip = await screen.findByRole('region', { name: 'Demo: sign in as' });
    expect(strip).toHaveTextContent('All people, organisations, studies and figures here are fictional.');
    expect(within(strip).getAllByRole('button')).toHaveLength(2);
    await user.click(within(strip).getByRole('button', { name: 'Priya Venn Funder, Stillfoot' }));
    await waitFor(() => expect(address()).toBe('/'));
    expect(sent).toEqual([{ email: 'priya.venn@hollin-fund.example', password: 'steelyard-demo' }]);
  });
});

describe('The first visit', () => {
  it('is told of at the sign-in page, which asks for the code', async () => {
    server.use(answer.access(null, true));
    const { user, address } = openApp('/sign-in');
    expect(await screen.findByText(/An administrator has to be created first/)).toBeVisible();
    expect(screen.queryByLabelText('Password')).not.toBeInTheDocument();
    await user.type(screen.getByLabelText('Code from the server’s console'), 'oak-7');
    await user.click(screen.getByRole('button', { name: 'Go on' }));
    await waitFor(() => expect(address()).toBe('/welcome/oak-7'));
  });

  it('creates the administrator and lands on the studies', async () => {
    let sent: unknown;
    server.use(
      answer.access(null, true),
      answer.studies(),
      http.post('*/api/first-visit', async ({ request }) => {
        sent = await request.json();
        return HttpResponse.json({ ...person, administrator: true }, { status: 201 });
      }),
    );
    const { user, address } = openApp('/welcome/oak-7');
    await user.type(await screen.findByLabelText('Name'), 'Ada Quill');
    await user.type(screen.getByLabelText('E-mail'), 'ada@example.org');
    await user.type(screen.getByLabelText('Password'), 'correct horse battery');
    expect(screen.getByLabelText('Code from the server’s console')).toHaveValue('oak-7');
    await user.click(screen.getByRole('button', { name: 'Create the administrator' }));
    expect(await screen.findByText(/An administrator looks after people and settings/)).toBeVisible();
    expect(address()).toBe('/');
    expect(sent).toEqual({
      code: 'oak-7',
      name: 'Ada Quill',
      email: 'ada@example.org',
      password: 'correct horse battery',
    });
  });

  it('shows what is wrong at the field it concerns', async () => {
    server.use(
      answer.access(null, true),
      http.post('*/api/first-visit', () =>
        problem(422, 'invalid', { issues: [{ path: 'code', message: 'This code is not the one printed.' }] }),
      ),
    );
    const { user } = openApp('/welcome/oak-7');
    await user.type(await screen.findByLabelText('Name'), 'Ada Quill');
    await user.type(screen.getByLabelText('E-mail'), 'ada@example.org');
    await user.type(screen.getByLabelText('Password'), 'short');
    await user.click(screen.getByRole('button', { name: 'Create the administrator' }));
    expect(await screen.findByText('Choose a password of 12 characters or more.')).toBeVisible();
    await user.type(screen.getByLabelText('Password'), ' no more, long now');
    await user.click(screen.getByRole('button', { name: 'Create the administrator' }));
    expect(await screen.findByText('This code is not the one printed.')).toBeVisible();
    expect(screen.getByLabelText('Code from the server’s console')).toBeInvalid();
    expect(screen.getByLabelText('Name')).toHaveValue('Ada Quill');
  });

  it('is over once there is an administrator', async () => {
    server.use(
      answer.access(),
      http.get('*/api/welcome/oak-7', () => problem(404, 'not-found')),
    );
    openApp('/welcome/oak-7');
    expect(await screen.findByText(/This link lets nobody in any more/)).toBeVisible();
    expect(screen.getByRole('link', { name: 'Sign in' })).toHaveAttribute('href', '/sign-in');
  });
});
