import type { Comparisons, Hypothesis } from '../../request.js';
import type { Analysis } from '../analysis.js';
import type { Multiplicity } from './multiplicity.js';
import { allExceed, anyExceeds, jointStatistics } from './shared-control.js';

/**
 * All comparisons at one critical value, whether one of them rejects or not: unadjusted, Bonferroni's or Dunnett's.
 *
 * *Formula*: each by itself; disjunctive 1 − P(all Tᵢ ≤ c), conjunctive P(all Tᵢ > c).
 * *Source*: Dunnett 1955, Journal of the American Statistical Association 50:1096; Senn & Bretz 2007, Pharmaceutical
 * Statistics 6:161 (the goals).
 */
export function singleStep(
  hypothesis: Hypothesis,
  powerGoal: Comparisons['powerGoal'],
  criticalValue: (analysis: Analysis) => number,
  alphaPerComparison?: number,
): Multiplicity {
  return {
    ...(alphaPerComparison === undefined ? {} : { alphaPerComparison }),
    separate: powerGoal === 'per-comparison',
    criticalValue,
    powers(analysis, critical, test) {
      const each = analysis.contrasts.map((contrast) => test.power(contrast, critical, analysis.df));
      if (powerGoal === 'per-comparison') return { each, goal: Math.min(...each) };
      const statistics = jointStatistics(analysis, hypothesis, test);
      const goal = powerGoal === 'disjunctive' ? anyExceeds : allExceed;
      return { each, goal: goal(statistics, critical) };
    },
    joint(analysis, critical, test) {
      if (analysis.contrasts.some(({ loading }) => loading === undefined)) return undefined;
      const statistics = jointStatistics(analysis, hypothesis, test);
      return { disjunctive: anyExceeds(statistics, critical), conjunctive: allExceed(statistics, critical) };
    },
  };
}
