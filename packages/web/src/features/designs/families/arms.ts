import type { OptionPlan } from '@steelyard/calc';
import { capitalised, counted } from '../../../shared/format/lists';
import { count } from '../../../shared/format/numbers';
import type { Schematic, StudyWords } from './family-ui';

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

/** “Participants in each arm”, or in the control arm where the others follow from it. */
export function inEachArm(noun: string, { structure }: OptionPlan): string {
  const shares = Array.isArray(structure.allocation) ? structure.allocation : [];
  const equal = shares.every((share) => share === shares[0]);
  return `${capitalised(noun)} in ${equal ? 'each' : 'the control'} arm`;
}

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
