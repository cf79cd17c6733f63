import { cleanup, screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { useKeptEdits } from '../src/features/unsaved/model/kept-edits';
import { stillfoot } from './fixtures/stillfoot';
import type { StudyFixture } from './fixtures/study-fixture';
import { openApp } from './open-app';
import { problem, serve, server } from './server';

async function openLedger(fixture: StudyFixture) {
  serve(fixture);
  const app = openApp(`/studies/${fixture.study.id}/ledger`);
  await screen.findByRole('list', { name: 'Planning values' });
  return app;
}

const line = (name: string) => {
  const heading = screen.getByRole('heading', { level: 2, name });
  return within(heading.closest('li') as HTMLElement);
};

/** The server takes a planning value as the real one does, and tells what it was sent. */
function takePlanningValues({ study, ledger }: StudyFixture) {
  const sent: Record<string, unknown>[] = [];
  server.use(
    http.put(`*/api/studies/${study.id}/planning-values`, async ({ request }) => {
      const body = (await request.json()) as Record<string, unknown>;
      sent.push(body);
      const at = ledger.findIndex(({ key, family }) => key === body.key && family === body.family);
      const { version, ...figures } = body;
      const next = {
        ...(ledger[at] ?? { id: '99999999-0000-4000-8000-000000000001' }),
        ...figures,
        version: Number(version ?? 0) + 1,
        setBy: 'Tomas Arrivel',
        setAt: '2026-11-30T10:00:00.000Z',
      } as (typeof ledger)[number];
      if (at >= 0) ledger[at] = next;
      else ledger.push(next);
      return HttpResponse.json(next);
    }),
  );
  return sent;
}

describe('The ledger', () => {
  it('lists each value with its unit, range, source, author and the options that draw on it', async () => {
    await openLedger(stillfoot());
    expect(line('Standard deviation').getByText('2.1 points')).toBeVisible();
    expect(line('Standard deviation').getByText('Pilot of 30: 1.9')).toBeVisible();
    expect(line('Standard deviation').getByText(/Set by Tomas Arrivel/)).toBeVisible();
    expect(line('Standard deviation').getByText('Drawn on by A, B and C.')).toBeVisible();
    expect(line('Within-person correlation').getByText('0.4 to 0.75')).toBeVisible();
    expect(line('Correlation with baseline').getByText('Drawn on by B.')).toBeVisible();
    expect(line('Within-person correlation').getByText('Drawn on by C.')).toBeVisible();
    expect(line('Attrition').getByText('12 %')).toBeVisible();
    expect(line('Attrition').getByText('Drawn on by A and B.')).toBeVisible();
    expect(line('Attrition, crossover').getByText('Drawn on by C.')).toBeVisible();
    expect(line('Contamination').getByText('not stated')).toBeVisible();
    expect(screen.queryByRole('heading', { name: 'Control proportion' })).not.toBeInTheDocument();
    expect(document.title).toBe('Ledger · Stillfoot · Steelyard');
  });

  it('shows what a change does to every option before it is saved, and once it is', async () => {
    const fixture = stillfoot();
    const sent = takePlanningValues(fixture);
    const { user } = await openLedger(fixture);
    await user.click(screen.getByRole('button', { name: 'Change Standard deviation' }));
    const value = screen.getByRole('textbox', { name: 'Value' });
    expect(value).toHaveFocus();
    await user.clear(value);
    await user.type(value, '2.4');
    expect(await screen.findByText('This moves every option:')).toBeVisible();
    // 123 an arm by base R's power.t.test at SD 2.4, with 12 % more recruited.
    const row = screen.getByRole('row', { name: /Parallel, unadjusted/ });
    expect(row).toHaveTextContent('214 → 280');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    expect(await screen.findByText('Saved. Every option moved:')).toBeVisible();
    expect(screen.getByRole('row', { name: /Parallel, unadjusted/ })).toHaveTextContent('214 → 280');
    expect(line('Standard deviation').getByText('2.4 points')).toBeVisible();
    expect(screen.getByRole('heading', { name: 'Standard deviation' })).toHaveFocus();
    expect(sent).toEqual([
      { key: 'sd', family: null, value: 2.4, low: null, high: null, source: 'Pilot of 30: 1.9', version: 1 },
    ]);
  });

  it('says at the field what cannot be, in the unit shown', async () => {
    const fixture = stillfoot();
    const sent = takePlanningValues(fixture);
    const { user } = await openLedger(fixture);
    await user.click(screen.getByRole('button', { name: 'Change Attrition' }));
    const value = screen.getByRole('textbox', { name: 'Value' });
    await user.clear(value);
    await user.type(value, '100');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    expect(await screen.findByText(/It must be below 100 %/)).toBeVisible();
    expect(sent).toEqual([]);
  });

  it('keeps what was typed through a reload', async () => {
    const fixture = stillfoot();
    const { user } = await openLedger(fixture);
    await user.click(screen.getByRole('button', { name: 'Change Standard deviation' }));
    await user.type(screen.getByRole('textbox', { name: 'Source' }), ', see the report');
    cleanup();
    await openLedger(fixture);
    expect(screen.getByRole('textbox', { name: 'Source' })).toHaveValue('Pilot of 30: 1.9, see the report');
    await user.click(screen.getByRole('button', { name: 'Discard my changes' }));
    expect(useKeptEdits.getState().edits).toEqual({});
  });

  it('keeps text that is no number through a reload, and says so', async () => {
    const fixture = stillfoot();
    const { user } = await openLedger(fixture);
    await user.click(screen.getByRole('button', { name: 'Change Standard deviation' }));
    await user.clear(screen.getByRole('textbox', { name: 'Value' }));
    await user.type(screen.getByRole('textbox', { name: 'Value' }), 'two');
    cleanup();
    await openLedger(fixture);
    expect(screen.getByRole('textbox', { name: 'Value' })).toHaveValue('two');
    expect(screen.getByText(/^“two” is not a number/)).toBeVisible();
  });

  it('puts both versions side by side when somebody saved first, and loses neither', async () => {
    const fixture = stillfoot();
    const { study, ledger } = fixture;
    const theirs = { ...ledger[0], value: 2.5, version: 2, source: 'A register', setBy: 'Ilse Quennell' };
    const { user } = await openLedger(fixture);
    server.use(
      http.put(`*/api/studies/${study.id}/planning-values`, () => problem(409, 'stale', { current: theirs })),
    );
    await user.click(screen.getByRole('button', { name: 'Change Standard deviation' }));
    const value = screen.getByRole('textbox', { name: 'Value' });
    await user.clear(value);
    await user.type(value, '2.3');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    expect(await screen.findByText('Ilse Quennell saved first')).toBeVisible();
    const both = screen.getByRole('table', { name: 'Your version and theirs' });
    expect(within(both).getByRole('row', { name: 'Value 2.3 2.5' })).toBeVisible();
    ledger[0] = theirs as (typeof ledger)[number];
    server.resetHandlers();
    serve(fixture);
    const sent = takePlanningValues(fixture);
    await user.click(screen.getByRole('button', { name: 'Go on with mine' }));
    expect(screen.getByRole('textbox', { name: 'Value' })).toHaveValue('2.3');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]).toMatchObject({ value: 2.3, version: 2 });
  });

  it('marks what was assumed at the start until somebody says where a value comes from', async () => {
    const fixture = stillfoot();
    Object.assign(fixture.ledger[1] as object, { source: 'assumed, replace' });
    await openLedger(fixture);
    expect(screen.getByText(/One value says “assumed, replace”/)).toBeVisible();
    expect(line('Correlation with baseline').getAllByText('assumed, replace')).toHaveLength(2);
  });

  it('lets one family take a value of its own', async () => {
    const fixture = stillfoot();
    const sent = takePlanningValues(fixture);
    const { user } = await openLedger(fixture);
    await user.selectOptions(
      screen.getByRole('combobox', { name: 'A value for one family of designs' }),
      'Non-adherence, crossover',
    );
    await user.type(screen.getByRole('textbox', { name: 'Value' }), '5');
    await user.type(screen.getByRole('textbox', { name: 'Source' }), 'Two periods');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]).toMatchObject({ key: 'nonAdherence', family: 'crossover', value: 0.05, version: null });
  });

  it('takes back the value of one family after showing what that does', async () => {
    const fixture = stillfoot();
    const { study, ledger } = fixture;
    const own = ledger.findIndex(({ family }) => family === 'crossover');
    const removed: unknown[] = [];
    const { user } = await openLedger(fixture);
    server.use(
      http.delete(`*/api/studies/${study.id}/planning-values/${ledger[own]?.id}`, async ({ request }) => {
        removed.push(await request.json());
        ledger.splice(own, 1);
        return new HttpResponse(null, { status: 204 });
      }),
    );
    expect(screen.queryByRole('button', { name: 'Remove Attrition' })).not.toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Remove Attrition, crossover' }));
    const dialog = screen.getByRole('dialog', { name: 'Remove Attrition, crossover?' });
    // 40 analysed in two sequences: 20 / 0.80 and 20 / 0.88, rounded up.
    expect(within(dialog).getByRole('row', { name: /Crossover/ })).toHaveTextContent('50 → 46');
    await user.click(within(dialog).getByRole('button', { name: 'Remove' }));
    expect(await screen.findByText('Saved. C moved:')).toBeVisible();
    await waitFor(() =>
      expect(screen.queryByRole('heading', { name: 'Attrition, crossover' })).not.toBeInTheDocument(),
    );
    expect(line('Attrition').getByText('Drawn on by A, B and C.')).toBeVisible();
    expect(removed).toEqual([{ version: 1 }]);
  });

  it('shows the history of a value', async () => {
    const fixture = stillfoot();
    const [sd] = fixture.ledger;
    const { user } = await openLedger(fixture);
    server.use(
      http.get(`*/api/studies/${fixture.study.id}/planning-values/${sd?.id}/history`, () =>
        HttpResponse.json({
          entries: [
            { ...sd, version: 2, value: 2.1 },
            { ...sd, version: 1, value: 1.9, low: 1.6, high: 2.4, source: 'Pilot of 30' },
          ],
        }),
      ),
    );
    await user.click(screen.getByRole('button', { name: 'History of Standard deviation' }));
    const table = await screen.findByRole('table', { name: 'History of Standard deviation' });
    const [, newest, oldest] = within(table).getAllByRole('row');
    expect(newest).toHaveTextContent('2.1 points');
    expect(oldest).toHaveTextContent('1.9 points1.6 points to 2.4 pointsPilot of 30Tomas Arrivel');
  });

  it('is read and not changed by those who do not set planning values', async () => {
    const fixture = stillfoot();
    fixture.study.role = 'investigator';
    await openLedger(fixture);
    expect(screen.queryByRole('button', { name: /^Change/ })).not.toBeInTheDocument();
    expect(screen.queryByRole('combobox')).not.toBeInTheDocument();
    expect(screen.getByText(/The methodologist of the study sets these values/)).toBeVisible();
    expect(screen.getByRole('button', { name: 'History of Standard deviation' })).toBeVisible();
  });
});
