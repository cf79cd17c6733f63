import { betaTails, logVarianceRatio, varianceRatioPoint } from './incomplete-beta.js';

/**
 * The probability that an F value lies below x.
 *
 * *Formula*: the lower tail of the beta distribution with shapes df1/2 and df2/2, see `betaTails`.
 * *Accuracy*: relative 1e-12 in both tails down to 1e-300 (f.json). A df ≤ 0 or infinite, or NaN, gives NaN.
 */
export function fCdf(x: number, df1: number, df2: number): number {
  if (!degreesAreValid(df1, df2) || Number.isNaN(x)) return Number.NaN;
  if (x <= 0 || x === Infinity) return x <= 0 ? 0 : 1;
  return betaTails(varianceRatioPoint(0.5 * df1, 0.5 * df2, x, 1 - x)).lower;
}

/**
 * The probability that an F value lies above x.
 *
 * *Formula*: the upper tail of the beta distribution with shapes df1/2 and df2/2, see `betaTails`.
 * *Accuracy*: relative 1e-12 in both tails down to 1e-300 (f.json). A df ≤ 0 or infinite, or NaN, gives NaN.
 */
export function fUpper(x: number, df1: number, df2: number): number {
  if (!degreesAreValid(df1, df2) || Number.isNaN(x)) return Number.NaN;
  if (x <= 0 || x === Infinity) return x <= 0 ? 1 : 0;
  return betaTails(varianceRatioPoint(0.5 * df1, 0.5 * df2, x, 1 - x)).upper;
}

/**
 * The value below which an F value lies with probability p.
 *
 * *Formula*: Newton's iteration for its logarithm, see `logVarianceRatio`.
 * *Accuracy*: relative 1e-12 (f.json). p outside 0–1, a df ≤ 0 or infinite, or NaN, gives NaN.
 */
export function fQuantile(p: number, df1: number, df2: number): number {
  if (!degreesAreValid(df1, df2) || !(p >= 0 && p <= 1)) return Number.NaN;
  if (p === 0 || p === 1) return p === 0 ? 0 : Infinity;
  const [a, b] = [0.5 * df1, 0.5 * df2];
  return Math.exp(p > 0.5 ? -logVarianceRatio(1 - p, b, a) : logVarianceRatio(p, a, b));
}

/**
 * The value above which an F value lies with probability p.
 *
 * *Formula*: Newton's iteration for its logarithm, see `logVarianceRatio`.
 * *Accuracy*: relative 1e-12 (f.json). p outside 0–1, a df ≤ 0 or infinite, or NaN, gives NaN.
 */
export function fUpperQuantile(p: number, df1: number, df2: number): number {
  if (!degreesAreValid(df1, df2) || !(p >= 0 && p <= 1)) return Number.NaN;
  if (p === 0 || p === 1) return p === 0 ? Infinity : 0;
  const [a, b] = [0.5 * df1, 0.5 * df2];
  return Math.exp(p > 0.5 ? logVarianceRatio(1 - p, a, b) : -logVarianceRatio(p, b, a));
}

function degreesAreValid(df1: number, df2: number): boolean {
  return df1 > 0 && df1 < Infinity && df2 > 0 && df2 < Infinity;
}
