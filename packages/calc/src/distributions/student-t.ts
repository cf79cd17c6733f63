import { polynomial } from '../numeric/polynomial.js';
import { millsRatio } from './mills-ratio.js';
import { normalUpper, normalUpperQuantile } from './normal.js';

/** log(Γ(a + ½)/Γ(a)/√a), times a, in powers of 1/a². */
const gammaRatioSeries = [
  -1 / 8,
  1 / 192,
  -1 / 640,
  17 / 14336,
  -31 / 18432,
  691 / 180224,
  -0.012819730318509616,
];

/** √(h/sinh h) in powers of h². */
const sinhSeries = [
  1, -0.08333333333333333, 0.00625, -0.0005042989417989418, 0.00004343722442680776, -0.000003896385732323232,
  3.583335463450791e-7, -3.349747072060578e-8,
];

/**
 * The probability that a Student t value lies below x; df is real, Infinity is the normal distribution.
 *
 * *Formula*: the upper tail of −x.
 * *Accuracy*: relative 1e-12 in both tails down to 1e-300 (student-t.json). df ≤ 0 or NaN gives NaN.
 */
export function studentTCdf(x: number, df: number): number {
  return studentTUpper(-x, df);
}

/**
 * The probability that a Student t value lies above x; df is real, Infinity is the normal distribution.
 *
 * *Formula*: half the regularised incomplete beta function I(df/2, ½) at 1/(1 + x²/df), see `scaledTail`.
 * *Accuracy*: relative 1e-12 in both tails down to 1e-300 (student-t.json). df ≤ 0 or NaN gives NaN.
 */
export function studentTUpper(x: number, df: number): number {
  if (!(df > 0) || Number.isNaN(x)) return Number.NaN;
  if (df === Infinity) return normalUpper(x);
  if (x === 0) return 0.5;
  if (Math.abs(x) === Infinity) return x < 0 ? 1 : 0;
  const q = Math.abs(x) < 1e150 ? Math.log1p((x * x) / df) : 2 * Math.log(Math.abs(x)) - Math.log(df);
  const a = 0.5 * df;
  const tail = Math.exp(-a * q) * scaledTail(q, a, gammaRatio(a));
  return x < 0 ? 1 - tail : tail;
}

/**
 * The value below which a Student t value lies with probability p.
 *
 * *Formula*: −1 times the upper quantile of p.
 * *Accuracy*: relative 1e-12 (student-t.json). p outside 0–1, df ≤ 0 or NaN gives NaN.
 */
export function studentTQuantile(p: number, df: number): number {
  return 0 - studentTUpperQuantile(p, df);
}

/**
 * The value above which a Student t value lies with probability p.
 *
 * *Formula*: Halley's iteration for the logarithm of the tail, on q = log(1 + t²/df); Newton's on t for the
 * area between 0 and t where p is near ½.
 * *Accuracy*: relative 1e-12 (student-t.json). p outside 0–1, df ≤ 0 or NaN gives NaN.
 */
export function studentTUpperQuantile(p: number, df: number): number {
  if (!(df > 0 && p >= 0 && p <= 1)) return Number.NaN;
  if (df === Infinity) return normalUpperQuantile(p);
  if (p === 0) return Infinity;
  if (p === 0.5) return 0;
  if (p > 0.5) return -studentTUpperQuantile(1 - p, df);
  const a = 0.5 * df;
  const ratio = gammaRatio(a);
  const straight = ((0.5 - p) * Math.sqrt(Math.PI)) / (a * ratio);
  if (p > 0.3 && straight * straight < 0.1)
    return Math.sqrt(df) * rootOfCentralArea(0.5 - p, straight, a, ratio);
  const q = rootOfTail(p, Math.log1p(straight * straight), a, ratio);
  return q < 30 ? Math.sqrt(df * Math.expm1(q)) : Math.sqrt(df) * Math.exp(0.5 * q);
}

/** Γ(a + ½)/Γ(a + 1): Stirling's series from 12 up, the recurrence below. */
function gammaRatio(a: number): number {
  let factor = 1;
  let shifted = a;
  for (; shifted < 12; shifted++) factor *= (shifted + 1) / (shifted + 0.5);
  const logarithm = polynomial(1 / (shifted * shifted), gammaRatioSeries) / shifted;
  return (factor * Math.exp(logarithm)) / Math.sqrt(shifted);
}

