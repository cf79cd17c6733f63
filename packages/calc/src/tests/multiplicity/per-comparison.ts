import { CalcError } from '../../errors.js';
import type { Comparisons } from '../../request.js';

/**
 * The type I error each comparison is tested at: α unadjusted, α/C by Bonferroni's inequality.
 *
 * Throws CalcError `unsupported` for adjustments, goals and families of comparisons that are not computed.
 */
export function alphaPerComparison(comparisons: Comparisons, alpha: number, count: number): number {
  const refuse = (field: keyof Comparisons, words: string): never => {
    throw new CalcError('unsupported', `design.comparisons.${field}`, words);
  };
  if (comparisons.against === 'all-pairs') {
    refuse('against', 'Comparing all pairs of arms is not computed yet: compare each arm with control.');
  }
  if (comparisons.powerGoal !== 'per-comparison') {
    refuse(
      'powerGoal',
      `The ${comparisons.powerGoal} power goal is not computed yet: state power per comparison.`,
    );
  }
  if (comparisons.adjust === 'none') return alpha;
  if (comparisons.adjust === 'bonferroni') return alpha / count;
  return refuse(
    'adjust',
    `The ${comparisons.adjust} adjustment is not computed yet: choose none or Bonferroni.`,
  );
}
