import { cleanup, screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { useKeptEdits } from '../src/features/unsaved/model/kept-edits';
import { greenkettle } from './fixtures/greenkettle';
import type { StudyFixture } from './fixtures/study-fixture';
import { answer, problem, server } from './server';
import { openWeigh, optionRow } from './weigh-page';

const edits = () => Object.keys(useKeptEdits.getState().edits);

const limits = { clusters: 32, participantsPerCluster: 60, money: 800_000, months: 30 };

/** The server takes what is put and answers with it from then on. */
function takes(fixture: StudyFixture, what: 'limits' | 'design-set') {
  const sent: unknown[] = [];
  server.use(
    http.put(`*/api/studies/:id/${what}`, async ({ request }) => {
      const body = (await request.json()) as Record<string, unknown>;
      sent.push(body);
      if (what === 'limits') fixture.limits = { version: 2, limits: body.limits as typeof limits };
      else Object.assign(fixture.designSet, { version: 2, hold: body.hold });
      return HttpResponse.json(what === 'limits' ? fixture.limits : fixture.designSet);
    }),
  );
  return sent;
}

/** The session ends as something is sent, and the page is left for another sign-in. */
async function loseTheSession(what: 'limits' | 'design-set', send: () => Promise<void>) {
  server.use(
    http.put(`*/api/studies/:id/${what}`, () => problem(401, 'signed-out')),
    http.get('*/api/studies/:id', () => problem(401, 'signed-out')),
    http.get('*/api/studies/:id/:part', () => problem(401, 'signed-out')),
    answer.session(null),
    answer.access(),
  );
  await send();
  expect(await screen.findByText(/Your session has ended/)).toBeVisible();
  server.resetHandlers();
  cleanup();
}

const row = () => optionRow(/Cluster/);
const hold = () => within(screen.getByRole('group', { name: 'Hold' }));

describe('Limits', () => {
  it('say what an option breaks, what they leave it, and the smallest relaxation', async () => {
    const fixture = greenkettle();
    fixture.limits = { version: 1, limits };
    await openWeigh(fixture);
    expect(row()).toHaveTextContent('12 catchments over');
    expect(row()).toHaveTextContent('32 × 60 reach 73 %');
    expect(row()).toHaveTextContent('fits from 38 catchments at 60 each');
    expect(screen.getByRole('region', { name: 'Verdict' })).toHaveTextContent(
      'A needs 12 catchments that do not exist.',
    );
  });

  it('say what is to spare where an option fits', async () => {
    const fixture = greenkettle();
    fixture.limits = { version: 1, limits: { clusters: 46, money: 800_000 } };
    await openWeigh(fixture);
    expect(row()).toHaveTextContent('Fits2 catchments and 85 k€ to spare');
  });

  it('are drawn through the beams, in words too', async () => {
    const fixture = greenkettle();
    fixture.limits = { version: 1, limits };
    await openWeigh(fixture);
    expect(within(row()).getByRole('button', { name: /Cost by arm.*the limit is 800\sk€/ })).toBeVisible();
  });

  it('are set in one dialog that begins at the one pressed', async () => {
    const fixture = greenkettle();
    fixture.limits = { version: 1, limits: { clusters: 32 } };
    const { user } = await openWeigh(fixture);
    const sent = takes(fixture, 'limits');
    await user.click(screen.getByRole('button', { name: '≤ 32 catchments' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Limits' }));
    expect(dialog.getByLabelText('Catchments')).toHaveFocus();
    await user.clear(dialog.getByLabelText('Catchments'));
    await user.type(dialog.getByLabelText('Catchments'), '44');
    await user.type(dialog.getByLabelText('Money'), '800,000');
    await user.click(dialog.getByRole('button', { name: 'Set the limits' }));
    await waitFor(() => expect(row()).toHaveTextContent('Fits'));
    expect(sent).toEqual([{ version: 1, limits: { clusters: 44, money: 800_000 } }]);
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
  });

  it('refuse half a catchment at its field', async () => {
    const { user } = await openWeigh(greenkettle());
    await user.click(screen.getByRole('button', { name: 'Set limits' }));
    await user.type(await screen.findByLabelText('Catchments'), '2.5');
    await user.click(screen.getByRole('button', { name: 'Set the limits' }));
    expect(await screen.findByText('The number of clusters must be a whole number.')).toBeVisible();
    expect(screen.getByLabelText('Catchments')).toBeInvalid();
  });

  it('keep what was typed through a reload and a lost session, until they are set or cancelled', async () => {
    const fixture = greenkettle();
    const first = await openWeigh(fixture);
    await first.user.click(screen.getByRole('button', { name: 'Set limits' }));
    await first.user.type(await screen.findByLabelText('Months'), 'thirty');
    cleanup();
    const second = await openWeigh(fixture);
    await second.user.click(screen.getByRole('button', { name: 'Set limits' }));
    expect(screen.getByLabelText('Months')).toHaveValue('thirty');
    expect(screen.getByText(/^“thirty” is not a number/)).toBeVisible();
    await second.user.clear(screen.getByLabelText('Months'));
    await second.user.type(screen.getByLabelText('Months'), '30');
    await loseTheSession('limits', () =>
      second.user.click(screen.getByRole('button', { name: 'Set the limits' })),
    );
    const { user } = await openWeigh(fixture);
    const sent = takes(fixture, 'limits');
    await user.click(screen.getByRole('button', { name: 'Set limits' }));
    expect(screen.getByLabelText('Months')).toHaveValue('30');
    await user.click(screen.getByRole('button', { name: 'Set the limits' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    expect(sent).toEqual([{ version: null, limits: { months: 30 } }]);
    expect(edits()).toEqual([]);
    await user.click(screen.getByRole('button', { name: 'More limits' }));
    await user.type(screen.getByLabelText('Months'), '6');
    expect(edits()).toHaveLength(1);
    await user.click(screen.getByRole('button', { name: 'Cancel' }));
    await user.click(screen.getByRole('button', { name: 'More limits' }));
    expect(screen.getByLabelText('Months')).toHaveValue('30');
  });

  it('are read only for those who may not edit', async () => {
    const fixture = greenkettle();
    fixture.study.role = 'reader';
    fixture.limits = { version: 1, limits };
    await openWeigh(fixture);
    expect(screen.getByText('≤ 32 catchments')).toBeVisible();
    for (const name of [/catchments$/, 'Add option', 'Change what is held', 'Record the choice', 'Save']) {
      expect(screen.queryByRole('button', { name })).not.toBeInTheDocument();
    }
  });
});

describe('The hold', () => {
  it('goes over to a budget, which begins at the limit of money', async () => {
    const fixture = greenkettle();
    fixture.limits = { version: 1, limits };
    const { user } = await openWeigh(fixture);
    const sent = takes(fixture, 'design-set');
    await user.click(hold().getByRole('button', { name: 'Budget' }));
    await waitFor(() =>
      expect(hold().getByRole('button', { name: /^Budget 800\sk€$/ })).toHaveAttribute(
        'aria-pressed',
        'true',
      ),
    );
    expect(sent).toEqual([
      {
        version: 1,
        hold: { kind: 'budget', power: 0.8, budget: 800_000 },
        order: fixture.designSet.options.map(({ id }) => id),
      },
    ]);
  });

  it('takes another power, in percent', async () => {
    const fixture = greenkettle();
    const { user } = await openWeigh(fixture);
    const sent = takes(fixture, 'design-set');
    await user.click(screen.getByRole('button', { name: 'Change what is held' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'What is kept equal' }));
    expect(dialog.getByLabelText('Power')).toHaveValue('80');
    await user.clear(dialog.getByLabelText('Power'));
    await user.type(dialog.getByLabelText('Power'), '100');
    await user.click(dialog.getByRole('button', { name: 'Hold' }));
    expect(await dialog.findByText('The power must lie between 0 % and 100 %, both excluded.')).toBeVisible();
    await user.clear(dialog.getByLabelText('Power'));
    await user.type(dialog.getByLabelText('Power'), '90');
    await user.click(dialog.getByRole('button', { name: 'Hold' }));
    await waitFor(() => expect(sent).toMatchObject([{ hold: { kind: 'power', power: 0.9 } }]));
  });

  it('keeps what was typed through a reload and a lost session, until it is held or cancelled', async () => {
    const fixture = greenkettle();
    const first = await openWeigh(fixture);
    await first.user.click(screen.getByRole('button', { name: 'Change what is held' }));
    await first.user.click(await screen.findByRole('radio', { name: /^Budget:/ }));
    await first.user.type(screen.getByLabelText('Budget'), '700,000');
    cleanup();
    const second = await openWeigh(fixture);
    await second.user.click(screen.getByRole('button', { name: 'Change what is held' }));
    expect(screen.getByLabelText('Budget')).toHaveValue('700,000');
    await second.user.clear(screen.getByLabelText('Power'));
    await second.user.type(screen.getByLabelText('Power'), '90');
    const dialog = () => within(screen.getByRole('dialog', { name: 'What is kept equal' }));
    await loseTheSession('design-set', () =>
      second.user.click(dialog().getByRole('button', { name: 'Hold' })),
    );
    const { user } = await openWeigh(fixture);
    const sent = takes(fixture, 'design-set');
    await user.click(screen.getByRole('button', { name: 'Change what is held' }));
    expect(screen.getByRole('radio', { name: /^Budget:/ })).toBeChecked();
    expect(screen.getByLabelText('Power')).toHaveValue('90');
    await user.click(dialog().getByRole('button', { name: 'Hold' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    expect(sent).toMatchObject([{ hold: { kind: 'budget', power: 0.9, budget: 700_000 } }]);
    expect(edits()).toEqual([]);
    await user.click(screen.getByRole('button', { name: 'Change what is held' }));
    await user.type(screen.getByLabelText('Power'), '9');
    expect(edits()).toHaveLength(1);
    await user.click(dialog().getByRole('button', { name: 'Cancel' }));
    await user.click(screen.getByRole('button', { name: 'Change what is held' }));
    expect(screen.getByLabelText('Power')).toHaveValue('90');
  });

  it('keeps sizes as entered, and says where none is', async () => {
    const fixture = greenkettle();
    fixture.designSet.hold = { kind: 'sizes', power: 0.8 };
    await openWeigh(fixture);
    expect(row()).toHaveTextContent('Enter a size');
  });
});
