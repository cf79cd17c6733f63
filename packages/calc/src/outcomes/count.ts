import type { CountOutcome } from '../request.js';
import type { OutcomeModel } from './outcome-model.js';
import { ratioModel } from './ratio.js';

/**
 * A ratio of event rates, each participant counted over one exposure: Poisson, or negative binomial with a
 * dispersion.
 *
 * *Formula*: SE² = (1/(tλ₀) + k)/n₀ + (1/(tλ₁) + k)/n₁, k = 0 for Poisson.
 * *Source*: Zhu & Lakkis 2014, Stat Med 33:376.
 * *Units*: effect log rate ratio; rate per unit of exposure; dispersion k with variance μ + kμ².
 */
export function countModel(
  { controlRate, rateRatio, exposure, dispersion = 0 }: CountOutcome,
  dilution: number,
): OutcomeModel {
  const target = {
    kind: 'count',
    name: 'rate ratio',
    path: 'outcome.rateRatio',
    ratio: rateRatio,
  } as const;
  const control = exposure * controlRate;
  return ratioModel(target, dilution, (logRatio) => {
    const active = control * Math.exp(logRatio);
    return {
      variances: [1 / control + dispersion, 1 / active + dispersion],
      expectedCounts: [control, active],
    };
  });
}
