import { CalcError } from '../../errors.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { Contrast } from '../../tests/analysis.js';

/** How the two answers of one participant go together. */
export interface PairedProportions {
  /** Excess of joint successes over independence. */
  covariance: number;
  /** Chance that the two answers differ. */
  discordance: number;
  /** Is every cell of the two-by-two table a probability? */
  possible: boolean;
}

const rounding = 1e-12;

/**
 * The two-by-two table of one participant's answers under control and active.
 *
 * *Formula*: π = φ√(p₀q₀p₁q₁), ψ = p₁q₀ + p₀q₁ − 2π; its cells are p₀p₁ + π, q₀q₁ + π, p₁q₀ − π and p₀q₁ − π.
 * *Source*: Connor 1987, Biometrics 43:207.
 */
export function pairedProportions(p0: number, p1: number, correlation: number): PairedProportions {
  const [q0, q1] = [1 - p0, 1 - p1];
  const covariance = correlation * Math.sqrt(p0 * q0 * p1 * q1);
  const cells = [p0 * p1 + covariance, q0 * q1 + covariance, p1 * q0 - covariance, p0 * q1 - covariance];
  return {
    covariance,
    discordance: p1 * q0 + p0 * q1 - 2 * covariance,
    // Answers that are all alike have no correlation but 0.
    possible: cells.every((cell) => cell >= -rounding) && (correlation === 0 || (p1 > 0 && p1 < 1)),
  };
}

/** Refuses a correlation that proportions so far apart cannot have. Throws CalcError `impossible-correlation`. */
export function requirePossiblePair(p0: number, p1: number, correlation: number): void {
  if (pairedProportions(p0, p1, correlation).possible) return;
  const [q0, q1] = [1 - p0, 1 - p1];
  const spread = Math.sqrt(p0 * q0 * p1 * q1);
  const share = (cell: number) => (spread === 0 ? 0 : cell / spread);
  const highest = share(Math.min(p1 * q0, p0 * q1));
  const lowest = -share(Math.min(p0 * p1, q0 * q1));
  throw new CalcError(
    'impossible-correlation',
    'design.correlation',
    `Proportions of ${Number(p0.toPrecision(4))} and ${Number(p1.toPrecision(4))} in the same participants can only have a correlation from ${lowest.toFixed(3)} to ${highest.toFixed(3)}.`,
  );
}

/**
 * The difference of two proportions in the same participants, period effects left aside.
 *
 * *Formula*: SE₀² = ψ/N, SE₁² = (ψ − δ²)/N.
 * *Source*: Connor 1987, Biometrics 43:207.
 * *Units*: N participants in both sequences together.
 */
export function pairedContrast(
  { proportions, effect }: OutcomeModel,
  correlation: number,
  participants: number,
): Contrast {
  const [p0 = 0, p1 = 0] = proportions ?? [];
  const { discordance, possible } = pairedProportions(p0, p1, correlation);
  // A search for the effect may try proportions that this correlation rules out: there is nothing to detect.
  if (!possible) {
    return { arm: 1, versus: 0, effect: 0, standardError: 1, nullStandardError: Number.MAX_VALUE };
  }
  return {
    arm: 1,
    versus: 0,
    effect,
    standardError: Math.sqrt(Math.max(0, discordance - effect * effect) / participants),
    nullStandardError: Math.sqrt(discordance / participants),
  };
}
