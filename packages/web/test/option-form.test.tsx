import type { OptionView } from '@steelyard/api/contract/design-sets';
import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it, vi } from 'vitest';
import { useDrafts } from '../src/features/designs/model/drafts';
import { greenkettle } from './fixtures/greenkettle';
import { nimblegrip } from './fixtures/nimblegrip';
import { id } from './fixtures/study-fixture';
import { openApp } from './open-app';
import { answer, problem, serve, server } from './server';
import { openEditing, optionRow as row, storesOptions } from './weigh-page';

const form = () => within(screen.getByRole('form', { name: 'Option' }));
const save = () => form().getByRole('button', { name: 'Save' });

/** Answers that wait until they are given. */
function answersHeld() {
  const waiting: (() => void)[] = [];
  return {
    wait: () => new Promise<void>((resolve) => waiting.push(resolve)),
    give: async () => {
      await waitFor(() => expect(waiting).toHaveLength(1));
      waiting.shift()?.();
    },
  };
}

/** The moment at which nothing is left unsaved on this device, before any of it is drawn. */
const nothingUnsaved = () =>
  new Promise<void>((resolve) => {
    const stop = useDrafts.subscribe(({ drafts }) => {
      if (Object.keys(drafts).length > 0) return;
      stop();
      resolve();
    });
  });

async function resize(user: Awaited<ReturnType<typeof openEditing>>['user'], each: string) {
  await user.clear(form().getByLabelText('Girls in each catchment'));
  await user.type(form().getByLabelText('Girls in each catchment'), each);
}

