import type { Feasible, OptionPlan } from '@steelyard/calc';
import { describe, expect, it } from 'vitest';
import { scheduleInWords } from '../src/features/designs/components/schedule';
import { groupSizes } from '../src/features/designs/families/arms';
import { lettersOf, presetsFor } from '../src/features/designs/families/crossover-sequences';
import type { FamilyUi } from '../src/features/designs/families/family-ui';
import { familyUis, refusalOf } from '../src/features/designs/families/registry';
import { greenkettle } from './fixtures/greenkettle';
import { nimblegrip } from './fixtures/nimblegrip';

const words = {
  participants: { one: 'girl', many: 'girls' },
  clusters: { one: 'catchment', many: 'catchments' },
  arms: ['Usual', 'Garden', 'Meals', 'Both'],
};

const faces: Record<string, FamilyUi> = familyUis;
const { study } = nimblegrip();
const clustered = { ...study, clusters: words.clusters };

/** A family's plan to start from, with another structure or other parts where a test says so. */
function plan(family: string, structure: OptionPlan['structure'] = {}, more: Partial<OptionPlan> = {}) {
  const face = faces[family] as FamilyUi;
  const start = { family: 'parallel' as const, ...face.start(clustered) };
  return face.whole({ ...start, ...more, structure: { ...start.structure, ...structure } });
}

const wordsOf = ({ treatments }: OptionPlan) => ({
  ...words,
  arms: treatments.map((treatment) => words.arms[treatment] as string),
});

function told(family: string, structure?: OptionPlan['structure'], more?: Partial<OptionPlan>) {
  const made = plan(family, structure, more);
  const face = faces[family] as FamilyUi;
  return {
    summary: (size: Partial<Feasible> | null = null) =>
      face.summary(made, size as Feasible | null, wordsOf(made)),
    sizeNoun: face.sizeNoun(made, wordsOf(made)),
    schematic: face.schematic(made, wordsOf(made)),
    schedule: scheduleInWords(face.schematic(made, wordsOf(made)), wordsOf(made).arms),
    cells: face.schematic(made, wordsOf(made)).sequences.map(({ cells }) => cells),
  };
}

const group = (participants: number, units = participants) => ({
  label: '',
  units,
  participants,
  recruited: participants,
});

describe('Every design family', () => {
  it.each(Object.keys(faces))(
    '%s has a summary, a name for its size, a schedule of even rows and a form',
    (family) => {
      const { summary, sizeNoun, schematic } = told(family);
      expect(summary()).not.toBe('');
      expect(sizeNoun).toMatch(/^[A-Z]/);
      expect(schematic.sequences.length).toBeGreaterThan(0);
      for (const { cells } of schematic.sequences) expect(cells).toHaveLength(schematic.periods.length);
      const made = plan(family);
      expect(faces[family]?.structure(made, clustered, wordsOf(made)).length).toBeGreaterThan(0);
    },
  );

  it.each(Object.keys(faces))('%s is drawn whatever is half typed in its structure', (family) => {
    const face = faces[family] as FamilyUi;
    const whole = plan(family);
    const halfTyped = ['', 'four', undefined, null, Number.NaN, -1, 0.5, 1e12, [], [undefined], [['x']], {}];
    for (const key of Object.keys(whole.structure)) {
      for (const value of halfTyped) {
        const typed = { ...whole, structure: { ...whole.structure, [key]: value } };
        const { sequences, periods } = face.schematic(typed, wordsOf(typed));
        expect(sequences.length).toBeLessThanOrEqual(60);
        expect(periods.length).toBeLessThanOrEqual(60);
        expect(face.summary(typed, null, wordsOf(typed))).not.toMatch(/NaN|undefined/);
        expect(face.sizeNoun(typed, wordsOf(typed))).not.toBe('');
        face.structure(typed, clustered, wordsOf(typed));
        face.fault?.(typed);
      }
    }
  });

  it('names the group its size counts where the groups differ', () => {
    expect(told('parallel', { allocation: [2, 1] }).sizeNoun).toBe('Girls in the control arm');
    expect(told('parallel').sizeNoun).toBe('Girls in each arm');
    expect(told('cluster').sizeNoun).toBe('Catchments in each arm');
    expect(told('crossover').sizeNoun).toBe('Girls in each sequence');
    expect(told('cluster-baseline').sizeNoun).toBe('Catchments in each arm');
    expect(told('cluster-baseline', { allocation: [2, 1] }).sizeNoun).toBe('Catchments in the control arm');
    expect(told('stepped-wedge').sizeNoun).toBe('Catchments in each sequence');
    expect(told('stepped-wedge', { allocation: [1, 1, 1, 2] }).sizeNoun).toBe(
      'Catchments in the first sequence',
    );
    expect(told('factorial').sizeNoun).toBe('Girls in each of the four arms');
    expect(told('partially-nested').sizeNoun).toBe('Treatment groups in the active arm');
  });

  it('is refused where its outcome, test or nouns do not allow it, and says why', () => {
    const { study: girls } = greenkettle();
    expect(refusalOf('cluster', girls)).toBeUndefined();
    expect(refusalOf('cluster', { ...girls, clusters: null })).toMatch(/what the clusters are called/);
    expect(refusalOf('multi-arm', girls)).toMatch(/third treatment/);
    const counts = {
      ...girls,
      plan: { ...girls.plan, outcome: { kind: 'count' as const, rateRatio: 0.7, exposure: 1 } },
    };
    expect(refusalOf('crossover', counts)).toMatch(/^It is computed for a mean.*, not for a rate\.$/);
    const three = {
      ...study,
      plan: { ...study.plan, test: { ...study.plan.test, hypothesis: 'equivalence' as const } },
    };
    expect(refusalOf('multi-arm', three)).toMatch(/^For a mean it is computed for superiority/);
  });
});

