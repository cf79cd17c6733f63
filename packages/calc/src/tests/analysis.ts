/** What a design makes of an outcome at one size: a df (null: normal reference) and the comparisons tested. */
export interface Analysis {
  df: number | null;
  /** The most that so many units could have, where the df depend on variances estimated apart. */
  dfAtMost?: number;
  contrasts: Contrast[];
}

export interface Contrast {
  arm: number;
  versus: number;
  /** Analysis scale, signed: arm − versus. */
  effect: number;
  /** Under the alternative. */
  standardError: number;
  /** Under no difference, where the test uses it. */
  nullStandardError?: number;
  /** Taken off |effect| by a continuity correction. */
  correction?: number;
  /** √(nᵢ/(nᵢ + n₀)), where several arms share a control: two comparisons correlate by the product of theirs. */
  loading?: number;
}
