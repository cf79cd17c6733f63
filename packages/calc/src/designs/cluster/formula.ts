/**
 * How much larger a cluster design's variance is than that of as many individually randomised participants.
 *
 * Formula: 1 + ((1 + cv²)m − 1)ρ.
 * Source: Donner, Birkett & Buck 1981, Am J Epidemiol 114:906; unequal sizes Eldridge, Ashby & Kerry 2006,
 * Int J Epidemiol 35:1292.
 * Units: m participants per cluster on average, ρ and cv as proportions.
 */
export function designEffect(icc: number, clusterSize: number, clusterSizeCv = 0): number {
  return 1 + ((1 + clusterSizeCv ** 2) * clusterSize - 1) * icc;
}

/**
 * Variance factor of an arm's mean per cluster, DE/m; its limit ρ(1 + cv²) where clusters grow without end.
 *
 * Formula: DE/m = (1 − ρ)/m + ρ(1 + cv²). Source: after Hemming, Girling, Sitch, Marsh & Lilford 2011,
 * BMC Med Res Methodol 11:102.
 */
export function variancePerCluster(icc: number, clusterSize: number, clusterSizeCv = 0): number {
  return (1 - icc) / clusterSize + icc * (1 + clusterSizeCv ** 2);
}

/**
 * Variance of the log of one cluster's event rate; its limit κ² where clusters grow without end.
 *
 * Formula: 1/(λ·t·m) + κ². Source: after Hayes & Bennett 1999, Int J Epidemiol 28:319.
 * Units: `variance` = 1/(λt), of one participant; κ is the between-cluster coefficient of variation of the rate.
 */
export function rateVariancePerCluster(variance: number, rateCv: number, clusterSize: number): number {
  return variance / clusterSize + rateCv ** 2;
}
