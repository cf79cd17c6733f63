import { gaussLegendre } from '../numeric/quadrature.js';
import { exponentialRemainder } from '../numeric/remainders.js';
import { digits, type Grid } from './one-factor-grid.js';
import { stirlingError } from './stirling.js';

/** −log of the least weight of a scale that is taken in. */
const scaleDepth = 40;

/** What decides how sharply a probability changes with the scale. */
export interface Sharpness {
  /** The largest and the smallest limit in size. */
  largestLimit: number;
  smallestLimit: number;
  /** The noncentralities in size, all finite. */
  noncentralities: readonly number[];
  /** How sharply all limits together cut the distribution as they move: see `precisionOf`. */
  precision: number;
}

/**
 * 1ᵀR⁻¹1 of the correlations λᵢλⱼ; with `eitherWay` the most that σᵀR⁻¹σ can be for any signs σ, as where limits lie on
 * both sides.
 *
 * *Source*: Sherman & Morrison 1950, Annals of Mathematical Statistics 21:124.
 */
export function precisionOf(loadings: readonly number[], eitherWay = false): number {
  let own = 0;
  let cross = 0;
  let shared = 1;
  for (const loading of loadings) {
    const rest = 1 - loading * loading;
    own += 1 / rest;
    cross += loading / rest;
    shared += (loading * loading) / rest;
  }
  return eitherWay ? own : own - (cross * cross) / shared;
}

/** More nodes than this are spent on panels instead, which resolve a probability of moderate precision. */
const mostSteps = 700;
const mostPrecision = 20;

/**
 * A rule over the scale s = √(V/df), V ~ χ²(df), on y = log s²; the one node 1 for df = Infinity.
 *
 * *Formula*: the trapezoid rule with step 2πθ/(30 + g(θ)) at the angle θ that makes it largest, where the integrand
 * grows by exp(g(θ)) at most when y is moved off the real line by iθ, see `growth`; Gauss–Legendre in panels where
 * limits and noncentralities are so large that a probability changes too abruptly for that.
 * *Source*: Trefethen & Weideman 2014, SIAM Review 56:385, theorem 5.1.
 */
export function scaleGrid(df: number, sharpness: Sharpness): Grid {
  if (df === Infinity) return { nodes: Float64Array.of(1), weights: Float64Array.of(1) };
  const a = 0.5 * df;
  const constant = Math.sqrt(a / (2 * Math.PI)) * Math.exp(-stirlingError(a));
  const nodes: number[] = [];
  const weights: number[] = [];
  const add = (y: number, width: number) => {
    nodes.push(Math.exp(0.5 * y));
    weights.push(width * constant * Math.exp(-a * exponentialRemainder(y)));
  };
  const lowest = -(a > 3 * scaleDepth ? Math.sqrt((3 * scaleDepth) / a) : scaleDepth / a + 1);
  const highest = Math.log1p(scaleDepth / a + Math.sqrt((2 * scaleDepth) / a));
  const step = scaleStep(a, sharpness);
  if (highest - lowest > mostSteps * step && sharpness.precision <= mostPrecision) {
    const longest = Math.min(1, 2 * Math.sqrt(2 / a));
    for (const [from, to] of panelsOf(lowest, highest, longest, sharpness)) {
      const half = 0.5 * (to - from);
      for (let i = 0; i < rule.nodes.length; i++) {
        add(from + half * (1 + (rule.nodes[i] as number)), half * (rule.weights[i] as number));
      }
    }
  } else {
    for (let k = Math.ceil(lowest / step); k * step <= highest; k++) {
      if (a * exponentialRemainder(k * step) <= scaleDepth) add(k * step, step);
    }
  }
  return { nodes: Float64Array.from(nodes), weights: Float64Array.from(weights) };
}

const rule = /* @__PURE__ */ gaussLegendre(16);

/** Panels of y no longer than this, cut where a limit is within 9 of a noncentrality. */
function panelsOf(
  lowest: number,
  highest: number,
  longest: number,
  { largestLimit, smallestLimit, noncentralities }: Sharpness,
): [number, number][] {
  const edges = [highest];
  for (let y = lowest; y < highest; y += longest) edges.push(y);
  for (const centre of new Set([0, ...noncentralities])) {
    for (const limit of new Set([smallestLimit, largestLimit])) {
      for (let k = -9; k <= 9; k += 1.5) {
        const y = 2 * Math.log((centre + k) / limit);
        if (y > lowest && y < highest) edges.push(y);
      }
    }
  }
  edges.sort((one, other) => one - other);
  return edges.slice(1).map((edge, index) => [edges[index] as number, edge]);
}

/** Angles are tried from the widest, each so much less than the one before. */
const widestAngle = 1.4;
const angleRatio = 0.8;
const anglesTried = 24;

function scaleStep(a: number, sharpness: Sharpness): number {
  const { largestLimit, smallestLimit, noncentralities, precision } = sharpness;
  const noncentrality = Math.max(0, ...noncentralities);
  let widest = 0;
  let angle = Math.min(widestAngle, 3 * Math.sqrt((2 * digits) / a));
  for (let tried = 0; tried < anglesTried; tried++, angle *= angleRatio) {
    const most = Math.max(
      -a * Math.log(Math.cos(angle)),
      growth(angle, a, precision * largestLimit ** 2, smallestLimit, noncentrality),
    );
    const step = (2 * Math.PI * angle) / (digits + most);
    if (step > widest) widest = step;
  }
  return widest;
}

/**
 * How far, in logarithms, the probability of exceeding a limit, times the χ² density, can grow where y is moved off the
 * real line by iθ; the χ² density by itself grows by −a·log(cos θ).
 *
 * *Formula*: the largest over s of −a(s²·cos θ − 1 − 2 log s) + ½A(s·sin ½θ)² − ½(c·s·cos ½θ − δ)₊²: the χ² density,
 * the growth exp(½vᵀR⁻¹v) of a normal probability at limits moved by iv, A = cᵀR⁻¹c, and its fall beyond the
 * noncentrality δ.
 */
function growth(
  angle: number,
  a: number,
  square: number,
  smallestLimit: number,
  noncentrality: number,
): number {
  const rise = 0.5 * square * Math.sin(0.5 * angle) ** 2 - a * Math.cos(angle);
  const limit = smallestLimit * Math.cos(0.5 * angle);
  const at = (s: number) =>
    s * s * rise + a + 2 * a * Math.log(s) - 0.5 * Math.max(0, limit * s - noncentrality) ** 2;
  const below = rise < 0 ? Math.sqrt(-a / rise) : Infinity;
  if (limit * below <= noncentrality) return at(below);
  const curvature = 0.5 * limit * limit - rise;
  if (curvature <= 0) return Infinity;
  const pull = limit * noncentrality;
  return at((pull + Math.sqrt(pull * pull + 16 * a * curvature)) / (4 * curvature));
}
