/** Nodes and weights of a sum that stands for an expectation over a shared normal value or scale. */
export interface Grid {
  nodes: Float64Array;
  weights: Float64Array;
}

/** −log of the error that the step of a trapezoid rule allows for. */
export const digits = 30;

/** Less than 1e-18 of the normal distribution lies beyond. */
const normalReach = 9;

/**
 * A trapezoid rule over the normal value z that statistics with these loadings share.
 *
 * *Formula*: step 2π/√(2·30·B), B = 1 + Σ λ²/(1 − λ²). Moved off the real line by iη, a probability at a given z
 * times the normal density grows by exp(½B·η²) at most, so that its Fourier transform at ω has fallen to
 * exp(−ω²/(2B)) of its integral: the error is below 2·exp(−30) of the result.
 * *Source*: Trefethen & Weideman 2014, SIAM Review 56:385, theorem 5.1.
 */
export function factorGrid(loadings: readonly number[]): Grid {
  const spread = loadings.reduce((sum, loading) => sum + loading ** 2 / (1 - loading ** 2), 1);
  const step = (2 * Math.PI) / Math.sqrt(2 * digits * spread);
  const each = Math.ceil(normalReach / step);
  const nodes = new Float64Array(2 * each + 1);
  const weights = new Float64Array(2 * each + 1);
  for (let k = -each; k <= each; k++) {
    const z = k * step;
    nodes[k + each] = z;
    weights[k + each] = (step * Math.exp(-0.5 * z * z)) / Math.sqrt(2 * Math.PI);
  }
  return { nodes, weights };
}

/** The half of such a rule from 0 up, for what is the same at z and at −z. */
export function upperHalf({ nodes, weights }: Grid): Grid {
  const middle = nodes.length >> 1;
  return {
    nodes: nodes.slice(middle),
    weights: weights.slice(middle).map((weight, k) => (k === 0 ? weight : 2 * weight)),
  };
}

/** Pairs of nodes with less weight than this are passed over. */
const leastWeight = 1e-18;

/** The expectation over both grids of what `at` gives. */
export function expectation(factor: Grid, scale: Grid, at: (z: number, s: number) => number): number {
  const { nodes, weights } = factor;
  let sum = 0;
  for (let j = 0; j < scale.nodes.length; j++) {
    const s = scale.nodes[j] as number;
    const weight = scale.weights[j] as number;
    const { from, to } = heavy(weights, leastWeight / weight);
    let inner = 0;
    for (let k = from; k < to; k++) inner += (weights[k] as number) * at(nodes[k] as number, s);
    sum += weight * inner;
  }
  return sum;
}

/** The expectations over both grids of the values that `at` writes, to an absolute 1e-12. */
export function expectations(
  factor: Grid,
  scale: Grid,
  count: number,
  at: (z: number, s: number, values: Float64Array) => void,
): Float64Array {
  const sums = new Float64Array(count);
  const values = new Float64Array(count);
  for (let j = 0; j < scale.nodes.length; j++) {
    const s = scale.nodes[j] as number;
    const { from, to } = heavy(factor.weights, (1e4 * leastWeight) / (scale.weights[j] as number));
    for (let k = from; k < to; k++) {
      at(factor.nodes[k] as number, s, values);
      const weight = (scale.weights[j] as number) * (factor.weights[k] as number);
      for (let i = 0; i < count; i++) sums[i] = (sums[i] as number) + weight * (values[i] as number);
    }
  }
  return sums;
}

/** The range of nodes that weigh at least so much: all beyond, on either side, weigh less. */
function heavy(weights: Float64Array, least: number): { from: number; to: number } {
  let from = 0;
  let to = weights.length;
  while (from < to && (weights[to - 1] as number) < least) to -= 1;
  while (from < to && (weights[from] as number) < least) from += 1;
  return { from, to };
}
