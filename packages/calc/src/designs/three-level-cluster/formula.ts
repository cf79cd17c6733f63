import type { ThreeLevelClusterDesign } from './schema.js';

export type Nesting = Pick<
  ThreeLevelClusterDesign,
  'iccCluster' | 'iccSubcluster' | 'subclusterSize' | 'subclustersPerCluster'
>;

/**
 * How much larger the variance is than that of as many individually randomised participants, where clusters
 * hold subclusters and these the participants.
 *
 * Formula: 1 + (n₁ − 1)ρ₂ + n₁(n₂ − 1)ρ₁.
 * Source: Heo & Leon 2008, Biometrics 64:1256; the same as a product of two factors in Teerenstra, Moerbeek,
 * van Achterberg, Pelzer & Borm 2008, Clin Trials 5:486.
 * Units: n₁ participants in each of n₂ subclusters of a cluster; ρ₂ correlates two members of one subcluster,
 * ρ₁ two of one cluster in different subclusters.
 */
export function designEffect(nesting: Nesting): number {
  const { iccCluster, iccSubcluster, subclusterSize: n1, subclustersPerCluster: n2 } = nesting;
  return 1 + (n1 - 1) * iccSubcluster + n1 * (n2 - 1) * iccCluster;
}
