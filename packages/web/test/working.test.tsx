import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { draftKey, keepDraft } from '../src/features/designs/model/drafts';
import { stillfoot } from './fixtures/stillfoot';
import { option, type StudyFixture } from './fixtures/study-fixture';
import { openApp } from './open-app';
import { person, serve } from './server';

function openWorking(fixture: StudyFixture, position: number) {
  serve(fixture);
  return openApp(`/studies/${fixture.study.id}/options/${fixture.designSet.options[position]?.id}`);
}

describe('The working of an option', () => {
  it('is reached from Weigh', async () => {
    const fixture = stillfoot();
    serve(fixture);
    const { user } = openApp(`/studies/${fixture.study.id}/weigh`);
    await user.click(await screen.findByRole('link', { name: 'Working' }));
    expect(await screen.findByRole('heading', { name: 'Parallel, unadjusted: the working' })).toBeVisible();
    expect(document.title).toBe('Working of A · Stillfoot · Steelyard');
  });

  it('gives each step as formula, with the figures, value and source', async () => {
    openWorking(stillfoot(), 2);
    const steps = await screen.findByRole('table', { name: 'Working, step by step' });
    // By text: jsdom cannot name what holds MathML.
    const row = (label: RegExp) => within(steps).getByText(label).closest('tr') as HTMLElement;
    const standardError = row(/Standard error of the effect/);
    expect(standardError).toHaveTextContent('Senn 2002');
    // 2.1 √(2 (1 − 0.6) / 40)
    expect(standardError).toHaveTextContent('0.296985');
    await waitFor(() => expect(standardError.querySelectorAll('math')).toHaveLength(2));
    expect(standardError.querySelector('[style]')).toBeNull();
    expect(row(/Recruited in all/)).toHaveTextContent('50');
  });

  it('says what its symbols stand for', async () => {
    openWorking(stillfoot(), 2);
    const symbols = await screen.findByLabelText('Symbols');
    expect(symbols).toHaveTextContent('within-person correlation of two periods');
    expect(symbols).not.toHaveTextContent('ICC');
  });

  it('shows the schedule as a picture and as a table', async () => {
    openWorking(stillfoot(), 2);
    const schedule = await screen.findByRole('table', { name: 'Schedule' });
    expect(
      within(schedule).getByRole('row', { name: 'Sequence BA Vantholine gel Vehicle gel' }),
    ).toBeVisible();
    expect(
      screen.getByRole('img', {
        name: 'Schedule. Sequence AB: Vehicle gel, then Vantholine gel; Sequence BA: Vantholine gel, then Vehicle gel',
      }),
    ).toBeVisible();
  });

  it('lists the planning values with ledger, range, source and who set them', async () => {
    openWorking(stillfoot(), 2);
    const values = await screen.findByRole('table', { name: 'Planning values' });
    expect(
      within(values).getByRole('row', {
        name: 'Within-person correlation 0.6 0.6 0.4 to 0.75 Assumed by the team Tomas Arrivel, 17 Oct 2026',
      }),
    ).toBeVisible();
  });

  it('hands out the request, to be computed again', async () => {
    const { user } = openWorking(stillfoot(), 0);
    await user.click(await screen.findByText('Request as JSON'));
    const text = screen.getByRole('region', { name: 'Request as JSON' }).textContent ?? '';
    expect(JSON.parse(text)).toMatchObject({
      outcome: { kind: 'continuous', difference: -1, sd: 2.1 },
      design: { family: 'parallel' },
      aim: { find: 'size', power: 0.9 },
      attrition: { participants: 0.12 },
    });
    await user.click(screen.getByRole('button', { name: 'Copy' }));
    expect(await screen.findByText('Copied.')).toBeVisible();
    expect(await navigator.clipboard.readText()).toBe(text);
  });

  it('says why there is none where the option cannot be computed', async () => {
    const fixture = stillfoot();
    fixture.designSet.options.push(option('Clusters', { family: 'cluster', clusterSize: 20 }));
    openWorking(fixture, 3);
    expect(await screen.findByText(/State the ICC/)).toBeVisible();
    expect(screen.queryByRole('table', { name: 'Working, step by step' })).not.toBeInTheDocument();
    expect(screen.getByText('Request as JSON')).toBeVisible();
  });

  it('says that it works out edits which are not saved, and leads to what is stored and back', async () => {
    const fixture = stillfoot();
    const [first] = fixture.designSet.options;
    if (!first) throw new Error('Stillfoot has options.');
    const base = { name: first.name, plan: first.plan };
    const plan = { ...first.plan, overrides: { sd: { value: 2.6, reason: 'These sites vary more.' } } };
    keepDraft(draftKey(person.id, first.id), { ...base, plan, base });
    const { user } = openWorking(fixture, 0);
    expect(await screen.findByText(/the working of your edits, which are not saved/)).toBeVisible();
    const taken = () => within(screen.getByRole('table', { name: 'Planning values' }));
    expect(
      taken().getByRole('row', { name: /^Standard deviation .* 2\.6\spoints 2\.1\spoints/ }),
    ).toBeVisible();
    await user.click(screen.getByRole('link', { name: 'The working of what is stored' }));
    expect(await screen.findByText(/as it is stored, as others see it/)).toBeVisible();
    expect(taken().getByRole('row', { name: /^Standard deviation 2\.1\spoints/ })).toBeVisible();
    await user.click(screen.getByRole('link', { name: 'The working with your edits' }));
    expect(await screen.findByText(/the working of your edits/)).toBeVisible();
  });

  it('says nothing of versions where there is but one', async () => {
    openWorking(stillfoot(), 0);
    expect(await screen.findByRole('table', { name: 'Planning values' })).toBeVisible();
    expect(screen.queryByText(/^This is the working/)).not.toBeInTheDocument();
  });

  it('says that there is no such option', async () => {
    const fixture = stillfoot();
    openWorking(fixture, 9);
    expect(
      await screen.findByRole('heading', { name: 'There is no such option in this study' }),
    ).toBeVisible();
    expect(screen.getByRole('link', { name: 'Go back to the options' })).toHaveAttribute(
      'href',
      `/studies/${fixture.study.id}/weigh`,
    );
  });

  it('is listed beside Weigh, the present one marked', async () => {
    openWorking(stillfoot(), 1);
    const list = await screen.findByRole('navigation', { name: 'Study' });
    const links = await within(list).findAllByRole('link');
    const at = links.findIndex((link) => link.textContent === 'Weigh');
    expect(links.slice(at, at + 4).map((link) => link.textContent)).toEqual([
      'Weigh',
      'AParallel, unadjusted',
      'BParallel, baseline-adjusted',
      'CCrossover',
    ]);
    expect(links[at + 2]).toHaveAttribute('aria-current', 'page');
  });
});
