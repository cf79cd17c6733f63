import { cleanup, screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { useKeptEdits } from '../src/features/unsaved/model/kept-edits';
import { greenkettle } from './fixtures/greenkettle';
import { stillfoot } from './fixtures/stillfoot';
import type { StudyFixture } from './fixtures/study-fixture';
import { openApp } from './open-app';
import { problem, serve, server } from './server';

async function openCosts(fixture: StudyFixture) {
  serve(fixture);
  const app = openApp(`/studies/${fixture.study.id}/costs`);
  await screen.findByRole('form', { name: 'Costs and accrual' });
  return app;
}

const field = (name: string | RegExp) => screen.getByRole('textbox', { name });

/** The server takes a cost plan as the real one does, and tells what it was sent. */
function takeCosts(fixture: StudyFixture) {
  const sent: Record<string, unknown>[] = [];
  server.use(
    http.put(`*/api/studies/${fixture.study.id}/costs`, async ({ request }) => {
      const body = (await request.json()) as typeof fixture.costs;
      sent.push(body as never);
      Object.assign(fixture.costs, body, { version: fixture.costs.version + 1 });
      return HttpResponse.json({ ...fixture.costs });
    }),
  );
  return sent;
}

describe('Costs', () => {
  it('are shown line by line, those by treatment for each, with the sharing rule in words', async () => {
    await openCosts(greenkettle());
    expect(field('Fixed')).toHaveValue('240,000');
    expect(field('Each catchment')).toHaveValue('5,500');
    const periods = within(screen.getByRole('group', { name: 'Each catchment in each period' }));
    expect(periods.getByRole('textbox', { name: 'Usual canteen' })).toHaveValue('900');
    expect(periods.getByRole('textbox', { name: 'Kitchen gardens' })).toHaveValue('4,700');
    expect(field('Accrual in each catchment')).toHaveValue('40');
    expect(screen.getByRole('region', { name: 'How cost is shared' })).toHaveTextContent(
      /split between them in proportion to their exposures/,
    );
    expect(document.title).toBe('Costs · Greenkettle · Steelyard');
  });

  it('show what a change does to every option before it is saved, and once it is', async () => {
    const fixture = stillfoot();
    const sent = takeCosts(fixture);
    const { user } = await openCosts(fixture);
    await user.clear(field('Fixed'));
    await user.type(field('Fixed'), '249000');
    const row = () => screen.getByRole('row', { name: /Parallel, unadjusted/ });
    // The fixed cost goes up by 10,000, and so does the total of 490,255.
    await waitFor(() => expect(row()).toHaveTextContent('490,255 € → 500,255 €'));
    await user.click(screen.getByRole('button', { name: 'Save costs and accrual' }));
    expect(await screen.findByText('Saved. Every option moved:')).toBeVisible();
    expect(sent).toHaveLength(1);
    expect(sent[0]).toMatchObject({
      version: 1,
      costs: { currency: 'EUR', fixed: 249_000, perExposure: [54, 168] },
      timeline: { startUp: 4, accrualPerMonth: 6.6 },
    });
    expect(sent[0]?.costs).not.toHaveProperty('perClusterPeriod');
    expect(sent[0]?.costs).not.toHaveProperty('perArm');
  });

  it('say at the field what cannot be, and send nothing', async () => {
    const fixture = greenkettle();
    const sent = takeCosts(fixture);
    const { user } = await openCosts(fixture);
    await user.type(field('Accrual, whole study'), '20');
    await user.clear(field('Fixed'));
    await user.type(field('Fixed'), 'a lot');
    await user.click(screen.getByRole('button', { name: 'Save costs and accrual' }));
    expect(await screen.findByText(/“a lot” is not a number/)).toBeVisible();
    await user.clear(field('Fixed'));
    await user.click(screen.getByRole('button', { name: 'Save costs and accrual' }));
    expect(
      await screen.findByText('State accrual for the whole study or per cluster, not both.'),
    ).toBeVisible();
    expect(sent).toEqual([]);
  });

  it('keep what was typed through a reload, and let it be discarded', async () => {
    const fixture = stillfoot();
    const { user } = await openCosts(fixture);
    await user.clear(field('Washout'));
    cleanup();
    await openCosts(fixture);
    expect(field('Washout')).toHaveValue('');
    await user.click(screen.getByRole('button', { name: 'Discard my changes' }));
    expect(field('Washout')).toHaveValue('0.5');
    expect(useKeptEdits.getState().edits).toEqual({});
  });

  it('put both versions side by side when somebody saved first', async () => {
    const fixture = stillfoot();
    const { study, costs } = fixture;
    const { user } = await openCosts(fixture);
    const theirs = {
      ...costs,
      version: 2,
      costs: { ...costs.costs, fixed: 230_000, perExposure: [60, 168] },
    };
    server.use(
      http.put(`*/api/studies/${study.id}/costs`, () => problem(409, 'stale', { current: theirs })),
      http.get(`*/api/studies/${study.id}/history`, () => HttpResponse.json({ entries: [], next: null })),
    );
    await user.clear(field('Fixed'));
    await user.type(field('Fixed'), '250000');
    await user.click(screen.getByRole('button', { name: 'Save costs and accrual' }));
    const both = await screen.findByRole('table', { name: 'Your version and theirs' });
    expect(within(both).getByRole('row', { name: 'Fixed 250000 230000' })).toBeVisible();
    expect(
      within(both).getByRole('row', { name: 'Each participant treated, Vehicle gel 54 60' }),
    ).toBeVisible();
    expect(screen.getByText('Somebody else saved first')).toBeVisible();
    fixture.costs = theirs;
    serve(fixture);
    const sent = takeCosts(fixture);
    await user.click(screen.getByRole('button', { name: 'Go on with mine' }));
    expect(field('Fixed')).toHaveValue('250,000');
    await user.click(screen.getByRole('button', { name: 'Save costs and accrual' }));
    await waitFor(() => expect(sent[0]).toMatchObject({ version: 2, costs: { fixed: 250_000 } }));
  });

  it('are read and not changed by a reader', async () => {
    const fixture = stillfoot();
    fixture.study.role = 'reader';
    serve(fixture);
    openApp(`/studies/${fixture.study.id}/costs`);
    expect(await screen.findByText('239,000 €')).toBeVisible();
    expect(screen.getByText('Each participant treated, Vantholine gel')).toBeVisible();
    expect(screen.queryByRole('textbox')).not.toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /Save/ })).not.toBeInTheDocument();
  });
});
