import type { Comparisons, Hypothesis } from '../../request.js';
import { criticalValue } from '../one-bound.js';
import type { Multiplicity } from './multiplicity.js';
import { allExceed, jointStatistics } from './shared-control.js';

/**
 * Each comparison at the whole type I error, in the order given, until one fails.
 *
 * *Formula*: comparison i rejects with P(T₁ > c, …, Tᵢ > c); any does where the first does, all where the last does.
 * *Source*: Maurer, Hothorn & Lehmacher 1995, Biometrie in der chemisch-pharmazeutischen Industrie 6:3; Westfall &
 * Krishen 2001, Journal of Statistical Planning and Inference 99:25.
 */
export function fixedSequence(
  hypothesis: Hypothesis,
  powerGoal: Comparisons['powerGoal'],
  alpha: number,
  sides: 1 | 2,
): Multiplicity {
  const powers: Multiplicity['powers'] = (analysis, critical, test) => {
    const { loadings, noncentralities, df } = jointStatistics(analysis, hypothesis, test);
    const each = loadings.map((_, last) =>
      allExceed(
        { loadings: loadings.slice(0, last + 1), noncentralities: noncentralities?.slice(0, last + 1), df },
        critical,
      ),
    );
    const [first = 0] = each;
    return { each, goal: powerGoal === 'disjunctive' ? first : (each.at(-1) as number) };
  };
  return {
    alphaPerComparison: alpha,
    separate: false,
    criticalValue: ({ df }) => criticalValue(alpha / sides, df),
    powers,
    joint(analysis, critical, test) {
      const { each } = powers(analysis, critical, test);
      return { disjunctive: each[0] as number, conjunctive: each.at(-1) as number };
    },
  };
}
