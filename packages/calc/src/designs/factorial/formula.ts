import type { FactorialDesign } from './schema.js';

/** Sums of cell means, each with its weight, that make the estimand: cells control, A, B and AB. */
const weights: Record<FactorialDesign['estimand'], readonly number[]> = {
  'main-effect': [-1 / 2, 1 / 2, -1 / 2, 1 / 2],
  interaction: [1, -1, -1, 1],
};

/**
 * Variance factor of a 2 × 2 factorial's estimand: its SE is σ times the root of this.
 *
 * Formula: Σ w²/n over the cells, which is 4/N for a main effect and 16/N for the interaction in equal cells.
 * Source: Brookes, Whitely, Egger, Davey Smith, Mulheran & Peters 2004, J Clin Epidemiol 57:229.
 * Units: participants analysed in each cell.
 */
export function varianceFactor(estimand: FactorialDesign['estimand'], cells: readonly number[]): number {
  return weights[estimand].reduce((sum, weight, cell) => sum + weight ** 2 / (cells[cell] as number), 0);
}
