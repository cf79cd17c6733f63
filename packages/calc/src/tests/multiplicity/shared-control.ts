import { type OneFactorT, probabilityAllAbove, probabilityAnyAbove } from '../../distributions/one-factor.js';
import type { Hypothesis } from '../../request.js';
import type { Analysis } from '../analysis.js';
import type { SingleTest } from '../single-test.js';

/**
 * How the statistics of several comparisons load on the control they share, each turned the way it is tested.
 *
 * *Formula*: λᵢ = √(nᵢ/(nᵢ + n₀)), with the sign of its own effect in a superiority test; non-inferiority turns all
 * the same way. Two statistics correlate by λᵢλⱼ.
 * *Source*: Dunnett 1955, Journal of the American Statistical Association 50:1096.
 */
export function orientedLoadings({ contrasts }: Analysis, hypothesis: Hypothesis): number[] {
  return contrasts.map(({ loading = Number.NaN, effect }) =>
    hypothesis === 'superiority' && effect < 0 ? -loading : loading,
  );
}

/** The joint distribution of these statistics under the alternative. */
export function jointStatistics(analysis: Analysis, hypothesis: Hypothesis, test: SingleTest): OneFactorT {
  return {
    loadings: orientedLoadings(analysis, hypothesis),
    noncentralities: analysis.contrasts.map(
      ({ effect, standardError }) => test.distance(effect) / standardError,
    ),
    df: analysis.df ?? Infinity,
  };
}

/** The chance that at least one of these statistics exceeds one critical value. */
export function anyExceeds(statistics: OneFactorT, critical: number): number {
  return probabilityAnyAbove(
    statistics,
    statistics.loadings.map(() => critical),
  );
}

/** The chance that all of them do. */
export function allExceed(statistics: OneFactorT, critical: number): number {
  return probabilityAllAbove(
    statistics,
    statistics.loadings.map(() => critical),
  );
}