describe('A summary', () => {
  it('multiplies clusters by their size and by how often they are measured', () => {
    const size = { clusters: 20, clusterSize: 25, participants: 2500 };
    expect(told('stepped-wedge').summary(size)).toBe('20 catchments × 25 × 5');
    expect(told('stepped-wedge', { transitionPeriods: 1 }).summary(size)).toBe('20 catchments × 25 × 5');
    expect(told('stepped-wedge').summary({ ...size, participants: 500 })).toBe(
      '20 catchments × 25, each measured 5 times',
    );
    const baseline = { clusters: 30, clusterSize: 40, participants: 2400 };
    expect(told('cluster-baseline').summary(baseline)).toBe('30 catchments × 40 × 2');
    expect(
      told('cluster-schedule', {
        schedule: [
          [0, 1, null],
          [0, 0, 1],
        ],
      }).summary(size),
    ).toBe('20 catchments × 25 in each period measured');
    expect(told('stepped-wedge', {}, { clusterSize: 25 }).summary()).toBe('catchments of 25, five periods');
  });

  it('names groups, subclusters and what a factorial is for', () => {
    expect(told('partially-nested').summary({ groups: [group(96), group(96, 12)] })).toBe(
      '96 + 12 groups × 8 girls',
    );
    expect(told('three-level-cluster').summary({ clusters: 30 })).toBe('30 catchments × 4 subclusters × 10');
    expect(told('factorial').summary({ units: 94 })).toBe('4 × 94 girls, main effects');
    expect(told('factorial', { estimand: 'interaction' }).summary()).toBe('2 × 2 arms, interaction');
  });

  it('names the stance on several comparisons, and is silent where there is one', () => {
    const comparisons = { against: 'control', adjust: 'dunnett', powerGoal: 'conjunctive' };
    const four = { treatments: [0, 1, 2, 3] };
    expect(told('multi-arm', { comparisons }, four).summary()).toBe('four arms, Dunnett, power for all');
    const pairs = { against: 'all-pairs', adjust: 'none', powerGoal: 'per-comparison' };
    expect(told('multi-arm', { comparisons: pairs }, four).summary()).toBe(
      'four arms, every pair, no adjustment',
    );
    const three = { treatments: [0, 1, 2] };
    expect(told('cluster', { allocation: [1, 1, 1], comparisons }, three).summary()).toBe(
      'catchments of 20, Dunnett, power for all',
    );
    expect(told('cluster', { comparisons }).summary()).toBe('catchments of 20');
    expect(told('crossover', { sequences: ['ABC', 'BCA', 'CAB'] }, three).summary()).toBe(
      'three sequences, three periods, Bonferroni',
    );
  });
});

