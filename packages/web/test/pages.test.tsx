import { act, screen, waitFor } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it, vi } from 'vitest';
import { stillfoot } from './fixtures/stillfoot';
import { openApp } from './open-app';
import { answer, person, problem, serve, server } from './server';

/** The session is looked up until it is told who is in. */
function slowSession() {
  let tell: (who: object | null) => void = () => undefined;
  const told = new Promise<object | null>((resolve) => {
    tell = resolve;
  });
  server.use(
    http.get('*/api/session', async () => {
      const who = await told;
      return who ? HttpResponse.json(who) : problem(401, 'signed-out');
    }),
  );
  return (who: object | null) => tell(who);
}

/** What the page shows, the ground's own rules aside. */
const shown = () => document.body.querySelector('main, header, h1, a, button');

describe('A page', () => {
  it('asks for what it shows while the session is looked up, and shows nothing before', async () => {
    const fixture = stillfoot();
    serve(fixture);
    const tell = slowSession();
    const asked: string[] = [];
    server.events.on('request:start', ({ request }) => asked.push(new URL(request.url).pathname));
    openApp(`/studies/${fixture.study.id}/weigh`);
    await waitFor(() => expect(asked).toContain(`/api/studies/${fixture.study.id}/design-set`));
    expect(shown()).toBeNull();
    tell(person);
    expect(await screen.findByRole('table', { name: 'Options' })).toBeVisible();
  });

  it('is never shown to those who are signed out, not even its frame', async () => {
    const tell = slowSession();
    const seen: string[] = [];
    const observer = new MutationObserver(() => seen.push(document.querySelector('h1')?.textContent ?? ''));
    observer.observe(document.body, { childList: true, subtree: true });
    server.use(
      answer.access(),
      http.get('*/api/studies', () => problem(401, 'signed-out')),
    );
    const { address } = openApp('/?sorted=name');
    tell(null);
    expect(await screen.findByRole('heading', { name: 'Sign in' })).toBeVisible();
    observer.disconnect();
    expect(new Set(seen.filter(Boolean))).toEqual(new Set(['Sign in']));
    expect(address()).toBe('/sign-in?from=%2F%3Fsorted%3Dname');
  });

  it('is replaced by the reason when the session cannot be looked up', async () => {
    server.use(
      http.get('*/api/session', () => problem(422, 'invalid', { title: 'Sessions are in disorder' })),
      answer.studies(),
    );
    openApp('/');
    expect(await screen.findByRole('heading', { name: /The page could not be shown/ })).toBeVisible();
    expect(screen.getByText(/Sessions are in disorder/)).toBeVisible();
    expect(screen.getByRole('button', { name: 'Try again' })).toBeVisible();
  });

  it('starts at its top when it is new, not when only its view changes or one goes back', async () => {
    const fixture = stillfoot();
    serve(fixture);
    server.use(http.get('*/api/studies/:id/members', () => HttpResponse.json({ members: [] })));
    const { user, address } = openApp(`/studies/${fixture.study.id}/weigh`);
    await screen.findByRole('table', { name: 'Options' });
    const scrollTo = vi.fn();
    vi.stubGlobal('scrollTo', scrollTo);
    await user.selectOptions(screen.getByRole('combobox', { name: 'Beams show' }), 'Months by phase');
    await waitFor(() => expect(address()).toContain('?beams='));
    expect(scrollTo).not.toHaveBeenCalled();
    await user.click(screen.getByRole('link', { name: 'Members' }));
    await screen.findByRole('heading', { name: 'Members' });
    expect(scrollTo.mock.calls).toEqual([[0, 0]]);
    act(() => history.back());
    await screen.findByRole('table', { name: 'Options' });
    expect(scrollTo).toHaveBeenCalledTimes(1);
  });

  it('of a study without a page named is where the study is weighed', async () => {
    const fixture = stillfoot();
    serve(fixture);
    const { address } = openApp(`/studies/${fixture.study.id}`);
    expect(await screen.findByRole('table', { name: 'Options' })).toBeVisible();
    expect(address()).toBe(`/studies/${fixture.study.id}/weigh`);
  });
});
