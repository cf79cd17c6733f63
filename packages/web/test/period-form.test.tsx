import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { greenkettle } from './fixtures/greenkettle';
import { option, planningValue } from './fixtures/study-fixture';
import { complaint, form, openForm } from './option-page';
import { openWeigh, optionRow as row } from './weigh-page';

/** A programme by catchment, with what designs over periods ask of the ledger. */
function programme(individualAutocorrelation?: number) {
  const fixture = greenkettle();
  fixture.ledger.push(planningValue('clusterAutocorrelation', 0.85));
  if (individualAutocorrelation !== undefined) {
    fixture.ledger.push(planningValue('individualAutocorrelation', individualAutocorrelation));
  }
  return fixture;
}

const wedge = {
  family: 'stepped-wedge' as const,
  structure: { steps: 4, baselinePeriods: 1, transitionPeriods: 0 },
  clusterSize: 25,
};

const drawn = () => form().getByRole('img', { name: /^Schedule\./ });

describe('A cluster design over periods', () => {
  it('counts clusters, their size and their periods', async () => {
    await openForm(programme(), { family: 'cluster-baseline', clusterSize: 40 });
    expect(row(/The option/)).toHaveTextContent('30 catchments × 40 × 2');
    expect(form().getByLabelText('Girls in each catchment, each period')).toHaveValue('40');
    expect(drawn()).toHaveAccessibleName(
      'Schedule. Usual canteen: Usual canteen for 2 periods; Kitchen gardens: Usual canteen, then Kitchen gardens',
    );
  });

  it('takes arms of unequal numbers, and correlation that fades', async () => {
    const { user, fill, saved } = await openForm(programme(), {
      family: 'cluster-crossover',
      clusterSize: 40,
    });
    await user.click(form().getByRole('checkbox', { name: 'Sequences take unequal numbers of catchments' }));
    await fill('Sequence 2', '2');
    await user.click(form().getByRole('checkbox', { name: 'Correlation fades with time' }));
    expect(form().getByLabelText('Catchments in the first sequence')).toBeVisible();
    expect((await saved())?.structure).toEqual({ allocation: [1, 2], decay: true });
  });

  it('goes back to equal arms, and to correlation that stays', async () => {
    const { user, saved } = await openForm(programme(), {
      family: 'cluster-crossover',
      structure: { allocation: [1, 2], decay: true },
      clusterSize: 40,
    });
    await user.click(form().getByRole('checkbox', { name: 'Sequences take unequal numbers of catchments' }));
    await user.click(form().getByRole('checkbox', { name: 'Correlation fades with time' }));
    expect(form().getByLabelText('Catchments in each sequence')).toBeVisible();
    expect((await saved())?.structure).toEqual({ decay: false });
  });

  it('asks for the cluster autocorrelation where the ledger has none', async () => {
    await openForm(greenkettle(), wedge);
    expect(row(/The option/)).toHaveTextContent('Cannot be computed. State the cluster autocorrelation');
    expect(form().getByRole('button', { name: 'Override Cluster autocorrelation' })).toBeVisible();
  });
});

describe('A stepped wedge', () => {
  it('is built of its steps, and drawn as they are typed', async () => {
    const { fill, saved } = await openForm(programme(), wedge);
    expect(row(/The option/)).toHaveTextContent('20 catchments × 25 × 5');
    await fill('Steps', '3');
    await fill('Transition periods', '1');
    expect(drawn()).toHaveAccessibleName(
      /^Schedule\. Sequence 1: Usual canteen, then crossing over, not measured, /,
    );
    expect((await saved())?.structure).toEqual({ steps: 3, baselinePeriods: 1, transitionPeriods: 1 });
  });

  it('has a share for each sequence, however many steps there come to be', async () => {
    const { user, fill, saved } = await openForm(programme(), wedge);
    await user.click(form().getByRole('checkbox', { name: 'Sequences take unequal numbers of catchments' }));
    await fill('Sequence 4', '2');
    await fill('Steps', '5');
    expect(await form().findByLabelText('Sequence 5')).toHaveValue('1');
    expect((await saved())?.structure).toMatchObject({ steps: 5, allocation: [1, 1, 1, 2, 1] });
  });

  it('refuses steps that are none, or too many, at their field', async () => {
    const { user, fill, sent } = await openForm(programme(), wedge);
    await fill('Steps', 'several');
    await user.click(form().getByRole('button', { name: 'Save' }));
    expect(await form().findByText(/^“several” is not a number/)).toBeVisible();
    await fill('Steps', '60');
    expect(await complaint()).toHaveTextContent('A wedge may have 60 periods at most.');
    await user.click(form().getByRole('button', { name: 'Save' }));
    expect(sent).toEqual([]);
  });
});