describe('A schedule', () => {
  it('is drawn from the design itself', () => {
    expect(told('cluster-baseline').cells).toEqual([
      [0, 0],
      [0, 1],
    ]);
    expect(told('cluster-crossover').cells).toEqual([
      [0, 1],
      [1, 0],
    ]);
    expect(told('stepped-wedge', { steps: 3, baselinePeriods: 2, transitionPeriods: 1 }).cells).toEqual([
      [0, 0, 'crossing', 1, 1, 1],
      [0, 0, 0, 'crossing', 1, 1],
      [0, 0, 0, 0, 'crossing', 1],
    ]);
    expect(
      told('cluster-schedule', {
        schedule: [
          [0, 1, null],
          [null, 0, 1],
        ],
      }).cells,
    ).toEqual([
      [0, 1, 'unmeasured'],
      ['unmeasured', 0, 1],
    ]);
  });

  it('shows shares, groups and subclusters where it has them', () => {
    const { sequences } = told('stepped-wedge', { steps: 2, allocation: [1, 2] }).schematic;
    expect(sequences).toMatchObject([
      { name: 'Sequence 1', share: 1 },
      { name: 'Sequence 2', share: 2 },
    ]);
    expect(told('partially-nested').schematic.sequences).toEqual([
      { name: 'Usual', cells: [0] },
      { name: 'Garden', note: 'in groups of 8 girls', cells: [1], nested: 'groups' },
    ]);
    expect(told('three-level-cluster').schematic.sequences[0]).toMatchObject({ nested: 'subclusters' });
    expect(told('factorial').schematic).toMatchObject({ crossed: true });
  });

  it('says in words what it shows', () => {
    expect(told('parallel', {}, { repeated: { baselines: 1, followUps: 1 } }).schedule).toBe(
      'Usual: measured, untreated, then Usual; Garden: measured, untreated, then Garden',
    );
    expect(told('crossover').schedule).toBe(
      'Sequence AB: Usual, then Garden; Sequence BA: Garden, then Usual',
    );
    expect(told('stepped-wedge', { steps: 2, transitionPeriods: 1, allocation: [1, 2] }).schedule).toBe(
      'Sequence 1, share 1: Usual, then crossing over, not measured, then Garden for 2 periods; ' +
        'Sequence 2, share 2: Usual for 2 periods, then crossing over, not measured, then Garden',
    );
    expect(told('partially-nested').schedule).toBe('Usual; Garden, in groups of 8 girls');
    expect(told('factorial').schedule).toBe('Usual; Garden; Meals; Both');
  });
});

describe('The usual sequences of a crossover', () => {
  it.each([3, 4])('for %i treatments put each before each other equally often', (treatments) => {
    const { sequences, name } = presetsFor(treatments)[0] as ReturnType<typeof presetsFor>[number];
    expect(name).toBe('Williams square');
    const pairs = sequences.flatMap((sequence) =>
      [...sequence].slice(1).map((letter, period) => `${sequence[period]}${letter}`),
    );
    const times = new Set(pairs.map((pair) => pairs.filter((other) => other === pair).length));
    expect(new Set(pairs).size).toBe(treatments * (treatments - 1));
    expect(times.size).toBe(1);
  });

  it.each([2, 3, 4, 5, 7])('for %i treatments give every treatment equally often', (treatments) => {
    for (const { sequences } of presetsFor(treatments)) {
      const given = [...sequences.join('')];
      const times = lettersOf(treatments).map((letter) => given.filter((each) => each === letter).length);
      expect(new Set(times).size).toBe(1);
      expect(new Set(sequences.map((sequence) => sequence.length)).size).toBe(1);
    }
  });

  it('name every treatment compared, and no other', () => {
    const fault = (sequences: string[]) =>
      faces.crossover?.fault?.(plan('crossover', { sequences }))?.message;
    expect(fault(['AB', 'BA'])).toBeUndefined();
    expect(fault(['AC', 'CA'])).toBe('The treatments compared are A and B; C is none of them.');
    expect(fault(['AA'])).toBe('No sequence gives B.');
  });
});

describe('Other treatments', () => {
  it('keep their shares and targets', () => {
    const comparisons = { against: 'control', adjust: 'holm', powerGoal: 'disjunctive', effects: [4, 6, 8] };
    const four = plan('multi-arm', { allocation: [2, 1, 3, 4], comparisons }, { treatments: [0, 1, 2, 3] });
    expect(faces['multi-arm']?.treated(four, [0, 1, 3])).toMatchObject({
      treatments: [0, 1, 3],
      structure: { allocation: [2, 1, 4], comparisons: { adjust: 'holm', effects: [4, 8] } },
    });
  });

  it('bring comparisons to clusters and crossovers, and take them away', () => {
    const three = faces.cluster?.treated(plan('cluster'), [0, 1, 2]) as OptionPlan;
    expect(three.structure).toEqual({
      allocation: [1, 1, 1],
      comparisons: { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' },
    });
    expect(faces.cluster?.treated(three, [0, 2]).structure).toEqual({ allocation: [1, 1] });
    const crossed = faces.crossover?.treated(plan('crossover'), [0, 1, 2]);
    expect(crossed?.structure).toMatchObject({ sequences: ['ABC', 'BCA', 'CAB', 'CBA', 'ACB', 'BAC'] });
  });
});

describe('Group sizes', () => {
  it('are counted together where neighbours are alike', () => {
    expect(groupSizes([94, 94])).toBe('2 × 94');
    expect(groupSizes([94, 188])).toBe('94 + 188');
    expect(groupSizes([220, 128, 128, 128])).toBe('220 + 3 × 128');
  });
});
