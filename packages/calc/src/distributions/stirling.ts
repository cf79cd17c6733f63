import { polynomial } from '../numeric/polynomial.js';

const series = [1 / 12, -1 / 360, 1 / 1260, -1 / 1680, 1 / 1188, -691 / 360360, 1 / 156];

/**
 * What Stirling's formula leaves of the log-gamma function: log Γ(a + 1) − (a + ½)·log a + a − ½·log 2π.
 *
 * *Formula*: Stirling's series in 1/a from 10 up; below, log Γ(a + 1) by the recurrence from there.
 * *Source*: Loader 2000, Fast and accurate computation of binomial probabilities, section 3.
 * *Accuracy*: absolute 5e-15 (stirling.json). a ≤ 0 gives NaN.
 */
export function stirlingError(a: number): number {
  if (!(a > 0)) return Number.NaN;
  if (a >= 10) return polynomial(1 / (a * a), series) / a;
  let product = 1;
  let shifted = a;
  for (; shifted < 10; shifted++) product *= shifted + 1;
  const logGamma = stirlingError(shifted) + (shifted + 0.5) * Math.log(shifted) - shifted - Math.log(product);
  return logGamma - (a + 0.5) * Math.log(a) + a;
}
