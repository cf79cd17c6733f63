import type { AuditEntryView } from '@steelyard/api/contract/audit';
import { screen, waitFor, within } from '@testing-library/react';
import { delay, HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { stillfoot } from './fixtures/stillfoot';
import { openApp } from './open-app';
import { problem, serve, server } from './server';

const entry = (id: number, more: Partial<AuditEntryView> = {}): AuditEntryView => ({
  id,
  at: new Date(Date.now() - (10 - id) * 3 * 86_400_000).toISOString(),
  by: 'Tomas Arrivel',
  action: 'changed',
  what: `planning value “Attrition”`,
  before: { value: 0.12, source: 'Pilot' },
  after: { value: 0.15, source: 'Pilot and register' },
  ...more,
});

function openHistory(...pages: AuditEntryView[][]) {
  const fixture = stillfoot();
  serve(fixture);
  server.use(
    http.get(`*/api/studies/${fixture.study.id}/history`, ({ request }) => {
      const before = new URL(request.url).searchParams.get('before');
      const at = before === null ? 0 : pages.findIndex((page) => String(page.at(-1)?.id) === before) + 1;
      const next = at < pages.length - 1 ? (pages[at]?.at(-1)?.id ?? null) : null;
      return HttpResponse.json({ entries: pages[at] ?? [], next });
    }),
  );
  return { ...openApp(`/studies/${fixture.study.id}/history`), fixture };
}

const changes = async () => within(await screen.findByRole('list', { name: 'Changes' }));

describe('The history of a study', () => {
  it('says who did what and when, with every fact before and after', async () => {
    openHistory([entry(9)]);
    const item = (await changes()).getByRole('listitem');
    expect(item).toHaveTextContent('Tomas Arrivel changed planning value “Attrition”');
    expect(within(item).getByRole('button', { name: '3 days ago' })).toHaveAccessibleDescription(
      / at \d\d:\d\d/,
    );
    const rows = within(item).getAllByRole('row');
    expect(rows.map((row) => [...row.children].map((cell) => cell.textContent))).toEqual([
      ['Fact', 'Before', 'After'],
      ['Value', '12\u00a0%', '15\u00a0%'],
      ['Source', 'Pilot', 'Pilot and register'],
    ]);
    expect(document.title).toBe('History · Stillfoot · Steelyard');
  });

  it('shows a ruling, a choice and a member with their reasons in full', async () => {
    openHistory([
      entry(9, {
        action: 'chose',
        what: 'option “Crossover”',
        before: null,
        after: { option: 'Crossover', why: 'Fewest people', 'whyNot.Parallel v1.2': 'Costs more' },
      }),
      entry(8, {
        action: 'ruled on',
        what: 'option “Parallel”',
        before: null,
        after: { kind: 'not-admissible', reason: 'Too few sites' },
      }),
      entry(7, { action: 'removed', what: 'member Priya Venn', before: { role: 'funder' }, after: null }),
    ]);
    const items = (await changes()).getAllByRole('listitem');
    expect(
      within(items[0] as HTMLElement).getByRole('row', { name: 'Why not “Parallel v1.2” Costs more' }),
    ).toBeVisible();
    expect(within(items[1] as HTMLElement).getByRole('row', { name: 'Kind not admissible' })).toBeVisible();
    expect(within(items[1] as HTMLElement).getByRole('row', { name: 'Reason Too few sites' })).toBeVisible();
    expect(within(items[2] as HTMLElement).getByRole('columnheader', { name: 'Before' })).toBeVisible();
    expect(within(items[2] as HTMLElement).queryByRole('columnheader', { name: 'After' })).toBeNull();
  });

  it('names arms and what is paid for each as the study calls its treatments', async () => {
    openHistory([
      entry(9, {
        what: 'option “Crossover”',
        before: null,
        after: { 'plan.treatments.0': 1, 'plan.treatments.1': 5, 'plan.repeated.followUps': 2 },
      }),
      entry(8, { what: 'costs and accrual', before: null, after: { 'costs.perExposure.0': 54 } }),
    ]);
    const [option, costs] = (await changes()).getAllByRole('listitem') as [HTMLElement, HTMLElement];
    expect(await within(option).findByRole('row', { name: 'Arm 1 vantholine gel' })).toBeVisible();
    expect(within(option).getByRole('row', { name: 'Arm 2 treatment 6' })).toBeVisible();
    expect(within(option).getByRole('row', { name: 'Repeated follow-ups 2' })).toBeVisible();
    expect(within(costs).getByRole('row', { name: 'Costs: per exposure, vehicle gel 54' })).toBeVisible();
  });

  it('tells what had no name before by its parts alone', async () => {
    openHistory([
      entry(9, {
        what: 'the question',
        before: { clusters: null },
        after: { 'clusters.one': 'practice', 'clusters.many': 'practices' },
      }),
    ]);
    const item = (await changes()).getByRole('listitem');
    const rows = within(item).getAllByRole('row');
    expect(rows.map((row) => [...row.children].map((cell) => cell.textContent))).toEqual([
      ['Fact', 'Before', 'After'],
      ['Clusters one', 'none', 'practice'],
      ['Clusters many', 'none', 'practices'],
    ]);
  });

  it('folds many facts away and unfolds them on request', async () => {
    const after = Object.fromEntries(
      Array.from({ length: 8 }, (_, index) => [`costs.perExposure.${index}`, index]),
    );
    const { user } = openHistory([entry(9, { what: 'costs and accrual', before: null, after })]);
    const item = (await changes()).getByRole('listitem');
    const cell = within(item).getByText('Costs: per exposure, treatment 8');
    expect(cell).not.toBeVisible();
    await user.click(within(item).getByText('eight facts'));
    expect(cell).toBeVisible();
  });

  it('goes back page by page to where the record begins', async () => {
    const { user } = openHistory([entry(9), entry(8)], [entry(3, { by: null, what: 'the study' })]);
    expect((await changes()).getAllByRole('listitem')).toHaveLength(2);
    await user.click(screen.getByRole('button', { name: 'Show what came before' }));
    expect(await screen.findByText('The server')).toBeVisible();
    expect((await changes()).getAllByRole('listitem')).toHaveLength(3);
    expect(screen.getByText('This is where the record begins.')).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Show what came before' })).not.toBeInTheDocument();
  });

  it('keeps what it shows when an earlier page cannot be had', async () => {
    const { user, fixture } = openHistory([entry(9)], [entry(3)]);
    await changes();
    server.use(
      http.get(`*/api/studies/${fixture.study.id}/history`, () =>
        problem(403, 'forbidden', { title: 'Not for you' }),
      ),
    );
    await user.click(screen.getByRole('button', { name: 'Show what came before' }));
    expect(await screen.findByRole('alert')).toHaveTextContent(
      'What came before could not be shown. Not for you',
    );
    expect((await changes()).getAllByRole('listitem')).toHaveLength(1);
  });

  it('says that nothing has been changed yet', async () => {
    openHistory([]);
    expect(await screen.findByText('Nothing has been changed in this study yet.')).toBeVisible();
  });

  it('shows a skeleton meanwhile, and why it could not be had', async () => {
    const { study } = stillfoot();
    server.use(
      http.get('*/api/studies/:id/history', async () => {
        await delay(50);
        return problem(404, 'not-found');
      }),
    );
    serve({ ...stillfoot(), study });
    openApp(`/studies/${study.id}/history`);
    expect(await screen.findByLabelText('Loading the history')).toBeVisible();
    expect(await screen.findByText(/There is no history here/)).toBeVisible();
  });

  it('is reached from the study’s list of pages', async () => {
    const { user, address, fixture } = openHistory([entry(9)]);
    await changes();
    const list = screen.getByRole('navigation', { name: 'Study' });
    expect(within(list).getByRole('link', { name: 'History' })).toHaveAttribute('aria-current', 'page');
    await user.click(within(list).getByRole('link', { name: 'Weigh' }));
    await waitFor(() => expect(address()).toBe(`/studies/${fixture.study.id}/weigh`));
  });
});
