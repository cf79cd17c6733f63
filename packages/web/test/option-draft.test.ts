import { familyIds, type OptionPlan, weigh } from '@steelyard/calc';
import { describe, expect, it } from 'vitest';
import { familyUiOf } from '../src/features/designs/families/registry';
import { cleaned, differences, draftOf, weighable } from '../src/features/designs/model/option-draft';
import { optionDraftSchema } from '../src/features/designs/model/option-draft-schema';
import { nimblegrip } from './fixtures/nimblegrip';

const { study, costs, ledger } = nimblegrip();
const clustered = { ...study, clusters: { one: 'practice', many: 'practices' } };

const startOf = (family: OptionPlan['family']) =>
  draftOf({ name: 'A', plan: { family, ...familyUiOf(family).start(clustered) } });

const withStructure = (family: OptionPlan['family'], structure: OptionPlan['structure']) => {
  const { name, plan } = startOf(family);
  return { name, plan: { ...plan, structure: { ...plan.structure, ...structure } } };
};

const differing = (a: ReturnType<typeof startOf>, b: ReturnType<typeof startOf>) =>
  differences(a, b).map(({ label, mine, theirs }) => `${label}: ${mine} | ${theirs}`);

describe('A draft of an option', () => {
  it.each(familyIds)('of %s may be stored as it starts', (family) => {
    expect(optionDraftSchema.safeParse(cleaned(startOf(family))).error).toBeUndefined();
  });

  it.each(familyIds)('of %s is weighed whatever is half typed in it', (family) => {
    const start = startOf(family);
    const halfTyped = ['', 'four', undefined, null, -1, 0.5, 1e12, [], [undefined, 'x'], {}];
    const drafts = Object.keys(start.plan.structure).flatMap((key) =>
      halfTyped.map((value) => withStructure(family, { [key]: value })),
    );
    const options = drafts.map((draft, index) => ({ id: String(index), ...weighable(draft) }));
    const weighed = weigh({
      question: study.plan,
      ledger,
      costs,
      hold: { kind: 'power', power: 0.9 },
      options,
    });
    for (const { appraisal, error } of weighed) expect(appraisal ?? error?.message).toBeTruthy();
  });

  it('differs from another in words a person can compare', () => {
    const comparisons = { against: 'control', adjust: 'fixed-sequence', powerGoal: 'disjunctive' };
    const mine = withStructure('multi-arm', { comparisons });
    const theirs = withStructure('multi-arm', {
      comparisons: { ...comparisons, adjust: 'holm', effects: [4, 6, 8] },
    });
    theirs.plan.multiplicityReason = 'Doses of one treatment.';
    expect(differing(mine, theirs)).toEqual([
      'Adjustment: fixed sequence | Holm',
      'Targets by arm: not stated | 4, 6, 8',
      'Reason for the stance on several comparisons: not stated | Doses of one treatment.',
    ]);
  });

  it('tells a schedule sequence by sequence, and what is switched on', () => {
    const mine = withStructure('cluster', {
      schedule: [
        [0, 1, null],
        [0, 0, 1],
      ],
      decay: true,
    });
    expect(differing(mine, startOf('cluster'))).toEqual([
      'Schedule: control, active, not measured; control, control, active | not stated',
      'Correlation fades with time: yes | not stated',
    ]);
  });

  it('leaves out a reason that says nothing', () => {
    const draft = startOf('multi-arm');
    expect(cleaned({ ...draft, plan: { ...draft.plan, multiplicityReason: '  ' } })).toEqual(draft);
  });
});
