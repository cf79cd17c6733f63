import { normalQuantile } from './distributions/normal.js';
import { findRoot } from './numeric/root.js';
import { secantRoot } from './numeric/secant.js';

/** A thousandth of the guess counts as nothing. */
const leastShare = 1e-3;
const stride = 1.5;

/**
 * The x at which a power that rises with x > 0 reaches its aim, from a guess; undefined where next to nothing
 * reaches it already.
 *
 * *Formula*: the secant method on the normal quantile of the power, which is nearly straight in x; a bracket around
 * the guess where that does not settle.
 * *Accuracy*: `tolerance` relative to x.
 */
export function powerRoot(
  powerAt: (x: number) => number,
  power: number,
  guess: number,
  tolerance: number,
): number | undefined {
  const aimed = normalQuantile(power);
  const surplus = (x: number) => normalQuantile(powerAt(x)) - aimed;
  const least = leastShare * guess;
  const close = secantRoot(surplus, guess, (2 + Math.abs(aimed)) / guess, tolerance);
  if (close !== undefined && close > least) return close;
  let above = guess;
  while (powerAt(above) < power) above *= stride;
  let below = above / stride;
  while (powerAt(below) >= power) {
    if (below < least) return undefined;
    above = below;
    below /= stride;
  }
  return findRoot((x) => powerAt(x) - power, below, above, { tolerance }).root;
}
