import { screen, waitFor } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { stillfoot } from './fixtures/stillfoot';
import { openApp } from './open-app';
import { answer, problem, serve, server } from './server';
import { surroundings } from './surroundings';

async function openAccount() {
  const fixture = stillfoot();
  serve(fixture);
  server.use(answer.access(), answer.studies());
  const app = openApp(`/studies/${fixture.study.id}/weigh`);
  await app.user.click(await screen.findByRole('button', { name: 'Account: Tomas Arrivel' }));
  return app;
}

describe('A session', () => {
  it('that has ended leads from any page to the sign-in page, and back from there', async () => {
    const fixture = stillfoot();
    const { study, designSet } = fixture;
    serve(fixture);
    server.use(
      answer.access(),
      answer.studies({ ...study, mayOpen: true, options: designSet.options.length }),
    );
    const { user, address } = openApp('/');
    const link = await screen.findByRole('link', { name: 'Stillfoot' });
    server.use(
      answer.session(null),
      http.get('*/api/studies/:id/costs', () => problem(401, 'signed-out')),
    );
    await user.click(link);
    expect(await screen.findByText(/Your session has ended/)).toBeVisible();
    expect(address()).toBe(`/sign-in?${new URLSearchParams({ from: `/studies/${study.id}/weigh` })}`);
  });

  it('that never began leads to the sign-in page without a word of an end', async () => {
    server.use(
      answer.access(),
      answer.session(null),
      http.get('*/api/studies', () => problem(401, 'signed-out')),
    );
    const { address } = openApp('/');
    expect(await screen.findByRole('heading', { name: 'Sign in' })).toBeVisible();
    expect(address()).toBe('/sign-in');
    expect(screen.queryByText(/Your session has ended/)).not.toBeInTheDocument();
  });

  it('ends with Sign out, and nothing of it is left on the page', async () => {
    const { user, address, queryClient } = await openAccount();
    let ended = false;
    server.use(
      answer.session(null),
      http.delete('*/api/session', () => {
        ended = true;
        return new HttpResponse(null, { status: 204 });
      }),
    );
    await user.click(screen.getByRole('button', { name: 'Sign out' }));
    expect(await screen.findByRole('heading', { name: 'Sign in' })).toBeVisible();
    expect(ended).toBe(true);
    expect(address()).toBe('/sign-in');
    expect(queryClient.getQueryCache().find({ queryKey: ['studies'], exact: false })).toBeUndefined();
  });
});

describe('The account’s panel', () => {
  it('says that signing out did not succeed', async () => {
    const { user } = await openAccount();
    server.use(http.delete('*/api/session', () => HttpResponse.error()));
    await user.click(screen.getByRole('button', { name: 'Sign out' }));
    expect(await screen.findByRole('alert')).toHaveTextContent(
      'You are still signed in. The server cannot be reached.',
    );
  });

  it('closes with Escape and gives the focus back', async () => {
    const { user } = await openAccount();
    expect(screen.getByRole('radio', { name: 'As the device' })).toBeChecked();
    await user.keyboard('{Escape}');
    expect(screen.queryByRole('radio')).not.toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Account: Tomas Arrivel' })).toHaveFocus();
  });

  it('turns the page dark and remembers it', async () => {
    const { user } = await openAccount();
    await waitFor(() => expect(document.documentElement.style.colorScheme).toBe('light'));
    await user.click(screen.getByRole('radio', { name: 'Dark' }));
    expect(document.documentElement.style.colorScheme).toBe('dark');
    expect(localStorage.getItem('steelyard-preferences')).toContain('"theme":"dark"');
  });

  it('leaves light and dark to the device until one is chosen', async () => {
    surroundings.matching = ['(prefers-color-scheme: dark)'];
    const { user } = await openAccount();
    await waitFor(() => expect(document.documentElement.style.colorScheme).toBe('dark'));
    await user.click(screen.getByRole('radio', { name: 'Light' }));
    expect(document.documentElement.style.colorScheme).toBe('light');
  });
});

describe('An address that leads nowhere', () => {
  it('has a page that says so', async () => {
    server.use(answer.session());
    openApp('/studies/nothing/here/at-all');
    expect(await screen.findByRole('heading', { name: 'There is no page at this address' })).toBeVisible();
    expect(document.title).toBe('Page not found · Steelyard');
  });
});
