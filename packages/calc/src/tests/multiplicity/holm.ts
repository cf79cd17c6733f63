import { stepDown } from '../../distributions/one-factor-step-down.js';
import type { Comparisons, Hypothesis } from '../../request.js';
import type { Analysis } from '../analysis.js';
import { criticalValue } from '../one-bound.js';
import type { Multiplicity } from './multiplicity.js';
import { anyExceeds, jointStatistics } from './shared-control.js';

/**
 * Holm's test: the largest statistic at α/K, the next at α/(K − 1), and so on to α, until one fails.
 *
 * *Formula*: any comparison rejects where the largest does at α/K, as by Bonferroni's inequality; each, and all, by
 * enumeration of the order, see `stepDown`.
 * *Source*: Holm 1979, Scandinavian Journal of Statistics 6:65.
 */
export function holm(
  hypothesis: Hypothesis,
  powerGoal: Comparisons['powerGoal'],
  alpha: number,
  sides: 1 | 2,
): Multiplicity {
  const steps = ({ df, contrasts }: Analysis) =>
    contrasts.map((_, step) => criticalValue(alpha / (contrasts.length - step) / sides, df));
  return {
    separate: false,
    criticalValue: ({ df, contrasts }) => criticalValue(alpha / contrasts.length / sides, df),
    powers(analysis, critical, test) {
      const statistics = jointStatistics(analysis, hypothesis, test);
      const { each, all } = stepDown(statistics, steps(analysis));
      if (powerGoal === 'disjunctive') return { each, goal: anyExceeds(statistics, critical) };
      return { each, goal: powerGoal === 'conjunctive' ? all : Math.min(...each) };
    },
    joint(analysis, critical, test) {
      const statistics = jointStatistics(analysis, hypothesis, test);
      const { all } = stepDown(statistics, steps(analysis));
      return { disjunctive: anyExceeds(statistics, critical), conjunctive: all };
    },
  };
}
