/**
 * The cluster size that costs least for the precision it buys, clusters and participants both having a price.
 *
 * Formula: √((c_cluster/c_participant) × (within/between)), which is √((c_cluster/c_participant)(1 − ρ)/ρ) for an
 * ICC of ρ.
 * Source: Raudenbush 1997, Psychol Methods 2:173.
 * Units: both costs in one currency, both variances in one unit. Infinity where there is no variance between.
 */
export function optimalClusterSize(
  costs: { cluster: number; participant: number },
  variances: { within: number; between: number },
): number {
  return Math.sqrt((costs.cluster / costs.participant) * (variances.within / variances.between));
}

/**
 * The number in the active arm for each one in control that costs least for the precision it buys.
 *
 * Formula: √(c₀/c₁) × σ₁/σ₀.
 * Source: Nam 1973, Biometrics 29:101; Cochran 1977, Sampling Techniques, section 5.5.
 * Units: costs and variances of one unit of each arm, control first.
 */
export function optimalAllocation(
  [control, active]: readonly [number, number],
  [controlVariance, activeVariance]: readonly [number, number],
): number {
  return Math.sqrt((control / active) * (activeVariance / controlVariance));
}