describe('An option’s form', () => {
  it('opens in place of what is read, takes the focus and gives it back', async () => {
    const { user } = await openEditing(greenkettle());
    expect(form().getByRole('textbox', { name: 'Name' })).toHaveFocus();
    expect(form().queryByRole('button', { name: 'Save' })).not.toBeInTheDocument();
    await user.click(form().getByRole('button', { name: 'Done' }));
    expect(screen.queryByRole('form', { name: 'Option' })).not.toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Edit' })).toHaveFocus();
  });

  it('draws an edit at once and stores it on Save', async () => {
    const fixture = greenkettle();
    const { user } = await openEditing(fixture);
    const sent = storesOptions(fixture);
    expect(row(/Cluster/)).toHaveTextContent('44 catchments × 40');
    await resize(user, '60');
    await waitFor(() => expect(row(/Cluster/)).toHaveTextContent('catchments × 60'));
    expect(row(/Cluster/)).toHaveTextContent('Edits not saved');
    await user.click(save());
    await waitFor(() => expect(row(/Cluster/)).not.toHaveTextContent('Edits not saved'));
    expect(sent).toEqual([
      {
        version: 1,
        name: 'Cluster, end only',
        plan: {
          family: 'cluster',
          treatments: [0, 1],
          structure: { allocation: [1, 1] },
          clusterSize: 60,
          overrides: {},
        },
      },
    ]);
    await waitFor(() => expect(form().getByRole('status')).toHaveTextContent('Saved'));
  });

  it('keeps edits that were not saved through a reload, for the person who made them', async () => {
    const fixture = greenkettle();
    const first = await openEditing(fixture);
    await resize(first.user, '60');
    await waitFor(() =>
      expect(localStorage.getItem('steelyard-option-drafts')).toContain('"clusterSize":60'),
    );
    document.body.replaceChildren();
    await openEditing(fixture);
    expect(form().getByLabelText('Girls in each catchment')).toHaveValue('60');
    document.body.replaceChildren();
    serve(fixture);
    server.use(
      answer.session({ id: id(), name: 'Amara Doss', email: 'a@example.org', administrator: false }),
    );
    const { user } = openApp(`/studies/${fixture.study.id}/weigh`);
    await user.click(await screen.findByRole('button', { name: 'Edit' }));
    expect(await screen.findByLabelText('Girls in each catchment')).toHaveValue('40');
  });

  it('keeps text that is no number through a reload, says so and stores nothing of it', async () => {
    const fixture = greenkettle();
    const first = await openEditing(fixture);
    await resize(first.user, 'sixty');
    await first.user.clear(form().getByLabelText('Usual canteen'));
    await first.user.type(form().getByLabelText('Usual canteen'), 'half');
    await first.user.click(form().getByRole('button', { name: 'Override ICC' }));
    await first.user.type(form().getByLabelText('ICC, here'), 'low');
    document.body.replaceChildren();
    await useDrafts.persist.rehydrate();
    const { user } = await openEditing(fixture);
    const sent = storesOptions(fixture);
    for (const [label, text] of [
      ['Girls in each catchment', 'sixty'],
      ['Usual canteen', 'half'],
      ['ICC, here', 'low'],
    ] as const) {
      expect(form().getByLabelText(label)).toHaveValue(text);
      expect(form().getByText(new RegExp(`^“${text}” is not a number`))).toBeVisible();
    }
    await user.click(save());
    expect(sent).toEqual([]);
  });

  it('keeps a reason given before its value, and asks for the value', async () => {
    const fixture = greenkettle();
    const first = await openEditing(fixture);
    await first.user.click(form().getByRole('button', { name: 'Override ICC' }));
    await first.user.type(form().getByLabelText('Reason for this ICC'), 'A newer pilot.');
    expect(row(/Cluster/)).toHaveTextContent('44 catchments × 40');
    document.body.replaceChildren();
    await useDrafts.persist.rehydrate();
    const { user } = await openEditing(fixture);
    const sent = storesOptions(fixture);
    expect(form().getByLabelText('Reason for this ICC')).toHaveValue('A newer pilot.');
    await user.click(save());
    expect(await form().findByText('Enter the value that this option takes.')).toBeVisible();
    await user.type(form().getByLabelText('ICC, here'), '0.02');
    await user.type(form().getByRole('textbox', { name: 'Name' }), ' ');
    await user.click(save());
    await waitFor(() => expect(form().getByRole('status')).toHaveTextContent('Saved'));
    expect(sent).toMatchObject([
      { name: 'Cluster, end only', plan: { overrides: { icc: { value: 0.02, reason: 'A newer pilot.' } } } },
    ]);
  });

  it('goes on from what another tab has kept', async () => {
    const { user } = await openEditing(greenkettle());
    await resize(user, '60');
    const name = 'steelyard-option-drafts';
    const kept = localStorage.getItem(name) ?? '';
    localStorage.setItem(name, kept.replace('"name":"Cluster, end only"', '"name":"From the other tab"'));
    fireEvent(window, new StorageEvent('storage', { key: name }));
    await waitFor(() =>
      expect(form().getByRole('textbox', { name: 'Name' })).toHaveValue('From the other tab'),
    );
    await resize(user, '61');
    await waitFor(() => expect(row(/From the other tab/)).toHaveTextContent('catchments × 61'));
  });

  it('discards edits on request', async () => {
    const { user } = await openEditing(greenkettle());
    await resize(user, '60');
    await user.click(form().getByRole('button', { name: 'Discard' }));
    expect(form().getByLabelText('Girls in each catchment')).toHaveValue('40');
    await waitFor(() => expect(row(/Cluster/)).toHaveTextContent('44 catchments × 40'));
  });

  it('goes to the sign-in page when the session has ended, and loses nothing', async () => {
    const fixture = greenkettle();
    const { user, address } = await openEditing(fixture);
    await resize(user, '60');
    server.use(
      http.put('*/api/studies/:id/options/:optionId', () => problem(401, 'signed-out')),
      http.get('*/api/studies/:id', () => problem(401, 'signed-out')),
      http.get('*/api/studies/:id/:part', () => problem(401, 'signed-out')),
      answer.access(),
    );
    await user.click(save());
    await waitFor(() => expect(address()).toMatch(/^\/sign-in\?from=/));
    expect(localStorage.getItem('steelyard-option-drafts')).toContain('"clusterSize":60');
  });

  it('puts a refusal at the field it concerns and keeps the text', async () => {
    const { user } = await openEditing(greenkettle());
    server.use(
      http.put('*/api/studies/:id/options/:optionId', () =>
        problem(422, 'invalid', {
          issues: [{ path: 'plan.clusterSize', message: 'No cluster is so small.' }],
        }),
      ),
    );
    await resize(user, '3');
    await user.click(save());
    expect(await form().findByText('No cluster is so small.')).toBeVisible();
    expect(form().getByLabelText('Girls in each catchment')).toHaveValue('3');
  });

  it('shows both versions when someone else stored another, and lets the person keep theirs', async () => {
    const fixture = greenkettle();
    const { user } = await openEditing(fixture);
    const [mine] = fixture.designSet.options as [OptionView];
    const theirs = { ...mine, version: 2, plan: { ...mine.plan, clusterSize: 50 } };
    server.use(
      http.get('*/api/studies/:id/history', () =>
        HttpResponse.json({
          entries: [
            {
              id: 9,
              at: '2026-11-20T10:00:00.000Z',
              by: 'Amara Doss',
              action: 'changed',
              what: 'option “Cluster, end only”',
              before: null,
              after: null,
            },
          ],
          next: null,
        }),
      ),
      http.put('*/api/studies/:id/options/:optionId', () => {
        fixture.designSet.options = [theirs];
        return problem(409, 'stale', { current: theirs });
      }),
    );
    await resize(user, '60');
    await user.click(save());
    const table = await screen.findByRole('table', { name: 'Both versions' });
    expect(within(table).getByRole('row', { name: 'Cluster size 60 50' })).toBeVisible();
    expect(await screen.findByText('Amara Doss')).toBeVisible();
    expect(form().getByLabelText('Girls in each catchment')).toHaveValue('60');
    const sent = storesOptions(fixture);
    await user.click(screen.getByRole('button', { name: 'Keep mine' }));
    await user.click(save());
    await waitFor(() => expect(sent).toMatchObject([{ version: 2, plan: { clusterSize: 60 } }]));
  });

  it('takes the other version where the person prefers it', async () => {
    const fixture = greenkettle();
    const { user } = await openEditing(fixture);
    const [mine] = fixture.designSet.options as [OptionView];
    const theirs = { ...mine, version: 2, plan: { ...mine.plan, clusterSize: 50 } };
    server.use(
      http.get('*/api/studies/:id/history', () => HttpResponse.json({ entries: [], next: null })),
      http.put('*/api/studies/:id/options/:optionId', () => {
        fixture.designSet.options = [theirs];
        return problem(409, 'stale', { current: theirs });
      }),
    );
    await resize(user, '60');
    await user.click(save());
    await user.click(await screen.findByRole('button', { name: 'Take theirs' }));
    expect(form().getByLabelText('Girls in each catchment')).toHaveValue('50');
    expect(screen.queryByRole('table', { name: 'Both versions' })).not.toBeInTheDocument();
    await waitFor(() => expect(row(/Cluster/)).toHaveTextContent('× 50'));
  });

  it('enters the size that the hold takes, for when sizes are kept', async () => {
    const fixture = greenkettle();
    const { user } = await openEditing(fixture);
    const sent = storesOptions(fixture);
    await user.click(form().getByRole('button', { name: 'Enter 22, as taken now' }));
    expect(form().getByLabelText('Catchments in each arm')).toHaveValue('22');
    await user.click(save());
    await waitFor(() => expect(sent).toMatchObject([{ plan: { units: 22 } }]));
  });

  it('takes an override with its reason beside the ledger’s value', async () => {
    const fixture = greenkettle();
    const { user } = await openEditing(fixture);
    const sent = storesOptions(fixture);
    await user.click(form().getByRole('button', { name: 'Override ICC' }));
    await user.type(form().getByLabelText('ICC, here'), '0.02');
    await user.click(save());
    expect(await form().findByText('Say why this option takes a value of its own.')).toBeVisible();
    await user.type(form().getByLabelText('Reason for this ICC'), 'A newer pilot.');
    await user.click(save());
    await waitFor(() =>
      expect(sent).toMatchObject([
        { plan: { overrides: { icc: { value: 0.02, reason: 'A newer pilot.' } } } },
      ]),
    );
    await user.click(form().getByRole('button', { name: 'Take ICC from the ledger' }));
    await user.click(save());
    await waitFor(() => expect(sent[1]).toMatchObject({ plan: { overrides: {} } }));
  });

  it('refuses an ICC above 1 at its field', async () => {
    const { user } = await openEditing(greenkettle());
    await user.click(form().getByRole('button', { name: 'Override ICC' }));
    await user.type(form().getByLabelText('ICC, here'), '1.2');
    expect(await form().findByText('It must lie between 0 and 1.')).toBeVisible();
  });

  it('stores two saves in a row, and keeps what is typed at once after the first', async () => {
    const fixture = greenkettle();
    const { user } = await openEditing(fixture);
    const sent = storesOptions(fixture);
    const told = vi.fn(() => HttpResponse.json({ entries: [], next: null }));
    server.use(http.get('*/api/studies/:id/history', told));
    // While sizes are tried out the form is drawn later than the rest.
    screen.getByRole('slider', { name: /^A/ }).focus();
    await user.keyboard('{ArrowRight}');
    await resize(user, '60');
    const saved = nothingUnsaved();
    fireEvent.click(save());
    await saved;
    fireEvent.change(form().getByLabelText('Girls in each catchment'), { target: { value: '61' } });
    await waitFor(() => expect(row(/Cluster/)).toHaveTextContent('catchments × 61'));
    await user.click(save());
    await waitFor(() => expect(form().getByRole('status')).toHaveTextContent('Saved'));
    expect(form().getByLabelText('Girls in each catchment')).toHaveValue('61');
    expect(sent).toMatchObject([
      { version: 1, plan: { clusterSize: 60, units: 23 } },
      { version: 2, plan: { clusterSize: 61, units: 23 } },
    ]);
    // No version was taken for somebody else's, whose name would have been asked for.
    expect(told).not.toHaveBeenCalled();
  });

  it('keeps what is typed while a save is on its way, and stores it where Save is pressed again', async () => {
    const fixture = greenkettle();
    const { user } = await openEditing(fixture);
    const answers = answersHeld();
    const sent = storesOptions(fixture, answers.wait);
    const name = () => form().getByRole('textbox', { name: 'Name' });
    await resize(user, '60');
    await user.click(save());
    await waitFor(() => expect(sent).toHaveLength(1));
    await resize(user, '61');
    await user.click(save());
    await answers.give();
    await waitFor(() => expect(sent).toHaveLength(2));
    await user.type(name(), ', larger');
    await answers.give();
    await waitFor(() => expect(form().getByRole('status')).toHaveTextContent('Edits not saved'));
    expect(form().getByLabelText('Girls in each catchment')).toHaveValue('61');
    expect(name()).toHaveValue('Cluster, end only, larger');
    await user.click(save());
    await answers.give();
    await waitFor(() => expect(form().getByRole('status')).toHaveTextContent('Saved'));
    expect(sent).toMatchObject([
      { version: 1, name: 'Cluster, end only', plan: { clusterSize: 60 } },
      { version: 2, name: 'Cluster, end only', plan: { clusterSize: 61 } },
      { version: 3, name: 'Cluster, end only, larger', plan: { clusterSize: 61 } },
    ]);
  });

  it('takes a larger control arm as an expression, and an adjustment in plain words', async () => {
    const fixture = nimblegrip();
    const { user } = await openEditing(fixture);
    const sent = storesOptions(fixture);
    await user.clear(form().getByLabelText('Advice sheet'));
    await user.type(form().getByLabelText('Advice sheet'), '√3');
    await user.click(form().getByRole('radio', { name: /^Bonferroni\./ }));
    expect(await form().findByText('= 1.7321')).toBeVisible();
    await user.click(save());
    await waitFor(() =>
      expect(sent).toMatchObject([
        {
          plan: { structure: { allocation: [Math.sqrt(3), 1, 1, 1], comparisons: { adjust: 'bonferroni' } } },
        },
      ]),
    );
  });

  it('drops an arm with its share', async () => {
    const fixture = nimblegrip();
    const { user } = await openEditing(fixture);
    const sent = storesOptions(fixture);
    await user.click(form().getByRole('checkbox', { name: '4 sessions' }));
    await user.click(save());
    await waitFor(() =>
      expect(sent).toMatchObject([{ plan: { treatments: [0, 1, 3], structure: { allocation: [1, 1, 1] } } }]),
    );
  });
});
