import type { Analysis } from '../analysis.js';
import type { SingleTest } from '../single-test.js';

/** How several comparisons keep one type I error, and what the power is of. */
export interface Multiplicity {
  /** The type I error of each comparison, where it has one of its own. */
  alphaPerComparison?: number;
  /**
   * Whether the power is the smallest over comparisons that are each tested at the critical value, so that an
   * effect follows from it in closed form.
   */
  separate: boolean;
  /** What the statistic of each comparison must exceed; Holm: its first step's. */
  criticalValue(analysis: Analysis): number;
  /** Power of each comparison, and of the goal: per comparison the smallest, disjunctive one, conjunctive all. */
  powers(analysis: Analysis, critical: number, test: SingleTest): { each: number[]; goal: number };
  /** The chance that at least one, and that every comparison rejects; none without correlations between them. */
  joint?(analysis: Analysis, critical: number, test: SingleTest): JointPower | undefined;
}

export interface JointPower {
  disjunctive: number;
  conjunctive: number;
}
