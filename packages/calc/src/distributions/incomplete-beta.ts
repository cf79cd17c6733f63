import { deviance, exponentialRemainder, logarithmRemainder } from '../numeric/remainders.js';
import { normalUpperQuantile } from './normal.js';
import { stirlingError } from './stirling.js';
import { tailIntegral } from './tail-integral.js';
import { tailQuantile } from './tail-quantile.js';

/** A point of the beta distribution with shapes a and b. */
export interface BetaPoint {
  a: number;
  b: number;
  x: number;
  /** 1 − x */
  y: number;
  /** a·y − b·x, which is 0 at the mean, to all the digits that the caller knows. */
  offset: number;
}

export interface BetaTails {
  lower: number;
  upper: number;
  /** On the scale of log(x/y). */
  density: number;
}

/**
 * Both tails of the beta distribution at a point, and its density on the scale of log(x/y).
 *
 * *Formula*: the tail on x's side of the mean, relative to the density x^a·y^b/B(a, b): its power series for a
 * small shape or x, else an integral over log(x/y); the other tail is the complement.
 * *Source*: Abramowitz & Stegun 1964, 26.5.4 (the series); Loader 2000 (the density).
 * *Accuracy*: relative 1e-12 in both tails down to 1e-300 (beta.json, f.json).
 */
export function betaTails(point: BetaPoint): BetaTails {
  const { a, b, x, y, offset } = point;
  const n = a + b;
  const lowerIsShort = n * Math.min(x, y) < 1 ? x < y : offset > 0;
  const density =
    Math.sqrt((a * b) / (2 * Math.PI * n)) *
    Math.exp(
      stirlingError(n) -
        stirlingError(a) -
        stirlingError(b) -
        deviance(a, n * x, offset) -
        deviance(b, n * y, -offset),
    );
  if (lowerIsShort) {
    const lower = Math.min(1, density * reach(point));
    return { lower, upper: 1 - lower, density };
  }
  const upper = Math.min(1, density * reach({ a: b, b: a, x: y, y: x, offset: -offset }));
  return { lower: 1 - upper, upper, density };
}

/**
 * The logarithm of the variance ratio F = (b·x)/(a·y) below which lies the probability p, at most ½.
 *
 * *Formula*: Newton's iteration on it; the first term of the power series where x is small.
 * *Source*: Fisher 1924, Proceedings of the International Congress of Mathematics, Toronto 2:805 (the start: log F
 * is nearly normal).
 */
export function logVarianceRatio(p: number, a: number, b: number): number {
  const fromSeries = (Math.log(p * a) + logBeta(a, b)) / a + Math.log(b / a);
  if (fromSeries + Math.log(a + a * (a / b)) < -40) return fromSeries;
  const fisher = 0.5 * (1 / b - 1 / a) - normalUpperQuantile(p) * Math.sqrt(1 / a + 1 / b);
  const at = (u: number) => {
    const { lower, density } = betaTails(varianceRatioPoint(a, b, Math.exp(u), -Math.expm1(u)));
    return { tail: lower, density };
  };
  return tailQuantile(at, p, Math.max(fisher, fromSeries));
}

function logBeta(a: number, b: number): number {
  const n = a + b;
  const atMean = -a * Math.log1p(b / a) - b * Math.log1p(a / b);
  const remainder = stirlingError(a) + stirlingError(b) - stirlingError(n);
  return atMean + 0.5 * Math.log((2 * Math.PI * n) / (a * b)) + remainder;
}

/** The point at which b·x/(a·y) is `ratio`; `complement` is 1 − ratio. */
export function varianceRatioPoint(a: number, b: number, ratio: number, complement: number): BetaPoint {
  const odds = (a / b) * ratio;
  const y = 1 / (1 + odds);
  return { a, b, x: odds < 1 ? odds * y : 1 / (1 + 1 / odds), y, offset: a * complement * y };
}

/** The lower tail relative to the density. */
function reach({ a, b, x, y, offset }: BetaPoint): number {
  const n = a + b;
  if (a < 10 || n * x < 1) {
    let term = 1 / a;
    let sum = term;
    for (let k = 0; term > 1e-17 * sum; k++) {
      term *= ((n + k) * x) / (a + 1 + k);
      sum += term;
    }
    return sum;
  }
  const bend = n * x * y;
  if (x <= 0.5) {
    return tailIntegral(
      (u) => offset * u + n * (logarithmRemainder(x * Math.expm1(-u)) + x * exponentialRemainder(-u)),
      offset,
      bend,
    );
  }
  return tailIntegral(
    (u) => offset * u + n * (logarithmRemainder(y * Math.expm1(u)) + y * exponentialRemainder(u)),
    offset,
    bend,
  );
}
