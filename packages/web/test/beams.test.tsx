import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { greenkettle } from './fixtures/greenkettle';
import { stillfoot } from './fixtures/stillfoot';
import { option, type StudyFixture } from './fixtures/study-fixture';
import { smallScreen, surroundings } from './surroundings';
import { openWeigh, optionRow } from './weigh-page';

const card = () => screen.getByRole('region', { name: 'Options side by side' });
const panel = () => screen.getByRole('region', { name: /^Option [A-Z]$/ });
const beam = (row: RegExp, name: RegExp) => within(optionRow(row)).getByRole('button', { name });
/** The beam once the page shows what was asked of it. */
const showing = (row: RegExp, name: RegExp) => within(optionRow(row)).findByRole('button', { name });
const optionId = ({ designSet }: StudyFixture, position: number) => designSet.options[position]?.id;

describe('Beams', () => {
  it('show cost, participants and months by turns, as the address says', async () => {
    const fixture = stillfoot();
    const { user, address } = await openWeigh(fixture);
    const chooser = screen.getByRole('combobox', { name: 'Beams show' });
    expect(
      within(chooser)
        .getAllByRole('option')
        .map(({ textContent }) => textContent),
    ).toEqual(['Cost by arm', 'Participants by arm', 'Months by phase']);
    await user.selectOptions(chooser, 'Participants by arm');
    expect(
      await showing(/Parallel, unadjusted/, /^Participants by arm: Vehicle gel 107 participants, /),
    ).toBeVisible();
    expect(optionRow(/Parallel, unadjusted/)).toHaveTextContent('214 participants');
    expect(address()).toBe(`/studies/${fixture.study.id}/weigh?beams=participants`);
    await user.selectOptions(screen.getByRole('combobox', { name: 'Beams show' }), 'Months by phase');
    expect(
      await showing(
        /Crossover/,
        /^Months by phase: Start-up 4 months, Recruitment 7.6 months, Follow-up and periods 3.5 months/,
      ),
    ).toBeVisible();
    expect(card()).toHaveTextContent('By phase, as arms run side by side');
    await user.selectOptions(screen.getByRole('combobox', { name: 'Beams show' }), 'Cost by arm');
    await waitFor(() => expect(address()).toBe(`/studies/${fixture.study.id}/weigh`));
  });

  it('show clusters under the study’s own name, and say which option has none', async () => {
    const fixture = greenkettle();
    fixture.designSet.options.push(option('Girls one by one', { family: 'parallel' }));
    await openWeigh(fixture, '?beams=clusters');
    expect(
      beam(
        /Cluster, end only/,
        /^Catchments by arm: Usual canteen 22 catchments, Kitchen gardens 22 catchments$/,
      ),
    ).toBeVisible();
    expect(optionRow(/Girls one by one/)).toHaveTextContent('No catchments: it randomises individuals');
  });

  it('have the matching limit drawn through and told', async () => {
    const fixture = greenkettle();
    fixture.limits = {
      version: 1,
      limits: { clusters: 32, participantsPerCluster: 60, money: 800_000, months: 30 },
    };
    const { user } = await openWeigh(fixture);
    const row = /Cluster, end only/;
    const chooser = () => screen.getByRole('combobox', { name: 'Beams show' });
    expect(beam(row, /the limit is 800\sk€$/).querySelector('line')).not.toBeNull();
    await user.selectOptions(chooser(), 'Catchments by arm');
    expect((await showing(row, /the limit is 32 catchments$/)).querySelector('line')).not.toBeNull();
    // 60 girls in each of the 44 catchments that the option takes.
    await user.selectOptions(chooser(), 'Girls by arm');
    expect((await showing(row, /the limit is 2,640 girls$/)).querySelector('line')).not.toBeNull();
    await user.selectOptions(chooser(), 'Months by phase');
    expect((await showing(row, /the limit is 30 months$/)).querySelector('line')).not.toBeNull();
  });

  it('leave out a limit that lies far beyond them all, and still tell it', async () => {
    const fixture = stillfoot();
    fixture.limits = { version: 1, limits: { money: 5_000_000 } };
    await openWeigh(fixture);
    expect(beam(/Crossover/, /the limit is 5,000\sk€$/).querySelector('line')).toBeNull();
    expect(card()).toHaveTextContent(/Beams run from 0 to 500\sk€/);
  });

  it('show their parts to those who focus or press them, and tell them to those who listen', async () => {
    const { user } = await openWeigh(stillfoot());
    const crossover = beam(/Crossover/, /^Cost by arm/);
    expect(crossover).toHaveAccessibleDescription(
      /^Vehicle gel: direct [\d,]+, shared [\d,]+, total [\d,]+, each exposure/,
    );
    crossover.focus();
    const parts = await screen.findByRole('table', { name: 'Parts by arm, eur' });
    expect(within(parts).getByRole('row', { name: /^Together / })).toHaveTextContent('332,789');
    await user.keyboard('{Escape}');
    await waitFor(() => expect(screen.queryByRole('table', { name: /^Parts/ })).not.toBeInTheDocument());
    await user.click(crossover);
    expect(await screen.findByRole('table', { name: /^Parts/ })).toBeVisible();
  });

  it('stripe a group that goes through both arms, and say so only where there is one', async () => {
    const fixture = stillfoot();
    await openWeigh(fixture, '?beams=participants');
    expect(card()).toHaveTextContent('one after the other striped');
    const fills = [...beam(/Crossover/, /^Participants/).querySelectorAll('svg > rect')];
    expect(fills.map((rect) => rect.getAttribute('fill'))).toEqual([
      expect.stringMatching(/^url\(#/),
      expect.stringMatching(/^url\(#/),
    ]);
  });
});

describe('Differences against an option', () => {
  it('are told in every row and in the panel, from the panel’s own button, and lead back', async () => {
    const fixture = stillfoot();
    const { user, address } = await openWeigh(fixture, `?option=${optionId(fixture, 2)}`);
    await user.click(within(panel()).getByRole('button', { name: 'Against A' }));
    await waitFor(() =>
      expect(address()).toBe(
        `/studies/${fixture.study.id}/weigh?option=${optionId(fixture, 2)}&against=${optionId(fixture, 0)}`,
      ),
    );
    const words =
      /164 fewer participants, 157\sk€ less, 22.8 months shorter and 0.6 points more power than A/;
    await waitFor(() => expect(optionRow(/Crossover/)).toHaveTextContent(words));
    expect(panel()).toHaveTextContent(words);
    const figures = within(optionRow(/Crossover/))
      .getAllByRole('cell')
      .map(({ textContent }) => textContent?.replaceAll('\u00a0', ' '));
    expect(figures).toEqual(
      expect.arrayContaining(['90.7 % power+0.6 points', '333 k€−157 k€', '18 months−22.8']),
    );
    expect(optionRow(/unadjusted/)).toHaveTextContent('The others are told against this one.');
    await user.click(within(card()).getByRole('button', { name: 'Back to the limits' }));
    await waitFor(() => expect(optionRow(/Crossover/)).not.toHaveTextContent('than A'));
    expect(address()).toBe(`/studies/${fixture.study.id}/weigh?option=${optionId(fixture, 2)}`);
  });

  it('are chosen from the beams too, and kept while another option is selected', async () => {
    const fixture = stillfoot();
    const { user, address } = await openWeigh(fixture);
    await user.selectOptions(screen.getByRole('combobox', { name: 'Told' }), 'Against B');
    await waitFor(() => expect(optionRow(/Crossover/)).toHaveTextContent(/113\sk€ less.* than B/));
    await user.click(within(within(optionRow(/Crossover/)).getByRole('rowheader')).getByRole('button'));
    expect(address()).toContain(`against=${optionId(fixture, 1)}`);
    await waitFor(() =>
      expect(within(panel()).getByRole('button', { name: 'Against B' })).toHaveAttribute(
        'aria-pressed',
        'true',
      ),
    );
  });

  it('stand in the table with exact figures, from an address that was shared', async () => {
    const fixture = stillfoot();
    const { user } = await openWeigh(fixture, `?against=${optionId(fixture, 0)}`);
    expect(within(card()).getByRole('status')).toHaveTextContent(
      'Each option told against A, Parallel, unadjusted',
    );
    await user.click(within(card()).getByRole('button', { name: 'Table' }));
    const table = screen.getByRole('table', { name: 'Options as a table' });
    expect(within(table).getByRole('columnheader', { name: 'Against A' })).toBeVisible();
    expect(within(table).getByRole('row', { name: /Crossover/ })).toHaveTextContent(/157,46[56]\s€ less/);
  });

  it('are not told against an option that has no size or is not there', async () => {
    const fixture = stillfoot();
    fixture.designSet.options.push(option('Clusters', { family: 'cluster', clusterSize: 20 }));
    await openWeigh(fixture, `?against=${optionId(fixture, 3)}`);
    expect(within(card()).queryByRole('button', { name: 'Back to the limits' })).not.toBeInTheDocument();
    expect(within(panel()).getByRole('button', { name: 'Against B' })).toHaveAttribute(
      'aria-pressed',
      'false',
    );
  });

  it('are told in the sheet of a small screen', async () => {
    surroundings.matching = [smallScreen];
    const fixture = stillfoot();
    const { user } = await openWeigh(fixture, `?option=${optionId(fixture, 1)}`);
    const sheet = await screen.findByRole('dialog', { name: /baseline-adjusted/ });
    await user.click(within(sheet).getByRole('button', { name: 'Against A' }));
    await waitFor(() => expect(sheet).toHaveTextContent(/64 fewer participants, 44\sk€ less/));
  });
});
