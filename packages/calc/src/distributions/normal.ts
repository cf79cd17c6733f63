import { polynomial } from '../numeric/polynomial.js';
import { millsRatio } from './mills-ratio.js';

const rootTwoPi = 2.5066282746310007;

const middleAbove = [
  3.3871328727963665, 133.14166789178438, 1971.5909503065513, 13731.69376550946, 45921.95393154987,
  67265.7709270087, 33430.57558358813, 2509.0809287301227,
];
const middleBelow = [
  1, 42.31333070160091, 687.1870074920579, 5394.196021424751, 21213.794301586597, 39307.89580009271,
  28729.085735721943, 5226.495278852854,
];
const nearAbove = [
  1.4234371107496835, 4.630337846156546, 5.769497221460691, 3.6478483247632045, 1.2704582524523684,
  0.2417807251774506, 0.022723844989269184, 0.0007745450142783414,
];
const nearBelow = [
  1, 2.053191626637759, 1.6763848301838038, 0.6897673349851, 0.14810397642748008, 0.015198666563616457,
  0.0005475938084995345, 1.0507500716444169e-9,
];
const farAbove = [
  6.657904643501103, 5.463784911164114, 1.7848265399172913, 0.29656057182850487, 0.026532189526576124,
  0.0012426609473880784, 2.7115555687434876e-5, 2.0103343992922881e-7,
];
const farBelow = [
  1, 0.599832206555888, 0.1369298809227358, 0.014875361290850615, 0.0007868691311456133,
  1.8463183175100548e-5, 1.421511758316446e-7, 2.0442631033899397e-15,
];

/**
 * The density of the standard normal distribution at x.
 *
 * *Formula*: exp(−x²/2)/√(2π), with x² carried to twice the digits.
 * *Accuracy*: relative 1e-15 down to 1e-307 (normal.json). NaN gives NaN.
 */
export function normalDensity(x: number): number {
  if (x > 40 || x < -40) return 0;
  const short = Math.fround(x);
  const rest = 0.5 * (x - short) * (x + short);
  return (Math.exp(-0.5 * short * short) * (1 - rest * (1 - 0.5 * rest * (1 - rest / 3)))) / rootTwoPi;
}

/**
 * The probability that a standard normal value lies below x.
 *
 * *Formula*: Φ(x), as the upper tail of −x.
 * *Accuracy*: relative 2e-15 in both tails down to 1e-307 (normal.json). NaN gives NaN.
 */
export function normalCdf(x: number): number {
  return normalUpper(-x);
}

/**
 * The probability that a standard normal value lies above x.
 *
 * *Formula*: φ(x) times Mills' ratio for x ≥ 0, one minus that of −x below 0.
 * *Accuracy*: relative 2e-15 in both tails down to 1e-307 (normal.json). NaN gives NaN.
 */
export function normalUpper(x: number): number {
  if (x < 0) return x < -39 ? 1 : 1 - normalDensity(x) * millsRatio(-x);
  return x > 39 ? 0 : normalDensity(x) * millsRatio(x);
}

/**
 * The value below which a standard normal value lies with probability p.
 *
 * *Formula*: Φ⁻¹(p), as −1 times the upper quantile of p.
 * *Accuracy*: relative 1e-15 (normal.json). p outside 0–1 or NaN gives NaN.
 */
export function normalQuantile(p: number): number {
  return 0 - normalUpperQuantile(p);
}

/**
 * The value above which a standard normal value lies with probability p.
 *
 * *Formula*: rational functions of 0.5 − p in the middle, of √(−log p) in two pieces of each tail.
 * *Source*: Wichura 1988, Applied Statistics 37:477, algorithm AS 241 (PPND16).
 * *Accuracy*: relative 1e-15 (normal.json). p outside 0–1 or NaN gives NaN.
 */
export function normalUpperQuantile(p: number): number {
  const fromMiddle = 0.5 - p;
  if (Math.abs(fromMiddle) <= 0.425) {
    const r = 0.180625 - fromMiddle * fromMiddle;
    return (fromMiddle * polynomial(r, middleAbove)) / polynomial(r, middleBelow);
  }
  const tail = fromMiddle > 0 ? p : 1 - p;
  if (!(tail > 0)) return tail === 0 ? (fromMiddle > 0 ? Infinity : -Infinity) : Number.NaN;
  const r = Math.sqrt(-Math.log(tail));
  const z =
    r <= 5
      ? polynomial(r - 1.6, nearAbove) / polynomial(r - 1.6, nearBelow)
      : polynomial(r - 5, farAbove) / polynomial(r - 5, farBelow);
  return fromMiddle > 0 ? z : -z;
}
