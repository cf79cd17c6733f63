import { CalcError } from '../errors.js';
import type { BinaryOutcome, Hypothesis } from '../request.js';
import type { OutcomeModel } from './outcome-model.js';

const spread = (p: number) => p * (1 - p);
const angle = (p: number) => 2 * Math.asin(Math.sqrt(p));

/**
 * Two proportions: pooled (the default), unpooled, continuity-corrected, or on the arcsine scale; unpooled
 * against a margin, since pooling assumes that there is no difference.
 *
 * Formula: pooled SE₀² = p̄q̄(1/n₀ + 1/n₁), SE₁² = p₀q₀/n₀ + p₁q₁/n₁; correction (1/n₀ + 1/n₁)/2;
 * arcsine 2 asin√p₁ − 2 asin√p₀ with variance 1/n₀ + 1/n₁. Dilution shrinks p₁ − p₀ and so moves p₁.
 * Source: Fleiss, Levin & Paik 2003; Casagrande, Pike & Smith 1978; Fleiss, Tytun & Ury 1980; Cohen 1988;
 * Blackwelder 1982, Control Clin Trials 3:345, for a margin.
 * Units: proportions.
 * Throws CalcError `unsupported` for a method stated outside superiority.
 */
export function binaryModel(outcome: BinaryOutcome, dilution: number, hypothesis: Hypothesis): OutcomeModel {
  const p0 = outcome.control;
  if (outcome.method !== undefined && hypothesis !== 'superiority') {
    throw new CalcError(
      'unsupported',
      'outcome.method',
      'Against a margin proportions are compared with their unpooled variances; leave the method out.',
    );
  }
  const method = outcome.method ?? (hypothesis === 'superiority' ? 'pooled' : 'unpooled');
  const at = (target: number): OutcomeModel => {
    const p1 = p0 + (target - p0) * dilution;
    const arcsine = method === 'arcsine';
    const model: OutcomeModel = {
      kind: 'binary',
      target,
      targetPath: 'outcome.active',
      refuseTarget: (proportion) =>
        proportion > 0 && proportion < 1
          ? undefined
          : 'The active proportion must lie between 0 and 1, both excluded.',
      nullTarget: p0,
      targetLimit: target > p0 ? 1 : 0,
      proportions: [p0, p1],
      effect: arcsine ? angle(p1) - angle(p0) : p1 - p0,
      dilution,
      variances: arcsine ? [1, 1] : [spread(p0), spread(p1)],
      reference: 'normal',
      unequalVariances: false,
      covariates: 0,
      varianceFixed: false,
      at,
    };
    if (method === 'pooled' || method === 'continuity-corrected') {
      model.nullVariance = (n0, n1) => spread((n0 * p0 + n1 * p1) / (n0 + n1)) * (1 / n0 + 1 / n1);
    }
    if (method === 'continuity-corrected') model.correction = (n0, n1) => (1 / n0 + 1 / n1) / 2;
    return model;
  };
  return at(outcome.active);
}
