import type { OutcomeKind } from '../request.js';

/**
 * An outcome as the designs see it: an effect and what one participant of each arm adds to its variance,
 * SE² = variances[0]/n₀ + variances[1]/n₁.
 */
export interface OutcomeModel {
  kind: OutcomeKind;
  /** The target in the outcome's own terms: a mean difference, or the active proportion. */
  target: number;
  /** The value of `target` at which there is no effect, and the last value it may come near (excluded). */
  nullTarget: number;
  targetLimit: number;
  /** On the analysis scale, after dilution. */
  effect: number;
  /** Remaining share of the effect after dilution: (1 − contamination)(1 − non-adherence). */
  dilution: number;
  variances: readonly [number, number];
  /** The proportions of a binary outcome, after dilution. */
  proportions?: readonly [number, number];
  /** Variance under no difference, where the test uses it rather than the alternative's. */
  nullVariance?(n0: number, n1: number): number;
  /** What a continuity correction takes off |effect|. */
  correction?(n0: number, n1: number): number;
  /** A t reference where a pooled SD is estimated; the normal otherwise. */
  reference: 't' | 'normal';
  /** Arms estimated apart (Welch) rather than pooled. */
  unequalVariances: boolean;
  /** Degrees of freedom spent on covariates. */
  covariates: number;
  /** True where the variances do not depend on the target, so that the detectable effect has a closed form. */
  varianceFixed: boolean;
  at(target: number): OutcomeModel;
}
