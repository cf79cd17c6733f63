import { CalcError } from '../errors.js';
import type { ContinuousOutcome } from '../request.js';
import type { OutcomeModel } from './outcome-model.js';

/**
 * The share of σ² left when the mean of m follow-ups is adjusted for the mean of p baselines.
 *
 * Formula: (1 + (m−1)ρ)/m − pρ²/(1 + (p−1)ρ); 1 − ρ² for one of each.
 * Source: Frison & Pocock 1992, Stat Med 11:1685; Borm, Fransen & Lemmens 2007, J Clin Epidemiol 60:1234.
 * Throws CalcError `impossible-correlation` where p + m measurements cannot all be correlated so.
 */
export function repeatedMeasuresFactor(repeated: NonNullable<ContinuousOutcome['repeated']>): number {
  const { baselines: p, followUps: m, correlation: rho } = repeated;
  if (rho <= -1 / (p + m - 1)) {
    throw new CalcError(
      'impossible-correlation',
      'outcome.repeated.correlation',
      `${p + m} measurements cannot all have a correlation of ${rho} with each other; it must be above ${(-1 / (p + m - 1)).toPrecision(3)}.`,
    );
  }
  const followUpVariance = (1 + (m - 1) * rho) / m;
  return p === 0 ? followUpVariance : followUpVariance - (p * rho * rho) / (1 + (p - 1) * rho);
}

/**
 * A mean difference, with a common or unequal SD, or adjusted for baselines.
 *
 * Units: the outcome's own. Source: Julious 2004, Stat Med 23:1921; Welch 1947 for unequal SDs.
 * Throws CalcError `unsupported` when unequal SDs and repeated measurements are combined.
 */
export function continuousModel(outcome: ContinuousOutcome, dilution: number): OutcomeModel {
  const { sd, sdActive, repeated } = outcome;
  if (sdActive !== undefined && repeated) {
    throw new CalcError(
      'unsupported',
      'outcome.sdActive',
      'Unequal SDs and repeated measurements exclude each other.',
    );
  }
  const factor = repeated ? repeatedMeasuresFactor(repeated) : 1;
  const variances = [sd * sd * factor, (sdActive ?? sd) ** 2 * factor] as const;
  const at = (target: number): OutcomeModel => ({
    kind: 'continuous',
    target,
    targetPath: 'outcome.difference',
    nullTarget: 0,
    targetLimit: Math.sign(outcome.difference || 1) * Number.POSITIVE_INFINITY,
    effect: target * dilution,
    dilution,
    variances,
    reference: 't',
    unequalVariances: sdActive !== undefined,
    covariates: repeated && repeated.baselines > 0 ? 1 : 0,
    varianceFixed: true,
    at,
  });
  return at(outcome.difference);
}
