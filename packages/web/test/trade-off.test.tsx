import type { ChangedDesignSet, ChangedOption } from '@steelyard/api/contract/options';
import { cleanup, screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { greenkettle } from './fixtures/greenkettle';
import { stillfoot } from './fixtures/stillfoot';
import { option, type StudyFixture } from './fixtures/study-fixture';
import { openApp } from './open-app';
import { problem, serve, server } from './server';
import { smallScreen, surroundings } from './surroundings';
import { openWeigh, optionRow, storesOptions } from './weigh-page';

const card = () => within(screen.getByRole('region', { name: 'Trade-off' }));
const marker = (name: RegExp) => card().getByRole('slider', { name });
const held = (name: RegExp) =>
  within(screen.getByRole('group', { name: 'Hold' })).getByRole('button', { name });
const choose = (axis: string) => card().getByRole('combobox', { name: axis });

/** The server takes options and holds, as it would, and keeps them in the fixture. */
function store(fixture: StudyFixture) {
  const bodies: { options: ChangedOption[]; set?: ChangedDesignSet } = { options: storesOptions(fixture) };
  server.use(
    http.put('*/api/studies/:id/design-set', async ({ request }) => {
      bodies.set = (await request.json()) as ChangedDesignSet;
      fixture.designSet = {
        ...fixture.designSet,
        hold: bodies.set.hold,
        version: fixture.designSet.version + 1,
      };
      return HttpResponse.json(fixture.designSet);
    }),
  );
  return bodies;
}

describe('The trade-off canvas', () => {
  it('has a control for each option, which says what its size means', async () => {
    await openWeigh(stillfoot());
    const sliders = card().getAllByRole('slider');
    expect(sliders).toHaveLength(3);
    expect(sliders[2]).toHaveAccessibleName('C Crossover, participants in each sequence');
    expect(sliders[2]).toHaveAttribute('aria-valuenow', '20');
    expect(sliders[2]?.getAttribute('aria-valuetext')).toMatch(
      /^2 × 20 participants, two periods, power 90\.7\s%, 333\sk€, 18\.1 months, Reaches 90\s%$/,
    );
  });

  it('moves an option by the arrow keys: row, hold, verdict and finding follow', async () => {
    const { user } = await openWeigh(stillfoot());
    marker(/^A/).focus();
    await user.keyboard('{ArrowLeft}{ArrowLeft}');
    expect(marker(/^A/)).toHaveAttribute('aria-valuenow', '92');
    expect(optionRow(/Parallel, unadjusted/)).toHaveTextContent('2 × 92 participants');
    expect(held(/^Sizes$/)).toHaveAttribute('aria-pressed', 'true');
    expect(screen.getByRole('region', { name: 'Verdict' })).toHaveTextContent(
      /A .*of the 90\s% asked for|A stays just under 90\s%/,
    );
    expect(
      card().getByText(/^A now 2 × 92 participants: power 89\.\d\s%, .* less, no longer reaches 90\s%\.$/, {
        selector: 'div p',
      }),
    ).toBeVisible();
  });

  it('reads the finding out once the moving pauses', async () => {
    const { user } = await openWeigh(stillfoot());
    expect(card().getAllByRole('status').at(-1)).toBeEmptyDOMElement();
    marker(/^C/).focus();
    await user.keyboard('{PageUp}');
    await waitFor(() =>
      expect(card().getAllByRole('status').at(-1)).toHaveTextContent(
        /^C now 2 × \d+ participants, two periods: power/,
      ),
    );
  });

  it('goes further by the page keys, and to both ends', async () => {
    const { user } = await openWeigh(stillfoot());
    const sizes = async (key: string) => {
      await user.keyboard(`{${key}}`);
      return Number(marker(/^A/).getAttribute('aria-valuenow'));
    };
    marker(/^A/).focus();
    const start = 94;
    const paged = await sizes('PageUp');
    expect(paged).toBeGreaterThan(start + 2);
    expect(await sizes('PageDown')).toBe(start);
    expect(await sizes('Home')).toBe(Number(marker(/^A/).getAttribute('aria-valuemin')));
    expect(await sizes('ArrowLeft')).toBe(Number(marker(/^A/).getAttribute('aria-valuemin')));
    expect(await sizes('End')).toBe(Number(marker(/^A/).getAttribute('aria-valuemax')));
  });

  it('goes back to the hold and the sizes before', async () => {
    const { user } = await openWeigh(stillfoot());
    marker(/^A/).focus();
    await user.keyboard('{ArrowRight}');
    await user.click(card().getByRole('button', { name: 'Undo' }));
    expect(held(/^Power 90\s%$/)).toHaveAttribute('aria-pressed', 'true');
    expect(optionRow(/Parallel, unadjusted/)).toHaveTextContent('2 × 94 participants');
    expect(optionRow(/Parallel, unadjusted/)).not.toHaveTextContent('Edits not saved');
    expect(card().queryByRole('button', { name: 'Undo' })).not.toBeInTheDocument();
    expect(marker(/^A/)).toHaveFocus();
  });

  it('goes back too where the hold that is stored is chosen again', async () => {
    const { user } = await openWeigh(stillfoot());
    marker(/^A/).focus();
    await user.keyboard('{ArrowRight}');
    await user.click(held(/^Power/));
    expect(held(/^Power 90\s%$/)).toHaveAttribute('aria-pressed', 'true');
    expect(optionRow(/Parallel, unadjusted/)).not.toHaveTextContent('Edits not saved');
  });

  it('stores the sizes of all options and the hold', async () => {
    const fixture = stillfoot();
    const bodies = store(fixture);
    const { user } = await openWeigh(fixture);
    marker(/^A/).focus();
    await user.keyboard('{ArrowRight}');
    await user.click(card().getByRole('button', { name: 'Save the sizes' }));
    await waitFor(() => expect(bodies.set?.hold).toEqual({ kind: 'sizes', power: 0.9 }));
    expect(bodies.options.map(({ plan }) => plan.units)).toEqual([95, 66, 20]);
    await waitFor(() =>
      expect(card().queryByRole('region', { name: 'Sizes not saved' })).not.toBeInTheDocument(),
    );
    expect(held(/^Sizes$/)).toHaveAttribute('aria-pressed', 'true');
    expect(marker(/^A/)).toHaveAttribute('aria-valuenow', '95');
    expect(optionRow(/Parallel, unadjusted/)).not.toHaveTextContent('Edits not saved');
  });

  it('lets sizes be held as they are, with undo, and stores them', async () => {
    const fixture = stillfoot();
    const bodies = store(fixture);
    const { user } = await openWeigh(fixture);
    await user.click(held(/^Sizes$/));
    expect(held(/^Sizes$/)).toHaveAttribute('aria-pressed', 'true');
    expect(optionRow(/Parallel, unadjusted/)).toHaveTextContent('2 × 94 participants');
    const bar = () => within(card().getByRole('region', { name: 'Sizes not saved' }));
    expect(bar().getByText(/the sizes A 94, B 66 and C 20; stored: Power 90\s%/)).toBeVisible();
    await user.click(bar().getByRole('button', { name: 'Undo' }));
    expect(held(/^Power 90\s%$/)).toHaveAttribute('aria-pressed', 'true');
    expect(marker(/^A/)).toHaveFocus();
    await user.click(held(/^Sizes$/));
    expect(bodies.set).toBeUndefined();
    await user.click(bar().getByRole('button', { name: 'Save the sizes' }));
    await waitFor(() => expect(bodies.set?.hold).toEqual({ kind: 'sizes', power: 0.9 }));
    expect(bodies.options.map(({ plan }) => plan.units)).toEqual([94, 66, 20]);
    await waitFor(() => expect(card().queryByRole('region', { name: 'Sizes not saved' })).toBeNull());
    expect(optionRow(/Parallel, unadjusted/)).not.toHaveTextContent('Enter a size');
  });

  it('does the same where sizes are chosen among all that may be held', async () => {
    const fixture = stillfoot();
    const bodies = store(fixture);
    const { user } = await openWeigh(fixture);
    const hold = async (power?: string) => {
      await user.click(screen.getByRole('button', { name: 'Change what is held' }));
      const dialog = within(await screen.findByRole('dialog', { name: 'What is kept equal' }));
      await user.click(dialog.getByRole('radio', { name: /^Sizes:/ }));
      expect(dialog.getByText(/^Each option is entered at the size it has now/)).toBeVisible();
      if (power) {
        await user.clear(dialog.getByLabelText('Power'));
        await user.type(dialog.getByLabelText('Power'), power);
      }
      await user.click(dialog.getByRole('button', { name: 'Hold' }));
      await waitFor(() => expect(held(/^Sizes$/)).toHaveAttribute('aria-pressed', 'true'));
    };
    await hold();
    expect(bodies.set).toBeUndefined();
    expect(card().getByText(/the sizes A 94, B 66 and C 20; stored: Power 90\s%/)).toBeVisible();
    await user.click(card().getByRole('button', { name: 'Undo' }));
    await hold('85');
    expect(bodies.set?.hold).toEqual({ kind: 'power', power: 0.85 });
    expect(await card().findByText(/the sizes A 94, B 66 and C 20; stored: Power 85\s%/)).toBeVisible();
  });

  it('holds sizes at once where there is no option yet', async () => {
    const fixture = stillfoot();
    fixture.designSet.options = [];
    const bodies = store(fixture);
    serve(fixture);
    const { user } = openApp(`/studies/${fixture.study.id}/weigh`);
    await user.click(await screen.findByRole('button', { name: 'Sizes' }));
    await waitFor(() => expect(bodies.set?.hold).toEqual({ kind: 'sizes', power: 0.9 }));
  });

  it('keeps sizes that could not be stored, and says why', async () => {
    const fixture = stillfoot();
    const { user } = await openWeigh(fixture);
    server.use(
      http.put('*/api/studies/:id/options/:option', () =>
        problem(409, 'stale', { title: 'Somebody was first.' }),
      ),
    );
    marker(/^A/).focus();
    await user.keyboard('{ArrowRight}');
    await user.click(card().getByRole('button', { name: 'Save the sizes' }));
    expect(await card().findByRole('alert')).toHaveTextContent('Somebody was first.');
    expect(marker(/^A/)).toHaveAttribute('aria-valuenow', '95');
  });

  it('fills the option’s form with the size', async () => {
    const { user } = await openWeigh(stillfoot());
    await user.click(screen.getByRole('button', { name: 'Edit' }));
    await screen.findByRole('textbox', { name: 'Participants in each arm' });
    marker(/^A/).focus();
    await user.keyboard('{ArrowRight}');
    await waitFor(() =>
      expect(screen.getByRole('textbox', { name: 'Participants in each arm' })).toHaveValue('95'),
    );
  });

  it('lets readers look and not move', async () => {
    const fixture = stillfoot();
    fixture.study.role = 'reader';
    const { user } = await openWeigh(fixture);
    expect(card().queryByRole('slider')).not.toBeInTheDocument();
    const told = card().getByRole('img', {
      name: /^A Parallel, unadjusted, .*: 2 × 94 participants, power 90\.1\s%/,
    });
    told.focus();
    await user.keyboard('{ArrowRight}');
    expect(optionRow(/Parallel, unadjusted/)).toHaveTextContent('2 × 94 participants');
  });

  it('draws other axes, and the size of a cluster where there are clusters', async () => {
    const { user } = await openWeigh(greenkettle());
    await user.selectOptions(choose('up'), 'Detectable difference, g/L');
    expect(card().getByRole('group', { name: 'Detectable difference, g/L over cost' })).toBeVisible();
    await user.selectOptions(choose('over'), 'size of a catchment');
    expect(marker(/^A Cluster, end only, girls in each catchment$/)).toHaveAttribute('aria-valuenow', '40');
    marker(/^A/).focus();
    await user.keyboard('{ArrowRight}');
    expect(optionRow(/Cluster, end only/)).toHaveTextContent('44 catchments × 41');
  });

  it('keeps the axes in the address, the usual ones left out', async () => {
    const fixture = greenkettle();
    const path = `/studies/${fixture.study.id}/weigh`;
    const { user, address } = await openWeigh(fixture);
    await user.selectOptions(choose('over'), 'size of a catchment');
    await waitFor(() => expect(address()).toBe(`${path}?over=clusterSize`));
    await user.selectOptions(choose('across'), 'Months');
    await user.selectOptions(choose('up'), 'Detectable difference, g/L');
    await waitFor(() => expect(address()).toBe(`${path}?over=clusterSize&across=months&up=detectable`));
    const followed = address();
    for (const [axis, usual] of [
      ['over', 'number of catchments'],
      ['across', 'Cost'],
      ['up', 'Power'],
    ] as const) {
      await user.selectOptions(choose(axis), usual);
    }
    await waitFor(() => expect(address()).toBe(path));
    cleanup();
    await openWeigh(fixture, followed.slice(path.length));
    expect(choose('over')).toHaveDisplayValue('size of a catchment');
    expect(choose('across')).toHaveDisplayValue('Months');
    expect(card().getByRole('group', { name: 'Detectable difference, g/L over months' })).toBeVisible();
  });

  it('has its usual axes where the address names none that there is', async () => {
    await openWeigh(stillfoot(), '?across=miles&up=clusterSize');
    expect(card().getByRole('group', { name: 'Power over cost' })).toBeVisible();
  });

  it('gives the same as a table', async () => {
    const { user } = await openWeigh(stillfoot());
    await user.click(card().getByRole('button', { name: 'Table of the trade-off' }));
    const table = card().getByRole('table', { name: 'Trade-off as a table' });
    expect(
      within(table).getByRole('row', { name: /^C Crossover 20 participants in each sequence, now/ }),
    ).toHaveTextContent(/90\.7\s%.*332,789\s€.*18\.1/);
  });

  it('says why an option is not drawn, and draws the others', async () => {
    const fixture = stillfoot();
    fixture.designSet.options.push(option('Clusters', { family: 'cluster', clusterSize: 20 }));
    await openWeigh(fixture);
    expect(card().getAllByRole('slider')).toHaveLength(3);
    expect(card().getByText(/^D is not drawn\. State the ICC/)).toBeVisible();
  });

  it('draws a single option, and options that are all alike', async () => {
    const fixture = stillfoot();
    fixture.designSet.options = ['One', 'Two', 'Three'].map((name) => option(name, { family: 'parallel' }));
    await openWeigh(fixture);
    const places = card()
      .getAllByRole('slider')
      .map(({ style }) => `${style.left} ${style.top}`);
    expect(new Set(places).size).toBe(3);
  });

  it('takes the pointer’s choice of an option on a large screen only', async () => {
    const fixture = stillfoot();
    const { user, address } = await openWeigh(fixture);
    marker(/^B/).focus();
    await user.keyboard('{Enter}');
    await waitFor(() => expect(address()).toContain(`option=${fixture.designSet.options[1]?.id}`));
  });

  it('does not cover a small screen with the form when a marker is moved', async () => {
    surroundings.matching = [smallScreen];
    const { user } = await openWeigh(stillfoot());
    marker(/^A/).focus();
    await user.keyboard('{ArrowRight}{Enter}');
    expect(marker(/^A/)).toHaveAttribute('aria-valuenow', '95');
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
  });
});