describe('Who is measured', () => {
  it('is new in each period until the ledger says how alike the same participants are', async () => {
    await openForm(programme(), wedge);
    expect(form().getByText(/^New girls are measured in each period\./)).toBeVisible();
    expect(form().queryByRole('radio', { name: /^Closed cohort/ })).not.toBeInTheDocument();
  });

  it('is a closed cohort by the ledger, unless the option says otherwise, with its reason', async () => {
    const { user, saved } = await openForm(programme(0.5), wedge);
    expect(form().getByRole('radio', { name: /^Closed cohort\./ })).toBeChecked();
    expect(row(/The option/)).toHaveTextContent(/\d+ catchments × 25, each measured 5 times/);
    await user.click(form().getByRole('radio', { name: /^Cross-sections\./ }));
    expect(row(/The option/)).toHaveTextContent('20 catchments × 25 × 5');
    expect((await saved())?.overrides).toEqual({
      individualAutocorrelation: { value: 0, reason: 'New girls are measured in each period.' },
    });
  });

  it('is a closed cohort again where the option gives up what it said', async () => {
    const { user, saved } = await openForm(programme(0.5), {
      ...wedge,
      overrides: { individualAutocorrelation: { value: 0, reason: 'New girls each term.' } },
    });
    expect(form().getByRole('radio', { name: /^Cross-sections\./ })).toBeChecked();
    await user.click(form().getByRole('radio', { name: /^Closed cohort\./ }));
    expect((await saved())?.overrides).toEqual({});
  });
});

describe('A schedule of one’s own', () => {
  const own = {
    family: 'cluster-schedule' as const,
    structure: {
      schedule: [
        [0, 0, 1],
        [0, 1, 1],
      ],
    },
    clusterSize: 25,
  };
  const cell = (name: string) => form().getByRole('button', { name });

  it('is drawn up by keyboard, cell by cell', async () => {
    const { user, saved } = await openForm(programme(), own);
    cell('Sequence 1, period 1: Usual canteen').focus();
    await user.keyboard('{ArrowRight}{ArrowDown}{Enter}');
    expect(cell('Sequence 2, period 2: not measured')).toHaveFocus();
    await user.keyboard(' ');
    expect(cell('Sequence 2, period 2: Usual canteen')).toHaveFocus();
    await user.keyboard('{ArrowUp}{ArrowUp}{ArrowLeft}{Enter}{Enter}');
    expect(cell('Sequence 1, period 1: not measured')).toHaveFocus();
    expect((await saved())?.structure.schedule).toEqual([
      [null, 0, 1],
      [0, 0, 1],
    ]);
  });

  it('gains and loses sequences and periods', async () => {
    const { user, saved } = await openForm(programme(), own);
    await user.click(cell('Add a sequence'));
    await user.click(cell('Add a period'));
    expect(
      within(form().getByRole('table', { name: 'Schedule to draw up' })).getAllByRole('row'),
    ).toHaveLength(5);
    await user.click(cell('Remove sequence 1'));
    await user.click(cell('Remove period 2'));
    expect((await saved())?.structure.schedule).toEqual([
      [0, 1, 1],
      [0, 1, 1],
    ]);
    expect(row(/The option/)).toHaveTextContent('Cannot be computed.');
  });

  it('refuses a sequence that is never measured', async () => {
    const { user, sent } = await openForm(programme(), {
      ...own,
      structure: {
        schedule: [
          [0, 1],
          [1, null],
        ],
      },
    });
    await user.click(cell('Sequence 2, period 1: Kitchen gardens'));
    expect(await complaint()).toHaveTextContent(/^This sequence is never measured/);
    await user.click(form().getByRole('button', { name: 'Save' }));
    expect(sent).toEqual([]);
  });
});

describe('What an option is made of', () => {
  it('can be read by those who do not edit it', async () => {
    const fixture = programme();
    fixture.study.role = 'reader';
    fixture.study.treatments.push({ name: 'both' });
    fixture.designSet.options = [
      option('The option', {
        family: 'cluster',
        treatments: [0, 1, 2],
        structure: {
          allocation: [1, 1, 1],
          comparisons: { against: 'control', adjust: 'dunnett', powerGoal: 'conjunctive' },
        },
        clusterSize: 40,
        multiplicityReason: 'Both are of interest.',
      }),
    ];
    await openWeigh(fixture);
    const structure = within(screen.getByRole('region', { name: 'Structure' }));
    expect(structure.getByText('Dunnett')).toBeVisible();
    expect(structure.getByText(/Both are of interest\.$/)).toBeVisible();
  });
});
