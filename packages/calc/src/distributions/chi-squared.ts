import { deviance, exponentialRemainder } from '../numeric/remainders.js';
import { normalUpperQuantile } from './normal.js';
import { stirlingError } from './stirling.js';
import { tailIntegral } from './tail-integral.js';
import { tailQuantile } from './tail-quantile.js';

/**
 * The probability that a chi-squared value lies below x.
 *
 * *Formula*: the regularised incomplete gamma function P(df/2, x/2), see `gammaTails`.
 * *Accuracy*: relative 1e-12 in both tails down to 1e-300 (chi-squared.json). df ≤ 0 or infinite, or NaN, gives
 * NaN.
 */
export function chiSquaredCdf(x: number, df: number): number {
  if (!(df > 0 && df < Infinity) || Number.isNaN(x)) return Number.NaN;
  if (x <= 0) return 0;
  return x === Infinity ? 1 : gammaTails(0.5 * df, 0.5 * x).lower;
}

/**
 * The probability that a chi-squared value lies above x.
 *
 * *Formula*: the regularised incomplete gamma function Q(df/2, x/2), see `gammaTails`.
 * *Accuracy*: relative 1e-12 in both tails down to 1e-300 (chi-squared.json). df ≤ 0 or infinite, or NaN, gives
 * NaN.
 */
export function chiSquaredUpper(x: number, df: number): number {
  if (!(df > 0 && df < Infinity) || Number.isNaN(x)) return Number.NaN;
  if (x <= 0) return 1;
  return x === Infinity ? 0 : gammaTails(0.5 * df, 0.5 * x).upper;
}

/**
 * The value below which a chi-squared value lies with probability p.
 *
 * *Formula*: Newton's iteration from the normal approximation to the cube root.
 * *Source*: Wilson & Hilferty 1931, Proceedings of the National Academy of Sciences 17:684 (the start).
 * *Accuracy*: relative 1e-12 (chi-squared.json). p outside 0–1, df ≤ 0 or infinite, or NaN, gives NaN.
 */
export function chiSquaredQuantile(p: number, df: number): number {
  if (!(df > 0 && df < Infinity && p >= 0 && p <= 1)) return Number.NaN;
  if (p === 0 || p === 1) return p === 0 ? 0 : Infinity;
  return p > 0.5 ? upperQuantile(1 - p, df) : lowerQuantile(p, df);
}

/**
 * The value above which a chi-squared value lies with probability p.
 *
 * *Formula*, *source*: as `chiSquaredQuantile`.
 * *Accuracy*: relative 1e-12 (chi-squared.json). p outside 0–1, df ≤ 0 or infinite, or NaN, gives NaN.
 */
export function chiSquaredUpperQuantile(p: number, df: number): number {
  if (!(df > 0 && df < Infinity && p >= 0 && p <= 1)) return Number.NaN;
  if (p === 0 || p === 1) return p === 0 ? Infinity : 0;
  return p > 0.5 ? lowerQuantile(1 - p, df) : upperQuantile(p, df);
}

function lowerQuantile(p: number, df: number): number {
  const a = 0.5 * df;
  const start = startingLogarithm(-normalUpperQuantile(p), p, a);
  if (start < -40) return 2 * Math.exp(start);
  const at = (u: number) => {
    const { lower, density } = gammaTails(a, Math.exp(u));
    return { tail: lower, density };
  };
  return 2 * Math.exp(tailQuantile(at, p, start));
}

function upperQuantile(p: number, df: number): number {
  const a = 0.5 * df;
  const start = startingLogarithm(normalUpperQuantile(p), 1 - p, a);
  if (start < -40) return 2 * Math.exp(start);
  const at = (u: number) => {
    const { upper, density } = gammaTails(a, Math.exp(-u));
    return { tail: upper, density };
  };
  return 2 * Math.exp(-tailQuantile(at, p, -start));
}

/**
 * Near the logarithm of the gamma value with the normal score z, below which p lies. Below −40 it is exact: the
 * first term of the power series is all there is.
 */
function startingLogarithm(z: number, p: number, a: number): number {
  const cubeRoot = 1 - 1 / (9 * a) + z / (3 * Math.sqrt(a));
  if (cubeRoot > 0.3) return Math.log(a) + 3 * Math.log(cubeRoot);
  const logGamma = stirlingError(a) + (a + 0.5) * Math.log(a) - a + 0.5 * Math.log(2 * Math.PI);
  return (Math.log(p) + logGamma) / a;
}

interface GammaTails {
  lower: number;
  upper: number;
  /** On the scale of log x. */
  density: number;
}

/**
 * Both tails of the gamma distribution with shape a at x, and its density on the scale of log x.
 *
 * *Formula*: the tail on x's side of the mean, relative to the density x^a·e^(−x)/Γ(a), by its power series for
 * a small a, else as an integral over log x; the other tail is the complement.
 * *Source*: Abramowitz & Stegun 1964, 6.5.29 (the series); Loader 2000 (the density).
 */
function gammaTails(a: number, x: number): GammaTails {
  const density = Math.sqrt(a / (2 * Math.PI)) * Math.exp(-stirlingError(a) - deviance(a, x));
  // A tail without density is empty; far enough out its integral has no scale left to be summed on.
  if (density === 0) return x < a ? { lower: 0, upper: 1, density } : { lower: 1, upper: 0, density };
  if (x < Math.max(a, 1)) {
    const reach =
      a < 10 ? powerSeries(a, x) : tailIntegral((u) => (a - x) * u + x * exponentialRemainder(-u), a - x, x);
    const lower = Math.min(1, density * reach);
    return { lower, upper: 1 - lower, density };
  }
  const upper = density * tailIntegral((u) => (x - a) * u + x * exponentialRemainder(u), x - a, x);
  return { lower: 1 - upper, upper, density };
}

/** 1/a + x/(a·(a + 1)) + x²/(a·(a + 1)·(a + 2)) + … */
function powerSeries(a: number, x: number): number {
  let term = 1 / a;
  let sum = term;
  for (let k = 1; term > 1e-17 * sum; k++) {
    term *= x / (a + k);
    sum += term;
  }
  return sum;
}
