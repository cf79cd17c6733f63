import { noncentralityFor, noncentralTUpper } from '../distributions/noncentral-t.js';
import { normalCdf, normalQuantile, normalUpperQuantile } from '../distributions/normal.js';
import { studentTUpperQuantile } from '../distributions/student-t.js';
import type { Contrast } from './analysis.js';

/** The value a test statistic must exceed, at `alpha` in one tail; df null is the normal distribution. */
export function criticalValue(tailAlpha: number, df: number | null): number {
  return df === null ? normalUpperQuantile(tailAlpha) : studentTUpperQuantile(tailAlpha, df);
}

/**
 * Chance that a statistic centred `distance` standard errors' worth beyond its bound exceeds the critical value.
 *
 * *Formula*: with df P(T′(df, d/SE) > c); without Φ((d − correction − c·SE₀)/SE₁), SE₀ = SE₁ unless stated.
 * *Source*: Julious 2004, Stat Med 23:1921; Fleiss, Levin & Paik 2003 for SE₀.
 */
export function powerBeyond(
  distance: number,
  { standardError, nullStandardError = standardError, correction = 0 }: Contrast,
  critical: number,
  df: number | null,
): number {
  if (df !== null) {
    if (standardError === 0) return distance > 0 ? 1 : 0;
    return noncentralTUpper(critical, df, distance / standardError);
  }
  const surplus = distance - correction - critical * nullStandardError;
  return standardError === 0 ? (surplus > 0 ? 1 : 0) : normalCdf(surplus / standardError);
}

/** The distance/SE₁ at which the test has `power`, leaving a continuity correction aside. */
export function noncentralityNeeded(
  { standardError, nullStandardError = standardError }: Contrast,
  critical: number,
  df: number | null,
  power: number,
): number {
  if (df !== null) return noncentralityFor(power, critical, df);
  return (critical * nullStandardError) / standardError + normalQuantile(power);
}
