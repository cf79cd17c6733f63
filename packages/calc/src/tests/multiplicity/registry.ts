import { CalcError } from '../../errors.js';
import type { Comparisons, TestPlan } from '../../request.js';
import { criticalValue } from '../one-bound.js';
import { dunnett } from './dunnett.js';
import { fixedSequence } from './fixed-sequence.js';
import { holm } from './holm.js';
import type { Multiplicity } from './multiplicity.js';
import { separately } from './separately.js';
import { singleStep } from './single-step.js';

/** How the comparisons of a design are tested together; one comparison alone keeps the whole type I error. */
export function multiplicityFor(
  { hypothesis, alpha, sides }: TestPlan,
  comparisons: Comparisons | undefined,
  active: number,
): Multiplicity {
  if (!comparisons) return separately(alpha, sides);
  const { against, adjust, powerGoal } = comparisons;
  const count = against === 'control' ? active : (active * (active + 1)) / 2;
  if (against === 'all-pairs') {
    refuseBeyondSeparate(comparisons, 'Comparisons of all pairs are');
    if (comparisons.effects) {
      throw new CalcError(
        'unsupported',
        'design.comparisons.effects',
        'Each pair of arms is powered for the target difference; leave the effects out.',
      );
    }
  }
  switch (adjust) {
    case 'none':
      return singleStep(hypothesis, powerGoal, ({ df }) => criticalValue(alpha / sides, df), alpha);
    case 'bonferroni': {
      const share = alpha / count;
      return singleStep(hypothesis, powerGoal, ({ df }) => criticalValue(share / sides, df), share);
    }
    case 'dunnett':
      return dunnett(hypothesis, powerGoal, alpha, sides);
    case 'fixed-sequence':
      return fixedSequence(hypothesis, powerGoal, alpha, sides);
    case 'holm':
      return holm(hypothesis, powerGoal, alpha, sides);
  }
}

/** Refuses what needs the correlations between comparisons, for `what` has none. Throws CalcError `unsupported`. */
export function refuseBeyondSeparate({ adjust, powerGoal }: Comparisons, what: string): void {
  if (adjust !== 'none' && adjust !== 'bonferroni') {
    throw new CalcError(
      'unsupported',
      'design.comparisons.adjust',
      `${what} unadjusted or adjusted by Bonferroni’s method only: choose one of these.`,
    );
  }
  if (powerGoal !== 'per-comparison') {
    throw new CalcError(
      'unsupported',
      'design.comparisons.powerGoal',
      `${what} powered per comparison only: choose that goal.`,
    );
  }
}
