import { findRoot } from '../numeric/root.js';
import { chiSquaredCdf, chiSquaredQuantile, chiSquaredUpper } from './chi-squared.js';

/** Whether a value of the statistic or its noncentrality is so large that the normal part is sharp beside √(V/df). */
export function isSharp(value: number, df: number): boolean {
  return Math.abs(value) > 200 * Math.sqrt(Math.max(1, df));
}

/**
 * P(T′ > x) at a sharp noncentrality.
 *
 * *Formula*: E[P(√(V/df) < (ncp + Z)/x)] over Z ~ N(0, 1) by Gauss–Hermite quadrature at 0 and ±√3.
 * *Accuracy*: absolute 1e-11 against the trapezoid rule where the two meet (noncentral-t.test.ts).
 */
export function sharpUpper(x: number, df: number, ncp: number): number {
  if (x > 0 !== ncp > 0) return ncp > 0 ? 1 : 0;
  const beyond = x > 0 ? chiSquaredCdf : chiSquaredUpper;
  const at = (z: number) => beyond(df * ((ncp + z) / x) ** 2, df);
  return (4 * at(0) + at(Math.sqrt(3)) + at(-Math.sqrt(3))) / 6;
}

/** The noncentrality of a sharp x > 0 at which `upper`, P(T′ > x) as it depends on the noncentrality, is `power`. */
export function sharpNoncentrality(
  power: number,
  x: number,
  df: number,
  upper: (ncp: number) => number,
): number {
  const near = x * Math.sqrt(chiSquaredQuantile(power, df) / df);
  const lo = Math.min(0.5 * near, near - 5);
  return findRoot((ncp) => upper(ncp) - power, lo, 2 * near + 5, { tolerance: 1e-13 }).root;
}
