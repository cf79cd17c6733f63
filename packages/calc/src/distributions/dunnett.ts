import { findRoot } from '../numeric/root.js';
import { secantRoot } from '../numeric/secant.js';
import { probabilityAnyAbove, probabilityAnyOutside } from './one-factor.js';
import { studentTUpperQuantile } from './student-t.js';

/**
 * The value that several comparisons with one control exceed, at least one of them, with probability alpha where
 * none differs from it: in size for two sides, upwards for one.
 *
 * *Formula*: c = the critical value of a single comparison at the type I error p, where p, from alpha/K to alpha,
 * solves P(max > c) = alpha: by the secant method on logarithms, from the p of the normal distribution, which is
 * nearly the same.
 * *Source*: Dunnett 1955, Journal of the American Statistical Association 50:1096; two-sided Dunnett 1964,
 * Biometrics 20:482.
 * *Units*: loadings √(nᵢ/(nᵢ + n₀)), with the sign of the effect each comparison is turned to; df real, Infinity is
 * the normal distribution.
 * *Accuracy*: relative 1e-10 (dunnett.json). A loading outside −1…1, df ≤ 0, alpha outside 0–1 or NaN gives NaN.
 */
export function dunnettCriticalValue(
  alpha: number,
  sides: 1 | 2,
  loadings: readonly number[],
  df: number,
): number {
  if (!(alpha > 0 && alpha < 1)) return Number.NaN;
  if (loadings.length === 1) return studentTUpperQuantile(alpha / sides, df);
  const least = Math.log(alpha / loadings.length);
  const inTheLimit = excessOf(alpha, sides, loadings, Infinity);
  const atLeast = inTheLimit(least);
  const start = rootFrom(least - atLeast, 1, inTheLimit, least, alpha);
  if (df === Infinity) return valueAt(start, sides, df);
  const slope = start === least ? 1 : atLeast / (least - start);
  return valueAt(rootFrom(start, slope, excessOf(alpha, sides, loadings, df), least, alpha), sides, df);
}

const valueAt = (logP: number, sides: 1 | 2, df: number) => studentTUpperQuantile(Math.exp(logP) / sides, df);

/** log of the joint type I error over alpha where each comparison has the type I error p. */
function excessOf(alpha: number, sides: 1 | 2, loadings: readonly number[], df: number) {
  const probability = sides === 2 ? probabilityAnyOutside : probabilityAnyAbove;
  const limits = loadings.slice();
  return (logP: number) =>
    Math.log(probability({ loadings, df }, limits.fill(valueAt(logP, sides, df))) / alpha);
}

function rootFrom(
  start: number,
  slope: number,
  excess: (logP: number) => number,
  least: number,
  alpha: number,
): number {
  const close = secantRoot(excess, start, slope, 1e-11);
  if (close !== undefined) return close;
  // Comparisons that hardly ever err together have their root at the end of the bracket.
  return excess(least) >= 0 ? least : findRoot(excess, least, Math.log(alpha)).root;
}
