import type { OutcomeKind } from '../request.js';

/**
 * An outcome as the designs see it: an effect and what one participant of each arm adds to its variance,
 * SE² = variances[0]/n₀ + variances[1]/n₁ unless `variance` says otherwise.
 */
export interface OutcomeModel {
  kind: OutcomeKind;
  /** The target in the outcome's own terms: a mean difference, or the active proportion. */
  target: number;
  /** Where the request states the target, and what is wrong with another one, in words. */
  targetPath: string;
  refuseTarget?(target: number): string | undefined;
  /** The value of `target` at which there is no effect, and the last value it may come near (excluded). */
  nullTarget: number;
  targetLimit: number;
  /** The target this share of the way from the one to the other, where the way is no straight line. */
  targetAlong?(share: number): number;
  /** On the analysis scale, after dilution. */
  effect: number;
  /** Remaining share of the effect after dilution: (1 − contamination)(1 − non-adherence). */
  dilution: number;
  /** NaN where `variance` takes their place. */
  variances: readonly [number, number];
  /** SE² of the effect, where both arms' sizes decide it together. */
  variance?(n0: number, n1: number): number;
  /** Chance of an event in each arm of a time-to-event outcome. */
  eventProbabilities?: readonly [number, number];
  /** Events that one participant of each arm is expected to have, of a count. */
  expectedCounts?: readonly [number, number];
  /** Category probabilities of each arm of an ordinal outcome. */
  categories?: readonly [readonly number[], readonly number[]];
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
