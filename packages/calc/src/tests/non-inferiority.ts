import { withoutNoise } from './margin.js';
import { noncentralityNeeded, powerBeyond } from './one-bound.js';
import type { SingleTest } from './single-test.js';

/**
 * Not worse than control by the margin; `direction` is +1 where a positive effect is a benefit, −1 where a harm.
 *
 * *Formula*: superiority with direction·δ + margin in place of |δ|.
 * *Source*: Julious 2004, Stat Med 23:1921; Blackwelder 1982, Control Clin Trials 3:345.
 * *Units*: effect and margin on the analysis scale (logs of ratios).
 */
export function nonInferiority(margin: number, direction: 1 | -1): SingleTest {
  const distance = (effect: number) => withoutNoise(direction * effect + margin, margin);
  return {
    distance,
    power: (contrast, critical, df) => powerBeyond(distance(contrast.effect), contrast, critical, df),
    noncentralityNeeded,
  };
}
