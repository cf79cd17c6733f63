import type { Comparisons } from '../request.js';

export interface ComparedArms {
  arm: number;
  versus: number;
  /** One of several arms compared with the one control, so that the comparisons correlate. */
  sharesControl: boolean;
}

/** Each active arm with control, or every pair of arms: those with control first. */
export function comparedArms(arms: number, against: Comparisons['against'] = 'control'): ComparedArms[] {
  const pairs: ComparedArms[] = [];
  const references = against === 'control' ? 1 : arms - 1;
  for (let versus = 0; versus < references; versus++) {
    for (let arm = versus + 1; arm < arms; arm++) {
      pairs.push({ arm, versus, sharesControl: against === 'control' && arms > 2 });
    }
  }
  return pairs;
}

/**
 * How a comparison with control loads on the control's mean: two of them correlate by the product of theirs.
 *
 * *Formula*: √(n₁/(n₁ + n₀)). *Source*: Dunnett 1955, Journal of the American Statistical Association 50:1096.
 */
export const loadingOnControl = (control: number, active: number) => Math.sqrt(active / (active + control));
