import type { OptionPlan } from '@steelyard/calc';
import { capitalised, counted } from '../../../shared/format/lists';
import { count } from '../../../shared/format/numbers';
import type { Schematic, StudyWords } from './family-ui';
import type { PartOf } from './structure-part';

/** “2 × 94”, “94 + 188”, “220 + 3 × 128”: group sizes, neighbours that are alike counted together. */
export function groupSizes(sizes: readonly number[]): string {
  const runs: { size: number; times: number }[] = [];
  for (const size of sizes) {
    const last = runs.at(-1);
    if (last?.size === size) last.times += 1;
    else runs.push({ size, times: 1 });
  }
  return runs.map(({ size, times }) => (times > 1 ? `${times} × ${count(size)}` : count(size))).join(' + ');
}

/** The plan's shares, of arms or sequences; none where they are equal by default. */
export const sharesOf = ({ structure }: Pick<OptionPlan, 'structure'>): readonly unknown[] =>
  Array.isArray(structure.allocation) ? structure.allocation : [];

export const areEqual = (shares: readonly unknown[]): boolean => shares.every((share) => share === shares[0]);

/** “Participants in each arm”, or in the control arm where the others follow from it. */
export const inEachArm = (noun: string, plan: OptionPlan): string =>
  `${capitalised(noun)} in ${areEqual(sharesOf(plan)) ? 'each' : 'the control'} arm`;

/** One row an arm: what is measured before, where anything is, then the arm's own treatment. */
export function parallelSchematic({ repeated }: OptionPlan, { arms }: StudyWords): Schematic {
  const before = (repeated?.baselines ?? 0) > 0;
  return {
    periods: before ? ['Before', 'After'] : ['After'],
    sequences: arms.map((name, arm) => ({ name, cells: before ? ['before', arm] : [arm] })),
  };
}

/** “, 1 baseline” behind a summary, where the outcome is measured more than once. */
export function measured({ repeated }: OptionPlan): string {
  if (!repeated) return '';
  const parts = [
    ...(repeated.baselines > 0 ? [counted(repeated.baselines, 'baseline', 'baselines')] : []),
    ...(repeated.followUps > 1 ? [counted(repeated.followUps, 'follow-up', 'follow-ups')] : []),
  ];
  return parts.map((part) => `, ${part}`).join('');
}

export const equalShares = (arms: number): { allocation: number[] } => ({ allocation: Array(arms).fill(1) });

/** The plan with a share for each of its arms. */
export function allocated(plan: OptionPlan): OptionPlan {
  if (Array.isArray(plan.structure.allocation)) return plan;
  return { ...plan, structure: { ...plan.structure, ...equalShares(plan.treatments.length) } };
}

/** The plan with other treatments, each with the share it had or an equal one. */
export function treatedByArm(plan: OptionPlan, treatments: number[]): OptionPlan {
  const shares = sharesOf(plan);
  const allocation = treatments.map((treatment) => shares[plan.treatments.indexOf(treatment)] ?? 1);
  return { ...plan, treatments, structure: { ...plan.structure, allocation } };
}

/** The plan with another active treatment, where there is one only. */
export const treated = (plan: OptionPlan, treatments: number[]): OptionPlan => ({ ...plan, treatments });

export const twoArms = () => ({ fewest: 2, most: 2 });

export const armShares = ({ arms }: StudyWords): PartOf<'shares'> => ({
  part: 'shares',
  legend: 'Allocation ratio',
  says: 'How large each arm is beside the others; equal shares are 1 and 1.',
  of: arms,
});
