import { type FamilyId, familyIds, type OptionPlan } from '@steelyard/calc';
import { describe, expect, it } from 'vitest';
import { scheduleInWords } from '../src/features/designs/components/schedule';
import { groupSizes } from '../src/features/designs/families/arms';
import { familyUiOf } from '../src/features/designs/families/registry';

const words = {
  participants: { one: 'girl', many: 'girls' },
  clusters: { one: 'catchment', many: 'catchments' },
  arms: ['Control', 'Active'],
};

const plan = (family: FamilyId, more: Partial<OptionPlan> = {}): OptionPlan => ({
  family,
  treatments: [0, 1],
  structure: family === 'crossover' ? { sequences: ['AB', 'BA'] } : {},
  overrides: {},
  ...more,
});

describe('Every design family', () => {
  it.each(familyIds)('%s has a summary, a name for its size and a schedule of even rows', (family) => {
    const face = familyUiOf(family);
    expect(face.summary(plan(family), null, words)).not.toBe('');
    expect(face.sizeNoun(plan(family), words)).toMatch(/^[A-Z]/);
    const { periods, sequences } = face.schematic(plan(family), words);
    expect(sequences.length).toBeGreaterThan(0);
    for (const { cells } of sequences) expect(cells).toHaveLength(periods.length);
  });

  it('names the arm its size counts where the arms differ', () => {
    const unequal = plan('parallel', { structure: { allocation: [2, 1] } });
    expect(familyUiOf('parallel').sizeNoun(unequal, words)).toBe('Girls in the control arm');
    expect(familyUiOf('parallel').sizeNoun(plan('parallel'), words)).toBe('Girls in each arm');
    expect(familyUiOf('cluster').sizeNoun(plan('cluster'), words)).toBe('Catchments in each arm');
    expect(familyUiOf('crossover').sizeNoun(plan('crossover'), words)).toBe('Girls in each sequence');
  });

  it('says in words what its schedule shows', () => {
    const baseline = plan('parallel', { repeated: { baselines: 1, followUps: 1 } });
    expect(scheduleInWords(familyUiOf('parallel').schematic(baseline, words), words.arms)).toBe(
      'Control: measured, untreated, then Control; Active: measured, untreated, then Active',
    );
    expect(scheduleInWords(familyUiOf('crossover').schematic(plan('crossover'), words), words.arms)).toBe(
      'Sequence AB: Control, then Active; Sequence BA: Active, then Control',
    );
  });
});

describe('Group sizes', () => {
  it('are counted together where neighbours are alike', () => {
    expect(groupSizes([94, 94])).toBe('2 × 94');
    expect(groupSizes([94, 188])).toBe('94 + 188');
    expect(groupSizes([220, 128, 128, 128])).toBe('220 + 3 × 128');
  });
});
