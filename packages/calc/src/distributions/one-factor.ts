import { normalUpper } from './normal.js';
import { expectation, factorGrid, type Grid, upperHalf } from './one-factor-grid.js';
import { precisionOf, scaleGrid } from './one-factor-scale.js';

/**
 * Statistics Tᵢ = (λᵢZ + √(1 − λᵢ²)·Zᵢ + δᵢ)/S that share one normal value Z and one scale S, df·S² ~ χ²(df):
 * the comparisons of several arms with one control, which correlate by λᵢλⱼ before scaling.
 */
export interface OneFactorT {
  /** λᵢ, each strictly between −1 and 1. */
  loadings: readonly number[];
  /** δᵢ, which may be infinite; all 0 where left out. */
  noncentralities?: readonly number[] | undefined;
  /** Infinity is the multivariate normal distribution. */
  df: number;
}

/**
 * The probability that every statistic lies at or below its limit.
 *
 * *Formula*: E[Π Φ((cᵢS − δᵢ − λᵢZ)/√(1 − λᵢ²))] by trapezoid rules over Z and log S².
 * *Source*: Dunnett 1955, Journal of the American Statistical Association 50:1096.
 * *Accuracy*: absolute 1e-11 (one-factor.json). A loading outside −1…1, df ≤ 0 or NaN gives NaN.
 */
export function probabilityAllBelow(statistics: OneFactorT, limits: readonly number[]): number {
  return probability(statistics, limits, (groups, z, s) => {
    let below = 1;
    for (const group of groups) {
      const one = normalUpper(-standardised(group, z, s));
      for (let k = 0; k < group.members.length; k++) below *= one;
    }
    return below;
  });
}

/**
 * The probability that at least one statistic lies above its limit.
 *
 * *Formula*: the complement of `probabilityAllBelow`, each statistic adding its part of what is left.
 * *Accuracy*: absolute 1e-11, of central statistics relative 1e-9 down to 1e-6 (one-factor.json). NaN as there.
 */
export function probabilityAnyAbove(statistics: OneFactorT, limits: readonly number[]): number {
  return probability(statistics, limits, (groups, z, s) => {
    let above = 0;
    for (const group of groups) {
      const one = normalUpper(standardised(group, z, s));
      for (let k = 0; k < group.members.length; k++) above += one * (1 - above);
    }
    return above;
  });
}

/**
 * The probability that every statistic lies above its limit.
 *
 * *Formula*: E[Π Φ((λᵢZ + δᵢ − cᵢS)/√(1 − λᵢ²))] by trapezoid rules over Z and log S².
 * *Source*, *accuracy*: as `probabilityAllBelow`.
 */
export function probabilityAllAbove(statistics: OneFactorT, limits: readonly number[]): number {
  return probability(statistics, limits, (groups, z, s) => {
    let above = 1;
    for (const group of groups) {
      const one = normalUpper(standardised(group, z, s));
      for (let k = 0; k < group.members.length; k++) above *= one;
    }
    return above;
  });
}

/**
 * The probability that at least one statistic lies beyond its limit in size.
 *
 * *Formula*: as `probabilityAnyAbove`, with both tails of each.
 * *Source*: Dunnett 1964, Biometrics 20:482.
 * *Accuracy*: as `probabilityAnyAbove`.
 */
export function probabilityAnyOutside(statistics: OneFactorT, limits: readonly number[]): number {
  const central = !statistics.noncentralities?.some((centre) => centre !== 0);
  const anyOutside: Combination = (groups, z, s) => {
    let outside = 0;
    for (const { limit, centre, loading, own, members } of groups) {
      const middle = centre + loading * z;
      const one = normalUpper((limit * s - middle) / own) + normalUpper((limit * s + middle) / own);
      for (let k = 0; k < members.length; k++) outside += one * (1 - outside);
    }
    return outside;
  };
  if (!central) return probability(statistics, limits, anyOutside, { eitherWay: true });
  // Neither the signs of the loadings nor that of Z matter then.
  const upright = { loadings: statistics.loadings.map(Math.abs), df: statistics.df };
  return probability(upright, limits, anyOutside, { symmetric: true });
}

/** Statistics alike in loading, noncentrality and limit. */
export interface Alike {
  loading: number;
  /** √(1 − λ²): the share of its own. */
  own: number;
  centre: number;
  limit: number;
  members: number[];
}

/** Statistics that are alike together; undefined where a value is not allowed. */
export function alike(
  { loadings, noncentralities, df }: OneFactorT,
  limits: readonly number[],
): Alike[] | undefined {
  if (!(df > 0)) return undefined;
  const found: Alike[] = [];
  for (let i = 0; i < loadings.length; i++) {
    const loading = loadings[i] as number;
    const centre = noncentralities === undefined ? 0 : (noncentralities[i] as number);
    const limit = limits[i] as number;
    if (!(Math.abs(loading) < 1) || Number.isNaN(centre) || !Number.isFinite(limit)) return undefined;
    const same = found.find(
      (group) => group.loading === loading && group.centre === centre && group.limit === limit,
    );
    if (same) same.members.push(i);
    else found.push({ loading, own: Math.sqrt(1 - loading * loading), centre, limit, members: [i] });
  }
  return found;
}

/** How far the limit lies above the statistic's centre at this Z and S, in SDs of what is its own. */
const standardised = ({ loading, own, centre, limit }: Alike, z: number, s: number) =>
  (limit * s - centre - loading * z) / own;

type Combination = (groups: readonly Alike[], z: number, s: number) => number;

interface Shape {
  /** Limits lie on both sides. */
  eitherWay?: boolean;
  /** What is combined is the same at Z and at −Z. */
  symmetric?: boolean;
}

function probability(
  statistics: OneFactorT,
  limits: readonly number[],
  at: Combination,
  shape: Shape = {},
): number {
  const groups = alike(statistics, limits);
  if (!groups) return Number.NaN;
  const { factor, scale } = gridsFor(statistics, limits, shape.eitherWay);
  const half = shape.symmetric ? upperHalf(factor) : factor;
  const sum = expectation(half, scale, (z, s) => at(groups, z, s));
  return Math.min(1, sum);
}

/** Grids over Z and S for probabilities of these statistics at these limits. */
export function gridsFor(
  { loadings, noncentralities, df }: OneFactorT,
  limits: readonly number[],
  eitherWay = false,
): { factor: Grid; scale: Grid } {
  let largestLimit = 0;
  let smallestLimit = Infinity;
  for (const limit of limits) {
    largestLimit = Math.max(largestLimit, Math.abs(limit));
    smallestLimit = Math.min(smallestLimit, Math.abs(limit));
  }
  return {
    factor: factorGrid(loadings),
    scale: scaleGrid(df, {
      largestLimit,
      smallestLimit,
      noncentralities: (noncentralities ?? []).filter(Number.isFinite).map(Math.abs),
      precision: precisionOf(loadings, eitherWay),
    }),
  };
}
