import { describe, expect, it } from 'vitest';
import { greenkettle } from './fixtures/greenkettle';
import { nimblegrip } from './fixtures/nimblegrip';
import { stillfoot } from './fixtures/stillfoot';
import { planningValue } from './fixtures/study-fixture';
import { complaint, form, openForm } from './option-page';
import { optionRow as row } from './weigh-page';

const doses = (structure = {}) => ({
  family: 'multi-arm' as const,
  treatments: [0, 1, 2, 3],
  structure: {
    allocation: [1, 1, 1, 1],
    comparisons: { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' },
    ...structure,
  },
});

describe('Several arms', () => {
  it('take an adjustment, a power goal and a reason, each in one plain sentence', async () => {
    const { user, saved } = await openForm(nimblegrip(), doses());
    await user.click(form().getByRole('radio', { name: /^Dunnett\. One critical value/ }));
    await user.click(form().getByRole('radio', { name: /^Power for all\. .* together\.$/ }));
    await user.type(form().getByLabelText('Reason for this stance'), 'Doses of one treatment.');
    expect(await saved()).toMatchObject({
      structure: { comparisons: { against: 'control', adjust: 'dunnett', powerGoal: 'conjunctive' } },
      multiplicityReason: 'Doses of one treatment.',
    });
    expect(row(/The option/)).toHaveTextContent('Dunnett, power for all');
  });

  it('take a target for each arm, and refuse one left empty at its field', async () => {
    const { user, fill, saved, sent } = await openForm(nimblegrip(), doses());
    await user.click(form().getByRole('checkbox', { name: 'Each arm has a target of its own' }));
    expect(form().getByLabelText('Target difference, 2 sessions')).toHaveValue('6');
    await fill('Target difference, 2 sessions', '');
    await user.click(form().getByRole('button', { name: 'Save' }));
    expect(await complaint()).toHaveTextContent('An effect must be a number.');
    expect(sent).toEqual([]);
    await fill('Target difference, 2 sessions', '4.5');
    expect(await saved()).toMatchObject({ structure: { comparisons: { effects: [4.5, 6, 6] } } });
  });

  it('in pairs keep to the stances that pairs have', async () => {
    const comparisons = {
      against: 'control',
      adjust: 'dunnett',
      powerGoal: 'disjunctive',
      effects: [6, 6, 6],
    };
    const { user, saved } = await openForm(nimblegrip(), doses({ comparisons }));
    await user.click(form().getByRole('radio', { name: /^Every pair\./ }));
    expect(form().queryByRole('radio', { name: /^Dunnett/ })).not.toBeInTheDocument();
    expect((await saved())?.structure.comparisons).toEqual({
      against: 'all-pairs',
      adjust: 'bonferroni',
      powerGoal: 'per-comparison',
    });
  });

  it('of a yes-or-no outcome are adjusted by Bonferroni or not at all', async () => {
    const fixture = nimblegrip();
    fixture.study.plan.outcome = { kind: 'binary', difference: 0.2 };
    fixture.ledger = [planningValue('controlProportion', 0.4)];
    await openForm(fixture, doses());
    expect(form().getByRole('radio', { name: /^Bonferroni/ })).toBeChecked();
    expect(form().queryByRole('radio', { name: /^Holm/ })).not.toBeInTheDocument();
    expect(form().queryByRole('radio', { name: /^Power for all/ })).not.toBeInTheDocument();
  });
});

describe('A crossover', () => {
  const abba = { family: 'crossover' as const, structure: { sequences: ['AB', 'BA'] } };

  it('takes a usual set of sequences, or those that are named', async () => {
    const { user, fill, saved } = await openForm(stillfoot(), abba);
    await user.click(form().getByRole('button', { name: 'Three periods, the last repeated: ABB, BAA' }));
    expect(form().getByLabelText('Sequences')).toHaveValue('ABB, BAA');
    expect(row(/The option/)).toHaveTextContent('three periods');
    await fill('Sequences', 'abba, baab');
    await user.click(form().getByRole('checkbox', { name: 'Allow for carryover' }));
    expect((await saved())?.structure).toEqual({ sequences: ['ABBA', 'BAAB'], carryover: true });
  });

  it('refuses sequences that name no period, or a treatment it does not compare', async () => {
    const { user, fill, sent } = await openForm(stillfoot(), abba);
    await fill('Sequences', 'AB, B');
    expect(await complaint()).toHaveTextContent(/^Write a sequence as capital letters/);
    await fill('Sequences', 'AB, CA');
    expect(await complaint()).toHaveTextContent('The treatments compared are A and B; C is none of them.');
    await user.click(form().getByRole('button', { name: 'Save' }));
    expect(sent).toEqual([]);
    expect(form().getByLabelText('Sequences')).toHaveValue('AB, CA');
  });

  it('of three treatments begins with a Williams square and adjusts its comparisons', async () => {
    const { user, saved } = await openForm(nimblegrip(), abba);
    await user.click(form().getByRole('checkbox', { name: '4 sessions' }));
    expect(form().getByText('A is Advice sheet, B is 2 sessions, C is 4 sessions.')).toBeVisible();
    await user.click(form().getByRole('radio', { name: /^No adjustment\./ }));
    expect(await saved()).toMatchObject({
      treatments: [0, 1, 2],
      structure: {
        sequences: ['ABC', 'BCA', 'CAB', 'CBA', 'ACB', 'BAC'],
        comparisons: { against: 'control', adjust: 'none', powerGoal: 'per-comparison' },
      },
    });
  });
});

describe('Two arms of a study with more treatments', () => {
  it('are control and the one that is chosen', async () => {
    const { user, saved } = await openForm(nimblegrip(), {
      family: 'parallel',
      treatments: [0, 1],
      structure: { allocation: [2, 1] },
    });
    await user.click(form().getByRole('radio', { name: '8 sessions' }));
    expect(await saved()).toMatchObject({ treatments: [0, 3], structure: { allocation: [2, 1] } });
  });
});

describe('Clusters', () => {
  it('in more than two arms are compared with control, by a stance and a reason', async () => {
    const fixture = greenkettle();
    fixture.study.treatments.push({ name: 'both' });
    const { user, saved } = await openForm(fixture, { family: 'cluster', clusterSize: 40 });
    expect(form().queryByLabelText('Reason for this stance')).not.toBeInTheDocument();
    await user.click(form().getByRole('checkbox', { name: 'Both' }));
    await user.click(form().getByRole('radio', { name: /^Holm\./ }));
    expect(form().queryByRole('radio', { name: /^Every pair/ })).not.toBeInTheDocument();
    expect(await saved()).toMatchObject({
      treatments: [0, 1, 2],
      structure: { allocation: [1, 1, 1], comparisons: { adjust: 'holm' } },
    });
  });

  it('of a rate take its variation between clusters from the ledger', async () => {
    const fixture = greenkettle();
    fixture.study.plan.outcome = { kind: 'count', rateRatio: 0.7, exposure: 1 };
    fixture.ledger.push(planningValue('controlRate', 0.5));
    await openForm(fixture, { family: 'cluster', clusterSize: 40 });
    expect(row(/The option/)).toHaveTextContent('State the between-cluster CV of the rate');
    expect(form().getByRole('button', { name: 'Override Between-cluster CV of the rate' })).toBeVisible();
    expect(form().queryByRole('button', { name: 'Override ICC' })).not.toBeInTheDocument();
  });

  it('of three levels say how many subclusters of what size they hold', async () => {
    const fixture = greenkettle();
    fixture.ledger.push(planningValue('iccSubcluster', 0.06));
    const { fill, saved } = await openForm(fixture, {
      family: 'three-level-cluster',
      structure: { subclustersPerCluster: 4, subclusterSize: 10 },
    });
    expect(row(/The option/)).toHaveTextContent(/\d+ catchments × 4 subclusters × 10/);
    expect(form().queryByLabelText(/^Girls in each catchment/)).not.toBeInTheDocument();
    await fill('Subclusters in each catchment', '6');
    await fill('Girls in each subcluster', '0');
    expect(await complaint()).toHaveTextContent('The size of a subcluster must be 1 or more.');
    await fill('Girls in each subcluster', '12');
    expect((await saved())?.structure).toEqual({
      subclustersPerCluster: 6,
      subclusterSize: 12,
      allocation: [1, 1],
    });
  });
});

describe('Treatment in groups', () => {
  it('asks for the size of a group, and keeps text that is no number', async () => {
    const fixture = stillfoot();
    fixture.ledger.push(planningValue('icc', 0.05));
    const { user, fill, saved, sent } = await openForm(fixture, {
      family: 'partially-nested',
      structure: { groupSize: 8 },
    });
    expect(row(/The option/)).toHaveTextContent(/\d+ \+ \d+ groups × 8 participants/);
    await fill('Participants in each treatment group', 'ten');
    await user.click(form().getByRole('button', { name: 'Save' }));
    expect(await complaint()).toHaveTextContent(/^“ten” is not a number/);
    expect(row(/The option/)).toHaveTextContent('Cannot be computed.');
    expect(sent).toEqual([]);
    await fill('Participants in each treatment group', '10');
    expect((await saved())?.structure).toEqual({ groupSize: 10, allocation: [1, 1] });
  });
});

describe('What was switched on', () => {
  it('is switched off again, and stored so', async () => {
    const stored = doses({
      comparisons: {
        against: 'control',
        adjust: 'holm',
        powerGoal: 'per-comparison',
        effects: [4, 6, 8],
      },
    });
    const { user, saved } = await openForm(nimblegrip(), {
      ...stored,
      repeated: { baselines: 1, followUps: 1 },
    });
    await user.click(form().getByRole('checkbox', { name: 'Each arm has a target of its own' }));
    await user.click(form().getByRole('checkbox', { name: /^Measured more than once/ }));
    expect(form().queryByLabelText('Target difference, 2 sessions')).not.toBeInTheDocument();
    expect(form().queryByLabelText('Baselines')).not.toBeInTheDocument();
    expect(await saved()).toEqual({
      family: 'multi-arm',
      treatments: [0, 1, 2, 3],
      structure: {
        allocation: [1, 1, 1, 1],
        comparisons: { against: 'control', adjust: 'holm', powerGoal: 'per-comparison' },
      },
      overrides: {},
    });
  });

  it('leaves no edit where it was switched off before', async () => {
    const { user } = await openForm(stillfoot(), {
      family: 'crossover',
      structure: { sequences: ['ABB', 'BAA'] },
    });
    const carryover = form().getByRole('checkbox', { name: 'Allow for carryover' });
    await user.click(carryover);
    expect(row(/The option/)).toHaveTextContent('Edits not saved');
    await user.click(carryover);
    expect(carryover).not.toBeChecked();
    expect(row(/The option/)).not.toHaveTextContent('Edits not saved');
  });
});

describe('A factorial', () => {
  it('says which treatment is which, and what its size is for', async () => {
    const { user, saved } = await openForm(nimblegrip(), {
      family: 'factorial',
      treatments: [0, 1, 2, 3],
      structure: { estimand: 'main-effect' },
    });
    await user.selectOptions(form().getByLabelText('Treatment A'), '4 sessions');
    expect(form().getByLabelText('Treatment B')).toHaveDisplayValue('2 sessions');
    await user.click(form().getByRole('radio', { name: /^The interaction\./ }));
    expect(await saved()).toMatchObject({
      treatments: [0, 2, 1, 3],
      structure: { estimand: 'interaction' },
    });
  });
});
