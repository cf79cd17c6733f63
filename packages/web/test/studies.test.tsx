import { screen, waitFor, within } from '@testing-library/react';
import { delay, HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { openApp } from './open-app';
import { answer, person, problem, server } from './server';

const summary = {
  id: '00000000-0000-4000-8000-00000000aaaa',
  name: 'Stillfoot',
  organisation: 'Brackwater Clinic for Long-Term Pain',
  question: 'Does vantholine foot gel lower pain?',
  fictional: true,
  role: 'methodologist',
  mayOpen: true,
  options: 3,
  choice: null,
  changedAt: new Date(Date.now() - 49 * 3600 * 1000).toISOString(),
};

describe('Studies', () => {
  it('lists each with who asks, what, as what, how many options and since when', async () => {
    server.use(answer.session(), answer.studies(summary));
    openApp('/');
    const item = await screen.findByRole('listitem');
    for (const text of [
      'Brackwater Clinic for Long-Term Pain',
      'Does vantholine foot gel lower pain?',
      'Methodologist',
      'Fictional',
      'three options',
    ]) {
      expect(within(item).getByText(text)).toBeVisible();
    }
    expect(within(item).getByRole('link', { name: 'Stillfoot' })).toHaveAttribute(
      'href',
      `/studies/${summary.id}/weigh`,
    );
    const changed = within(item).getByRole('button', { name: '2 days ago' });
    expect(changed).toHaveAccessibleDescription(/\d{1,2} \w+ \d{4} at \d\d:\d\d/);
    expect(document.title).toBe('Studies · Steelyard');
  });

  it('says which option was chosen', async () => {
    server.use(answer.session(), answer.studies({ ...summary, choice: { letter: 'C', name: 'Crossover' } }));
    openApp('/');
    expect(await screen.findByText('Chosen: C, Crossover')).toBeVisible();
  });

  it('tells a funder that nothing has been submitted, and leads nowhere', async () => {
    server.use(answer.session(), answer.studies({ ...summary, role: 'funder', mayOpen: false }));
    openApp('/');
    const item = await screen.findByRole('listitem');
    expect(within(item).getByText(/Nothing has been submitted to you yet/)).toBeVisible();
    expect(within(item).queryByRole('link')).not.toBeInTheDocument();
  });

  it('says how a person without studies comes by one', async () => {
    server.use(answer.session(), answer.studies());
    openApp('/');
    expect(await screen.findByText(/The methodologist of a study can make you one/)).toBeVisible();
  });

  it('says what an administrator is not shown', async () => {
    server.use(answer.session({ ...person, administrator: true }), answer.studies());
    openApp('/');
    expect(await screen.findByText(/what a study contains is open to its members alone/)).toBeVisible();
  });

  it('shows a skeleton meanwhile', async () => {
    server.use(
      answer.session(),
      http.get('*/api/studies', async () => {
        await delay('infinite');
        return HttpResponse.json({ studies: [] });
      }),
    );
    openApp('/');
    expect(await screen.findByLabelText('Loading the studies')).toBeVisible();
  });

  it('says that the list could not be had, with the reference, and tries again', async () => {
    server.use(answer.session(), answer.studies(summary));
    let failures = 0;
    server.use(
      http.get('*/api/studies', () => {
        failures += 1;
        if (failures > 2) return undefined;
        return problem(500, 'internal', { title: 'Something went wrong', correlationId: '3f2c-77aa' });
      }),
    );
    const { user } = openApp('/');
    const retry = await screen.findByRole('button', { name: 'Try again' });
    expect(screen.getByText(/Something went wrong\. Reference for support: 3f2c-77aa\./)).toBeVisible();
    expect(failures).toBe(2);
    await user.click(retry);
    expect(await screen.findByRole('link', { name: 'Stillfoot' })).toBeVisible();
  });

  it('gives the focus to the main part of the page one goes to', async () => {
    server.use(answer.session(), answer.studies(summary));
    const { user } = openApp('/nowhere');
    await user.click(await screen.findByRole('link', { name: 'Go to your studies' }));
    await screen.findByRole('heading', { name: 'Studies' });
    await waitFor(() => expect(screen.getByRole('main')).toHaveFocus());
  });
});
