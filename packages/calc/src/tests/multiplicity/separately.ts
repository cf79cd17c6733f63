import { criticalValue } from '../one-bound.js';
import type { Multiplicity } from './multiplicity.js';

/** Each comparison by itself at its share of the type I error: α unadjusted, α/C by Bonferroni's inequality. */
export function separately(alpha: number, sides: 1 | 2): Multiplicity {
  return {
    alphaPerComparison: alpha,
    separate: true,
    criticalValue: ({ df }) => criticalValue(alpha / sides, df),
    powers: ({ df, contrasts }, critical, test) => {
      const each = contrasts.map((contrast) => test.power(contrast, critical, df));
      return { each, goal: Math.min(...each) };
    },
  };
}