/**
 * The upper tail at q = log(1 + t²/df), t ≥ 0, times exp(q·a); a = df/2 and `ratio` = Γ(a + ½)/Γ(a + 1).
 *
 * *Formula*: with x = exp(−q), what ½I_x(a, ½) loses as a rises by 1 (each loss positive), until a is large and the
 * rest is small or its series exact; the rest is a constant times ∫φ(v)·√(h/sinh h) dv from √(N·q) up, with
 * N = 2a − ½ and h = v²/(2N), expanded in h²: a series in 1/N².
 * *Source*: the variable √(N·log(1 + t²/df)) is Wallace's 1959, Annals of Mathematical Statistics 30:1121.
 */
function scaledTail(q: number, a: number, ratio: number): number {
  const x = Math.exp(-q);
  const neglected = Math.min(1, (q / (2 * Math.PI)) ** 16);
  let sum = 0;
  let shrunk = 1;
  let shifted = a;
  while (shifted < 12 || shrunk * neglected > 1e-17) {
    sum += ratio * shrunk;
    shrunk *= x;
    ratio *= (shifted + 0.5) / (shifted + 1);
    shifted++;
    if (shrunk * ratio < 1e-17 * sum) return 0.5 * Math.sqrt(-Math.expm1(-q) / Math.PI) * sum;
  }

  const n = 2 * shifted - 0.5;
  const square = n * q;
  let moment = millsRatio(Math.sqrt(square));
  let rest = moment;
  let power = Math.sqrt(square);
  let scale = 1;
  for (let k = 1; k < sinhSeries.length; k++) {
    moment = power + (4 * k - 3) * moment;
    moment = power * square + (4 * k - 1) * moment;
    power *= square * square;
    scale /= 4 * n * n;
    const term = (sinhSeries[k] ?? 0) * scale * moment;
    rest += term;
    if (Math.abs(term) < 1e-17 * rest) break;
  }
  const constant = ((ratio * shifted) / Math.sqrt(Math.PI * n)) * Math.exp(0.25 * q);
  return 0.5 * Math.sqrt(-Math.expm1(-q) / Math.PI) * sum + constant * shrunk * rest;
}

/** The q = log(1 + t²/df) beyond which lies the tail p; `least` is below the answer. */
function rootOfTail(p: number, least: number, a: number, ratio: number): number {
  const logP = Math.log(p);
  // Where x = exp(−q) is small the tail is ratio·x^a/(2√π); elsewhere it is nearly normal in √(N·q).
  let q = -(logP + Math.log((2 * Math.sqrt(Math.PI)) / ratio)) / a;
  if (q < 2 && a >= 0.5) {
    const z = normalUpperQuantile(Math.min(0.45, (p * Math.sqrt(a - 0.25)) / (a * ratio)));
    q = (z * z) / (2 * a - 0.5);
  }
  q = Math.max(q, least);
  for (let iteration = 0; iteration < 50; iteration++) {
    const y = -Math.expm1(-q);
    const tail = scaledTail(q, a, ratio);
    const excess = Math.log(tail) - a * q - logP;
    const hazard = (0.5 * a * ratio) / (Math.sqrt(Math.PI * y) * tail);
    const bend = a + 0.5 * (1 / y - 1) - hazard;
    const step = excess / (hazard - 0.5 * bend * excess);
    q = Math.max(q + step, 0.1 * q);
    if (Math.abs(step) < 1e-6 * q) break;
  }
  return q;
}

/** The t/√df up to which the density of t from 0 holds this area; `start` is below the answer. */
function rootOfCentralArea(area: number, start: number, a: number, ratio: number): number {
  const density = (a * ratio) / Math.sqrt(Math.PI);
  let root = start;
  for (let iteration = 0; iteration < 50; iteration++) {
    const q = Math.log1p(root * root);
    const y = -Math.expm1(-q);
    let term = 1;
    let sum = 1;
    for (let k = 0; term > 1e-17 * sum; k++) {
      term *= (y * (a + 0.5 + k)) / (1.5 + k);
      sum += term;
    }
    const found = density * Math.sqrt(y) * Math.exp(-a * q) * sum;
    const step = (area - found) / (density * Math.exp(-(a + 0.5) * q));
    root += step;
    if (Math.abs(step) < 1e-8 * root) break;
  }
  return root;
}
