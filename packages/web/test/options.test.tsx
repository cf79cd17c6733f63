import type { OptionView } from '@steelyard/api/contract/design-sets';
import { screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { stillfoot } from './fixtures/stillfoot';
import { server } from './server';
import { addsOptions, openWeigh, optionRows, optionRow as row } from './weigh-page';

describe('The options together', () => {
  it('gain one of each family that the study can have', async () => {
    const fixture = stillfoot();
    const { user, address } = await openWeigh(fixture);
    const sent = addsOptions(fixture);
    await user.click(screen.getByRole('button', { name: 'Add option' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Add an option' }));
    expect(dialog.getByRole('button', { name: 'Cluster' })).toHaveAttribute('aria-disabled', 'true');
    expect(dialog.getByRole('button', { name: 'Cluster' })).toHaveAccessibleDescription(
      /what the clusters are called/,
    );
    await user.click(dialog.getByRole('button', { name: 'Crossover' }));
    await waitFor(() => expect(optionRows()).toHaveLength(5));
    expect(sent).toEqual([
      {
        name: 'Crossover 2',
        plan: {
          family: 'crossover',
          treatments: [0, 1],
          structure: { sequences: ['AB', 'BA'] },
          overrides: {},
        },
      },
    ]);
    expect(address()).toContain(fixture.designSet.options[3]?.id);
    expect(row(/^D Crossover 2 /)).toHaveTextContent('333 k€');
  });

  it('are proposed by what the question allows, and others come with a ruling that has a reason', async () => {
    const fixture = stillfoot();
    const { user } = await openWeigh(fixture);
    const sent = addsOptions(fixture);
    await user.click(screen.getByRole('button', { name: 'Add option' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Add an option' }));
    const stable = within(
      dialog.getByRole('radiogroup', { name: 'Is the condition stable, and does the effect wear off?' }),
    );
    expect(dialog.getByRole('button', { name: 'Crossover' })).not.toHaveAccessibleDescription(
      /The effect stays/,
    );
    await user.click(stable.getByRole('radio', { name: 'No' }));
    expect(dialog.getByRole('button', { name: 'Crossover' })).toHaveAccessibleDescription(
      /The effect stays or the condition changes.* It can be added with a ruling\./,
    );
    await user.click(dialog.getByRole('button', { name: 'Crossover' }));
    await user.click(dialog.getByRole('button', { name: 'Add with this ruling' }));
    expect(await dialog.findByText('Give the reason of the ruling.')).toBeVisible();
    expect(sent).toEqual([]);
    await user.type(dialog.getByRole('textbox', { name: /^Reason/ }), 'To show what it would have saved');
    await user.click(dialog.getByRole('button', { name: 'Add with this ruling' }));
    await waitFor(() => expect(optionRows()).toHaveLength(5));
    expect(sent[0]).toMatchObject({
      name: 'Crossover 2',
      plan: { family: 'crossover' },
      ruling: { kind: 'not-admissible', reason: 'To show what it would have saved' },
    });
  });

  it('that speak against the answers are left to the methodologist', async () => {
    const fixture = stillfoot();
    fixture.study.role = 'investigator';
    const { user } = await openWeigh(fixture);
    await user.click(screen.getByRole('button', { name: 'Add option' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Add an option' }));
    const individuals = within(dialog.getByRole('radiogroup', { name: 'Can individuals be randomised?' }));
    await user.click(individuals.getByRole('radio', { name: 'No' }));
    const parallel = dialog.getByRole('button', { name: 'Parallel' });
    expect(parallel).toHaveAttribute('aria-disabled', 'true');
    expect(parallel).toHaveAccessibleDescription(
      /Individuals cannot be randomised\. A methodologist can add it with a ruling\./,
    );
  });

  it('change places', async () => {
    const fixture = stillfoot();
    const { user } = await openWeigh(fixture);
    const [a, b, c] = fixture.designSet.options as [OptionView, OptionView, OptionView];
    const sent: unknown[] = [];
    server.use(
      http.put('*/api/studies/:id/design-set', async ({ request }) => {
        sent.push(await request.json());
        fixture.designSet.options = [b, a, c];
        return HttpResponse.json(fixture.designSet);
      }),
    );
    expect(screen.getByRole('button', { name: 'Move up' })).toHaveAttribute('aria-disabled', 'true');
    await user.click(screen.getByRole('button', { name: 'Move down' }));
    expect(sent).toMatchObject([{ version: 1, order: [b.id, a.id, c.id] }]);
    await waitFor(() => expect(row(/^B Parallel, unadjusted/)).toBeVisible());
  });

  it('lose one, and get it back', async () => {
    const fixture = stillfoot();
    const { user } = await openWeigh(fixture);
    const [first, ...rest] = fixture.designSet.options as [OptionView, ...OptionView[]];
    server.use(
      http.delete('*/api/studies/:id/options/:optionId', () => {
        fixture.designSet.options = rest;
        fixture.designSet.removed = [{ ...first, version: 2, removedAt: '2026-11-20T10:00:00.000Z' }];
        return HttpResponse.json({ ...first, version: 2 });
      }),
      http.post('*/api/studies/:id/options/:optionId/restore', async ({ request }) => {
        expect(await request.json()).toEqual({ version: 2 });
        fixture.designSet.options = [first, ...rest];
        fixture.designSet.removed = [];
        return HttpResponse.json(first);
      }),
    );
    await user.click(screen.getByRole('button', { name: 'Remove' }));
    await user.click(await screen.findByRole('button', { name: 'Undo removing Parallel, unadjusted' }));
    await waitFor(() => expect(row(/^A Parallel, unadjusted/)).toBeVisible());
    expect(screen.queryByRole('region', { name: 'Removed options' })).not.toBeInTheDocument();
  });

  it('keep one that is ruled out, its letter outlined and its reason told', async () => {
    const fixture = stillfoot();
    const { user } = await openWeigh(fixture);
    const [first] = fixture.designSet.options as [OptionView];
    const sent: unknown[] = [];
    server.use(
      http.put('*/api/studies/:id/options/:optionId/ruling', async ({ request }) => {
        const body = (await request.json()) as { kind: 'not-admissible'; reason: string };
        sent.push(body);
        first.ruling = {
          kind: body.kind,
          reason: body.reason,
          by: 'Tomas Arrivel',
          at: '2026-11-20T10:00:00.000Z',
        };
        return HttpResponse.json(first);
      }),
    );
    await user.click(screen.getByRole('button', { name: 'Rule on it' }));
    await user.click(await screen.findByRole('radio', { name: 'Not admissible' }));
    await user.click(screen.getByRole('button', { name: 'Rule' }));
    expect(await screen.findByText('Give the reason of the ruling.')).toBeVisible();
    await user.type(screen.getByLabelText('Reason'), 'Too many to recruit.');
    await user.click(screen.getByRole('button', { name: 'Rule' }));
    await waitFor(() =>
      expect(row(/Parallel, unadjusted/)).toHaveTextContent('Ruled out by Tomas Arrivel, kept to compare'),
    );
    expect(sent).toEqual([{ kind: 'not-admissible', reason: 'Too many to recruit.', version: 1 }]);
    expect(row(/Parallel, unadjusted/)).toHaveTextContent('Not admissible: Too many to recruit.');
    expect(screen.getByRole('region', { name: 'Verdict' })).toHaveTextContent('A is ruled out.');
  });
});

describe('The choice', () => {
  it('needs its reason and one for each other option, and is shown', async () => {
    const fixture = stillfoot();
    const { user } = await openWeigh(fixture);
    const [a, b, c] = fixture.designSet.options as [OptionView, OptionView, OptionView];
    a.ruling = { kind: 'not-admissible', reason: 'Too many.', by: 'T. A.', at: '2026-11-20T10:00:00.000Z' };
    const sent: unknown[] = [];
    server.use(
      http.put('*/api/studies/:id/choice', async ({ request }) => {
        const body = (await request.json()) as { optionId: string; why: string; whyNot: [] };
        sent.push(body);
        fixture.designSet.choice = { ...body, by: 'Tomas Arrivel', at: '2026-11-21T10:00:00.000Z' };
        return HttpResponse.json(fixture.designSet);
      }),
    );
    await user.click(screen.getByRole('button', { name: 'Record the choice' }));
    const dialog = within(await screen.findByRole('dialog', { name: 'Record the choice' }));
    await user.click(dialog.getByRole('radio', { name: 'C, Crossover' }));
    await user.type(dialog.getByLabelText('Why this one'), 'The fewest participants.');
    await user.click(dialog.getByRole('button', { name: 'Record the choice' }));
    expect(await dialog.findByText('Say why not Parallel, baseline-adjusted.')).toBeVisible();
    await user.type(dialog.getByLabelText('Why not A, Parallel, unadjusted'), 'Dear.');
    await user.type(dialog.getByLabelText('Why not B, Parallel, baseline-adjusted'), 'Slow.');
    await user.click(dialog.getByRole('button', { name: 'Record the choice' }));
    const shown = within(await screen.findByRole('region', { name: 'Choice' }));
    expect(shown.getByText('The fewest participants.')).toBeVisible();
    expect(shown.getByText('Not Parallel, baseline-adjusted: Slow.')).toBeVisible();
    expect(sent).toEqual([
      {
        version: 1,
        optionId: c.id,
        why: 'The fewest participants.',
        whyNot: [
          { optionId: a.id, why: 'Dear.' },
          { optionId: b.id, why: 'Slow.' },
        ],
      },
    ]);
  });

  it('can be withdrawn by the methodologist, and only read by others', async () => {
    const fixture = stillfoot();
    const [, , c] = fixture.designSet.options as [OptionView, OptionView, OptionView];
    fixture.designSet.choice = {
      optionId: c.id,
      why: 'Small.',
      whyNot: [],
      by: 'Tomas Arrivel',
      at: '2026-11-21T10:00:00.000Z',
    };
    const { user } = await openWeigh(fixture);
    server.use(
      http.delete('*/api/studies/:id/choice', async ({ request }) => {
        expect(await request.json()).toEqual({ version: 1 });
        fixture.designSet.choice = null;
        return HttpResponse.json(fixture.designSet);
      }),
    );
    await user.click(screen.getByRole('button', { name: 'Withdraw' }));
    expect(await screen.findByRole('button', { name: 'Record the choice' })).toBeVisible();
    expect(screen.queryByRole('region', { name: 'Choice' })).not.toBeInTheDocument();
  });
});
