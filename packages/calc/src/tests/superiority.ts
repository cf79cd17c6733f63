import { noncentralityFor, noncentralTUpper } from '../distributions/noncentral-t.js';
import { normalCdf, normalQuantile, normalUpperQuantile } from '../distributions/normal.js';
import { studentTUpperQuantile } from '../distributions/student-t.js';
import type { Contrast } from './analysis.js';

/** The value a test statistic must exceed, at `alpha` in one tail; df null is the normal distribution. */
export function criticalValue(tailAlpha: number, df: number | null): number {
  return df === null ? normalUpperQuantile(tailAlpha) : studentTUpperQuantile(tailAlpha, df);
}

/**
 * Chance that a superiority test rejects in the hypothesised direction.
 *
 * Formula: with df P(T′(df, |δ|/SE) > c); without Φ((|δ| − correction − c·SE₀)/SE₁), SE₀ = SE₁ unless stated.
 * Source: Julious 2004, Stat Med 23:1921; Fleiss, Levin & Paik 2003 for SE₀.
 */
export function superiorityPower(contrast: Contrast, critical: number, df: number | null): number {
  const { standardError, nullStandardError = standardError, correction = 0 } = contrast;
  const effect = Math.abs(contrast.effect);
  if (df !== null) return standardError === 0 ? 1 : noncentralTUpper(critical, df, effect / standardError);
  const surplus = effect - correction - critical * nullStandardError;
  return standardError === 0 ? (surplus > 0 ? 1 : 0) : normalCdf(surplus / standardError);
}

/** The |δ|/SE₁ at which the test has `power`, leaving a continuity correction aside. */
export function noncentralityNeeded(
  contrast: Contrast,
  critical: number,
  df: number | null,
  power: number,
): number {
  if (df !== null) return noncentralityFor(power, critical, df);
  const { standardError, nullStandardError = standardError } = contrast;
  return (critical * nullStandardError) / standardError + normalQuantile(power);
}
