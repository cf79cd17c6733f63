import { dunnettCriticalValue } from '../../distributions/dunnett.js';
import type { Comparisons, Hypothesis } from '../../request.js';
import type { Analysis } from '../analysis.js';
import type { Multiplicity } from './multiplicity.js';
import { orientedLoadings } from './shared-control.js';
import { singleStep } from './single-step.js';

/**
 * Dunnett's test of each comparison with the control: the type I error of all together is exactly `alpha`.
 *
 * *Source*: Dunnett 1955, Journal of the American Statistical Association 50:1096; two-sided Dunnett 1964,
 * Biometrics 20:482.
 */
export function dunnett(
  hypothesis: Hypothesis,
  powerGoal: Comparisons['powerGoal'],
  alpha: number,
  sides: 1 | 2,
): Multiplicity {
  let last: { loadings: readonly number[]; df: number; value: number } | undefined;
  const criticalValue = (analysis: Analysis) => {
    const loadings = orientedLoadings(analysis, hypothesis);
    const df = analysis.df ?? Infinity;
    // A search for an effect asks again and again at one size.
    if (!last || last.df !== df || loadings.some((loading, index) => loading !== last?.loadings[index])) {
      last = { loadings, df, value: dunnettCriticalValue(alpha, sides, loadings, df) };
    }
    return last.value;
  };
  return singleStep(hypothesis, powerGoal, criticalValue);
}
