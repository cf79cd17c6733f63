import { normalQuantile } from '../distributions/normal.js';
import { findRoot } from '../numeric/root.js';
import { withoutNoise } from './margin.js';
import type { SingleTest } from './single-test.js';
import { twoOneSidedPower } from './two-one-sided.js';

/**
 * Within the margin on both sides, by two one-sided tests, each at α.
 *
 * *Source*: Schuirmann 1987, J Pharmacokinet Biopharm 15:657; Owen 1965, Biometrika 52:437.
 * *Units*: effect and margin on the analysis scale (logs of ratios).
 */
export function equivalence(margin: number): SingleTest {
  return {
    distance: (effect) => withoutNoise(margin - Math.abs(effect), margin),
    power: ({ effect, standardError }, critical, df) =>
      twoOneSidedPower(effect, standardError, df, critical, margin),
    noncentralityNeeded: ({ effect }, critical, _, power) => distanceNeeded(effect, margin, critical, power),
  };
}

/**
 * The distance to the nearer bound, in standard errors, that gives the power where there is no df: between the
 * distance one bound alone would need, and the one needed where both bounds are as near.
 */
function distanceNeeded(effect: number, margin: number, critical: number, power: number): number {
  const distance = margin - Math.abs(effect);
  const shortfall = (errors: number) =>
    twoOneSidedPower(effect, distance / errors, null, critical, margin) - power;
  const one = critical + normalQuantile(power);
  const both = critical + normalQuantile(0.5 + 0.5 * power);
  const { root, converged } = findRoot(shortfall, one, both, { tolerance: 1e-6 });
  return converged ? root : both;
}
