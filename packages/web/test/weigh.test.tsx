import { screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { greenkettle } from './fixtures/greenkettle';
import { nimblegrip } from './fixtures/nimblegrip';
import { stillfoot } from './fixtures/stillfoot';
import { option, type StudyFixture } from './fixtures/study-fixture';
import { openApp } from './open-app';
import { problem, serve, server } from './server';
import { smallScreen, surroundings } from './surroundings';
import { openWeigh, optionRow as row } from './weigh-page';

const weighPath = ({ study }: StudyFixture) => `/studies/${study.id}/weigh`;

const choice = (name: RegExp) => within(within(row(name)).getByRole('rowheader')).getByRole('button');
const beams = () => screen.getByRole('region', { name: 'Options side by side' });
const panel = () => screen.getByRole('region', { name: /^Option [A-Z]+$/ });
const fact = (name: string) => within(panel()).getByText(name, { selector: 'dt' }).nextElementSibling;

describe('Weigh', () => {
  it('asks the question and says what it is planned on', async () => {
    await openWeigh(stillfoot());
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(
      /Does vantholine foot gel lower pain/,
    );
    expect(
      screen.getByText(
        'Mean pain, 0–10, over the last 7 days · SD 2.1 points · two-sided 5 % · three options',
      ),
    ).toBeVisible();
    expect(document.title).toBe('Weigh · Stillfoot · Steelyard');
  });

  it.each([
    [/Parallel, unadjusted/, '2 × 94 participants', '490 k€', '41', '188', '214'],
    [/Parallel, baseline-adjusted/, '2 × 66 participants, one baseline', '446 k€', '31', '132', '150'],
    [/Crossover/, '2 × 20 participants, two periods', '333 k€', '18', '40', '50'],
  ])('shows the figures of %s', async (name, summary, cost, months, analysed, recruited) => {
    const { user } = await openWeigh(stillfoot());
    expect(row(name)).toHaveTextContent(summary);
    expect(row(name)).toHaveTextContent(cost);
    expect(within(row(name)).getByText(months)).toBeVisible();
    await user.click(choice(name));
    await waitFor(() => expect(panel()).toHaveTextContent(name));
    expect(fact('Participants analysed')).toHaveTextContent(analysed);
    expect(fact('Participants recruited')).toHaveTextContent(recruited);
  });

  it('speaks of catchments and girls where the study does', async () => {
    await openWeigh(greenkettle());
    expect(row(/Cluster, end only/)).toHaveTextContent('44 catchments × 40');
    expect(row(/Cluster, end only/)).toHaveTextContent('81.3 %');
    expect(row(/Cluster, end only/)).toHaveTextContent('715 k€');
    expect(fact('Catchments in each arm')).toHaveTextContent('22');
    expect(fact('Girls in each catchment')).toHaveTextContent('40');
    expect(fact('Girls analysed')).toHaveTextContent('1,760');
    expect(within(panel()).getByText('715,320 €')).toBeVisible();
  });

  it('names every arm of a design with several', async () => {
    const { user } = await openWeigh(nimblegrip());
    expect(row(/Four equal arms 4/)).toHaveTextContent('632 k€');
    expect(fact('Participants analysed')).toHaveTextContent('512');
    expect(fact('Participants recruited')).toHaveTextContent('584');
    await user.click(choice(/adjusted/));
    await waitFor(() => expect(fact('Participants analysed')).toHaveTextContent('656'));
    expect(fact('Participants recruited')).toHaveTextContent('748');
    expect(row(/adjusted/)).toHaveTextContent('705 k€');
    const beam = within(row(/adjusted/)).getByRole('button', { name: /Cost by arm/ });
    expect(beam).toHaveAccessibleName(/Advice sheet .*, 2 sessions .*, 4 sessions .*, 8 sessions/);
  });

  it('puts the verdict first', async () => {
    await openWeigh(stillfoot());
    expect(screen.getByRole('region', { name: 'Verdict' })).toHaveTextContent(
      /C costs least, ends first and recruits the fewest participants/,
    );
  });

  it('says what the hold means when it has the focus', async () => {
    const { user } = await openWeigh(stillfoot());
    screen.getByRole('button', { name: 'Hold' }).focus();
    await user.tab();
    const chip = screen.getByRole('button', { name: /^Power 90\s%$/ });
    expect(chip).toHaveFocus();
    await waitFor(() =>
      expect(chip).toHaveAccessibleDescription('Power: each option takes the fewest units that reach it.'),
    );
  });

  it('moves between options with the arrow keys and chooses with Enter', async () => {
    const fixture = stillfoot();
    const { user, address } = await openWeigh(fixture);
    const [, second, third] = fixture.designSet.options;
    choice(/Parallel, unadjusted/).focus();
    await user.keyboard('{ArrowDown}{ArrowDown}{ArrowDown}');
    expect(choice(/Crossover/)).toHaveFocus();
    await user.keyboard('{Enter}');
    await waitFor(() => expect(address()).toBe(`${weighPath(fixture)}?option=${third?.id}`));
    await waitFor(() => expect(choice(/Crossover/)).toHaveAttribute('aria-pressed', 'true'));
    expect(panel()).toHaveAccessibleName('Option C');
    await user.keyboard('{Home}{ArrowDown} ');
    await waitFor(() => expect(address()).toBe(`${weighPath(fixture)}?option=${second?.id}`));
  });

  it('opens on the option its address names', async () => {
    const fixture = stillfoot();
    await openWeigh(fixture, `?option=${fixture.designSet.options[1]?.id}`);
    expect(panel()).toHaveAccessibleName('Option B');
  });

  it('names groups, costs and lines after the treatments', async () => {
    await openWeigh(stillfoot());
    const groups = within(panel()).getByRole('table', { name: 'Groups' });
    expect(within(groups).getByRole('row', { name: 'Vantholine gel 94 107' })).toBeVisible();
    const lines = within(panel()).getByRole('table', { name: 'Cost by line' });
    expect(
      within(lines).getByRole('row', { name: /^Exposures, Vehicle gel 107 × 54 5,778\s€$/ }),
    ).toBeVisible();
    expect(
      within(lines).getByRole('row', { name: /^Recruited participants 214 × 420 89,880\s€$/ }),
    ).toBeVisible();
    const months = within(panel()).getByRole('table', { name: 'Months by phase' });
    expect(within(months).getByRole('row', { name: 'Recruitment 4 36.4 32.4' })).toBeVisible();
  });

  it('shows what the option takes from the ledger, its own family’s line first', async () => {
    const fixture = stillfoot();
    fixture.study.role = 'reader';
    await openWeigh(fixture, `?option=${fixture.designSet.options[2]?.id}`);
    expect(fact('Attrition, crossover')).toHaveTextContent('20 %');
    expect(fact('Within-person correlation')).toHaveTextContent('0.6');
    expect(within(panel()).getByText('0.4 to 0.75 · Assumed by the team')).toBeVisible();
    expect(within(panel()).queryByText('Correlation with baseline')).not.toBeInTheDocument();
  });

  it('shows an override beside the ledger’s value, with its reason', async () => {
    const fixture = stillfoot();
    fixture.study.role = 'reader';
    const [first] = fixture.designSet.options;
    if (first) first.plan.overrides = { sd: { value: 2.6, reason: 'These sites vary more.' } };
    await openWeigh(fixture);
    expect(fact('Standard deviation')).toHaveTextContent('2.6 points');
    expect(panel()).toHaveTextContent('Override, ledger 2.1 points: These sites vary more.');
  });

  it('shows cautions with their sources', async () => {
    const fixture = stillfoot();
    await openWeigh(fixture, `?option=${fixture.designSet.options[2]?.id}`);
    const cautions = within(panel()).getByRole('region', { name: 'Cautions' });
    expect(cautions).toHaveTextContent(/No carryover from one period into the next .* Senn 2002\./);
  });

  it('keeps an option that cannot be computed, with the reason', async () => {
    const fixture = stillfoot();
    fixture.designSet.options.push(option('Clusters', { family: 'cluster', clusterSize: 20 }));
    const { user } = await openWeigh(fixture);
    expect(row(/Clusters/)).toHaveTextContent(/Cannot be computed\. State the ICC/);
    expect(row(/Crossover/)).toHaveTextContent('333 k€');
    await user.click(choice(/Clusters/));
    await waitFor(() => expect(panel()).toHaveTextContent(/Cannot be computed\. State the ICC/));
  });

  it('gives the beams as a table of exact figures', async () => {
    const { user } = await openWeigh(stillfoot());
    await user.click(within(beams()).getByRole('button', { name: 'Table' }));
    const table = screen.getByRole('table', { name: 'Options as a table' });
    const crossover = within(table).getByRole('row', { name: /Crossover/ });
    expect(crossover).toHaveTextContent('Sequence AB: Vehicle gel, then Vantholine gel');
    expect(crossover).toHaveTextContent('332,789 €');
    expect(crossover).toHaveTextContent('18.1');
  });

  it('folds the panel away and remembers it', async () => {
    const { user } = await openWeigh(stillfoot());
    await user.click(screen.getByRole('button', { name: 'Fold the option away' }));
    expect(within(panel()).queryByText('Participants analysed')).not.toBeInTheDocument();
    expect(localStorage.getItem('steelyard-preferences')).toContain('"panelFolded":true');
    await user.click(screen.getByRole('button', { name: 'Unfold the option' }));
    expect(fact('Participants analysed')).toBeVisible();
  });

  it('opens the option over the whole of a small screen', async () => {
    surroundings.matching = [smallScreen];
    const fixture = stillfoot();
    const { user, address } = await openWeigh(fixture);
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
    await user.click(choice(/Crossover/));
    const sheet = await screen.findByRole('dialog', { name: /Crossover/ });
    expect(within(sheet).getByText('Participants recruited').nextElementSibling).toHaveTextContent('50');
    await user.click(within(sheet).getByRole('button', { name: 'Close' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    expect(address()).toBe(weighPath(fixture));
  });

  it('says that there is nothing to weigh before there are options', async () => {
    const fixture = stillfoot();
    fixture.designSet.options = [];
    serve(fixture);
    openApp(weighPath(fixture));
    expect(await screen.findByRole('region', { name: 'Verdict' })).toHaveTextContent('No options yet.');
    expect(screen.queryByRole('table')).not.toBeInTheDocument();
  });

  it('shows a skeleton until all parts are there', async () => {
    const fixture = stillfoot();
    serve(fixture);
    let release = () => {};
    const held = new Promise<void>((resolve) => {
      release = resolve;
    });
    server.use(
      http.get('*/api/studies/:id/costs', async () => {
        await held;
        return HttpResponse.json(fixture.costs);
      }),
    );
    openApp(weighPath(fixture));
    expect(await screen.findByLabelText('Loading the study')).toBeVisible();
    release();
    expect(await screen.findByRole('table', { name: 'Options' })).toBeVisible();
  });

  it('says that a part could not be had, and tries again', async () => {
    const fixture = stillfoot();
    serve(fixture);
    server.use(
      http.get('*/api/studies/:id/costs', () => problem(422, 'invalid', { title: 'Costs are in disorder' }), {
        once: true,
      }),
    );
    const { user } = openApp(weighPath(fixture));
    expect(await screen.findByRole('heading', { name: /The study could not be shown/ })).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('table', { name: 'Options' })).toBeVisible();
  });

  it('says the same of a study that is not there and of one that is not open to the person', async () => {
    const fixture = stillfoot();
    serve(fixture);
    server.use(http.get('*/api/studies/:id', () => problem(404, 'not-found')));
    openApp(weighPath(fixture));
    expect(await screen.findByRole('heading', { name: 'There is no study here.' })).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Try again' })).not.toBeInTheDocument();
  });
});
