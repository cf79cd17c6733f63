import {
  product,
  type SquareMatrix,
  squareMatrix,
  symmetricEigen,
  zeroMatrix,
} from '../../numeric/linear-algebra.js';
import { exponentialRemainder } from '../../numeric/remainders.js';

export interface Correlations {
  icc: number;
  cac: number;
  decay?: boolean | undefined;
  iac?: number | undefined;
  clusterSizeCv?: number | undefined;
}

/**
 * The expected inverse covariance of the period means of one cluster, for σ = 1, at any mean cluster size;
 * an infinite size gives the limit, which must not be singular.
 */
export type PrecisionAt = (clusterSize: number) => SquareMatrix;

/**
 * The expected inverse covariance of a cluster's means in the periods it is measured.
 *
 * *Formula*: E[(ρR + (1−ρ)/M·Q)⁻¹] over the cluster's size M; R has 1 on the diagonal and cac, or cac^|s−t|, off
 * it, Q has 1 and iac. With R·u = λQ·u and u′Q·u = 1 this is Σ u·u′·E[1/(ρλ + (1−ρ)/M)].
 * *Source*: Hooper, Teerenstra, de Hoop & Eldridge 2016, Stat Med 35:4718; Kasza, Hemming, Hooper, Matthews &
 * Forbes 2019, Stat Methods Med Res 28:703, for the decay.
 * *Accuracy*: relative 1e-12 where R and Q are well conditioned (information.test.ts).
 */
export function precisionOver(periods: readonly number[], correlations: Correlations): PrecisionAt {
  const { icc, cac, decay = false, iac = 0 } = correlations;
  const sizes = sizeRule(correlations.clusterSizeCv ?? 0);
  const weight = (lambda: number, q: number) => (clusterSize: number) =>
    expectedPrecision(icc * lambda, (1 - icc) * q, clusterSize, sizes);
  return decay
    ? decayingPrecision(periods, cac, iac, weight)
    : exchangeablePrecision(periods.length, cac, iac, weight);
}

/** What the mean of a cluster over this many periods tells where the cluster autocorrelation does not decay. */
export function meanPrecision(count: number, correlations: Correlations): (clusterSize: number) => number {
  const { icc, cac, iac = 0 } = correlations;
  const sizes = sizeRule(correlations.clusterSizeCv ?? 0);
  return (clusterSize) =>
    count *
    expectedPrecision(icc * (1 + (count - 1) * cac), (1 - icc) * (1 + (count - 1) * iac), clusterSize, sizes);
}

type Weight = (lambda: number, q: number) => (clusterSize: number) => number;

/** Constant autocorrelations: the cluster's mean has one variance, every contrast of its periods another. */
function exchangeablePrecision(count: number, cac: number, iac: number, weight: Weight): PrecisionAt {
  const meanWeight = weight(1 + (count - 1) * cac, 1 + (count - 1) * iac);
  const contrastWeight = weight(1 - cac, 1 - iac);
  return (clusterSize) => {
    const precision = zeroMatrix(count);
    const contrast = count > 1 ? contrastWeight(clusterSize) : 0;
    precision.entries.fill((meanWeight(clusterSize) - contrast) / count);
    for (let i = 0; i < count; i += 1) {
      const at = i * count + i;
      precision.entries[at] = (precision.entries[at] as number) + contrast;
    }
    return precision;
  };
}

function decayingPrecision(
  periods: readonly number[],
  cac: number,
  iac: number,
  weight: Weight,
): PrecisionAt {
  const count = periods.length;
  const between = squareMatrix(
    count,
    (i, j) => cac ** Math.abs((periods[i] as number) - (periods[j] as number)),
  );
  // Q^(−1/2) = (I − J/n)/√(1 − iac) + (J/n)/√(1 + (n − 1)·iac)
  const onContrasts = 1 / Math.sqrt(1 - iac);
  const onMean = 1 / Math.sqrt(1 + (count - 1) * iac);
  const root = squareMatrix(count, (i, j) => (onMean - onContrasts) / count + (i === j ? onContrasts : 0));
  const { values, vectors } = symmetricEigen(product(product(root, between), root));
  const { entries: u } = product(root, vectors);
  // No eigenvalue is smaller, whatever rounding says: Grenander & Szegő 1958 for R, and Q's largest is 1 + (n−1)·iac.
  const smallest = ((1 - cac) / (1 + cac)) * onMean * onMean;
  const weights = values.map((lambda) => weight(Math.max(lambda, smallest), 1));
  return (clusterSize) => {
    const precision = zeroMatrix(count);
    weights.forEach((weightAt, k) => {
      const value = weightAt(clusterSize);
      for (let i = 0; i < count; i += 1) {
        const scaled = value * (u[i * count + k] as number);
        for (let j = 0; j < count; j += 1) {
          const at = i * count + j;
          precision.entries[at] = (precision.entries[at] as number) + scaled * (u[j * count + k] as number);
        }
      }
    });
    return precision;
  };
}

/** Sizes relative to their mean, as members of clusters see them, and their weights. */
export interface SizeRule {
  sizes: readonly number[];
  weights: readonly number[];
}

/** −log of the weight left out at either end: clusters far below the mean weigh most in a mean of 1/(w + b·M). */
const depth = 60;

/**
 * Cluster sizes seen by their members: gamma with mean 1 and this CV, each size weighted by itself, which is
 * gamma again.
 *
 * *Formula*: with k = 1/cv² the size is (1 + cv²)·e^v, v having density ∝ exp(−(k+1)(e^v − 1 − v)), summed by the
 * trapezoid rule on v, which converges faster than any power of its step.
 * *Source*: Trefethen & Weideman 2014, SIAM Review 56:385.
 * *Accuracy*: relative 1e-13 in `expectedPrecision` (expected-precision.json).
 */
export function sizeRule(cv: number): SizeRule {
  // Below this a CV changes nothing in double precision, and its shape has no end.
  if (cv < 1e-8) return { sizes: [1], weights: [1] };
  const shape = 1 + 1 / (cv * cv);
  const step = 0.3 / Math.sqrt(shape);
  const sizes: number[] = [];
  const weights: number[] = [];
  for (const direction of [-1, 1]) {
    for (let k = direction < 0 ? 1 : 0; ; k += 1) {
      const v = direction * k * step;
      const exponent = shape * exponentialRemainder(v);
      if (exponent > depth) break;
      sizes.push((1 + cv * cv) * Math.exp(v));
      weights.push(Math.exp(-exponent));
    }
  }
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  return { sizes, weights: weights.map((weight) => weight / total) };
}

/**
 * What clusters of varying size tell on average of a mean whose variance is b + w/M.
 *
 * *Formula*: E[1/(b + w/M)] = m·E⁺[1/(w + b·m·S)], S the size over its mean m seen by members; 1/b in the limit.
 * *Units*: variances between and within clusters; infinite where both are 0.
 */
export function expectedPrecision(
  between: number,
  within: number,
  clusterSize: number,
  { sizes, weights }: SizeRule,
): number {
  if (clusterSize === Number.POSITIVE_INFINITY || within === 0) return 1 / between;
  let sum = 0;
  for (let i = 0; i < sizes.length; i += 1) {
    sum += (weights[i] as number) / (within + between * clusterSize * (sizes[i] as number));
  }
  return clusterSize * sum;
}
