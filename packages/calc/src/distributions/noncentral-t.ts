import { exponentialRemainder } from '../numeric/remainders.js';
import { millsRatio } from './mills-ratio.js';
import { isSharp, sharpNoncentrality, sharpUpper } from './noncentral-t-limit.js';
import { normalDensity, normalUpper, normalUpperQuantile } from './normal.js';
import { stirlingError } from './stirling.js';

const rootTwoPi = 2.5066282746310007;

/** What is left out at either end, as a part of the sum. */
const negligible = 1e-14;

/** A noncentrality this many times x leaves less than 1e-300 in the other tail, for df from 0.002 up. */
const farAway = 1000;

/** −log of the error that the step of the trapezoid rule allows for. */
const digits = 30;

/**
 * The probability that a noncentral t value lies below x; df is real, Infinity is the normal distribution.
 *
 * *Formula*: the upper tail of −x at −ncp.
 * *Accuracy*: absolute 2e-12, relative 1e-10 where the result is over 1e-20 (noncentral-t.json). df ≤ 0 or
 * NaN gives NaN.
 */
export function noncentralTCdf(x: number, df: number, ncp: number): number {
  return noncentralTUpper(-x, df, -ncp);
}

/**
 * The probability that a noncentral t value lies above x; df is real, Infinity is the normal distribution.
 *
 * *Formula*: E[Φ̄(x·√(V/df) − ncp)] with V ~ χ²(df), by the trapezoid rule on y = log(V/df).
 * *Accuracy*: absolute 2e-12, relative 1e-10 where the result is over 1e-20 (noncentral-t.json). df ≤ 0 or
 * NaN gives NaN.
 */
export function noncentralTUpper(x: number, df: number, ncp: number): number {
  if (!(df > 0) || Number.isNaN(x) || !Number.isFinite(ncp)) return Number.NaN;
  if (df === Infinity || x === 0) return normalUpper(x - ncp);
  if (Math.abs(x) === Infinity) return x < 0 ? 1 : 0;
  if (Math.abs(ncp) > farAway * Math.max(1, Math.abs(x))) return ncp > 0 ? 1 : 0;
  if (isSharp(ncp, df)) return sharpUpper(x, df, ncp);
  return Math.min(1, upperTail(x, df, ncp).tail);
}

/** P(T' > x) and its derivative by ncp: sums from the middle of the χ² density out to where nothing is added. */
function upperTail(x: number, df: number, ncp: number): { tail: number; slope: number } {
  const a = 0.5 * df;
  const h = gridStep(x, a, ncp);
  // The slowest decay, on the left, is by exp(−a·h) a step.
  const smallest = negligible * Math.min(1, a * h);
  const towardsTail = x > 0 ? -h : h;
  let tail = 0;
  let slope = 0;
  for (let side = 0; side < 2; side++) {
    const stride = side === 0 ? towardsTail : -towardsTail;
    const growth = Math.exp(0.5 * stride);
    let scale = side === 0 ? 1 : growth;
    let last = 0;
    for (let k = side; ; k++) {
      const y = k * stride;
      const remainder = Math.abs(y) < 0.1 ? exponentialRemainder(y) : scale * scale - 1 - y;
      const exponent = a * remainder;
      const z = x * scale - ncp;
      const joint = Math.exp(-exponent - 0.5 * z * z) / rootTwoPi;
      const term = z > 0 ? joint * millsRatio(z) : Math.exp(-exponent) - joint * millsRatio(-z);
      tail += term;
      slope += joint;
      if (!(exponent < 745 && (term >= smallest * tail || term > last))) break;
      if (y < -40 && Math.abs(x) * scale < 1e-17) {
        // From here on the terms fall by one factor each, which for a small df is close to 1.
        tail += term / Math.expm1(a * h);
        slope += joint / Math.expm1(a * h);
        break;
      }
      last = term;
      // Renewed every 16 steps, before its rounding errors add up.
      scale = k % 16 === 15 ? Math.exp(0.5 * (y + stride)) : scale * growth;
    }
  }
  const constant = h * Math.sqrt(a / (2 * Math.PI)) * Math.exp(-stirlingError(a));
  return { tail: constant * tail, slope: constant * slope };
}

/**
 * The step at which the trapezoid rule on y is exact to `digits`: 2π/h is the frequency at which the transform
 * of the integrand, |Γ(b + iω)|/Γ(b) for a χ² density of 2b degrees of freedom, has fallen that far. The normal
 * factor sharpens the peak of the integrand, at the scale `peak`, unless the χ² density does not reach there.
 */
function gridStep(x: number, a: number, ncp: number): number {
  const product = Math.max(0, x * ncp);
  const curvature = a + 0.5 * x * x;
  const peak = (0.5 * product + Math.sqrt(0.25 * product * product + 4 * curvature * a)) / (2 * curvature);
  const isReached = a * (peak * peak - 1 - 2 * Math.log(peak)) < 80;
  const b = isReached ? a + 0.25 * product * peak : a;
  return (2 * Math.PI) / (1.07 * Math.sqrt(2 * digits * b + ((2 * digits) / Math.PI) ** 2));
}

/**
 * The noncentrality at which a noncentral t value lies above x with probability `power`.
 *
 * *Formula*: Newton's iteration on the normal quantile of the smaller tail, which is nearly linear in ncp, kept
 * between the bounds that it has shown.
 * *Accuracy*: 1e-11, relative above 1 (noncentrality.json). A power outside 0–1, x infinite, df ≤ 0 or NaN gives
 * NaN; power 0 and 1 give −Infinity and Infinity.
 */
export function noncentralityFor(power: number, x: number, df: number): number {
  if (!(df > 0 && power >= 0 && power <= 1) || !Number.isFinite(x)) return Number.NaN;
  if (power === 0) return -Infinity;
  if (power === 1) return Infinity;
  if (df < Infinity && isSharp(x, df)) {
    return x > 0
      ? sharpNoncentrality(power, x, df, (ncp) => noncentralTUpper(x, df, ncp))
      : -noncentralityFor(1 - power, -x, df);
  }
  if (power > 0.5) return -noncentralityBelow(1 - power, -x, df);
  return noncentralityBelow(power, x, df);
}

/** The same for a power up to ½. */
function noncentralityBelow(power: number, x: number, df: number): number {
  const z = normalUpperQuantile(power);
  if (df === Infinity || x === 0) return x - z;
  // T' > x > 0 only where Z + ncp > 0, so Φ(ncp) ≥ power; for x < 0 the other way round.
  let low = x > 0 ? -z : -Infinity;
  let high = x > 0 ? Infinity : -z;
  const shrinkage = 1 / (1 + 0.25 / df);
  const start = x * shrinkage - z * Math.sqrt(1 + x * x * (1 - shrinkage * shrinkage));
  let ncp = Math.min(high, Math.max(low, start));
  for (let iteration = 0; iteration < 60; iteration++) {
    const { tail, slope } = upperTail(x, df, ncp);
    const reached = normalUpperQuantile(tail);
    const step = ((reached - z) * normalDensity(reached)) / slope;
    if (Math.abs(step) < 1e-6 * (1 + Math.abs(ncp))) return ncp + step;
    if (reached > z) low = ncp;
    else high = ncp;
    const next = ncp + step;
    ncp = next > low && next < high ? next : 0.5 * (low + high);
  }
  return Number.NaN;
}
