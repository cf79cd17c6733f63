import type { RequestFor } from '../../request.js';
import { recruitedFor } from '../allocation.js';
import type { Layout } from '../family.js';

/** Clusters and their members, arm by arm, each measured once. */
export function clusterLayout(
  { attrition }: RequestFor<unknown>,
  arms: readonly string[],
  sizes: readonly number[],
  clusterSize: number,
  recruitedPerCluster = recruitedFor(clusterSize, attrition?.participants),
): Layout {
  const groups = sizes.map((clusters, arm) => {
    const recruitedClusters = recruitedFor(clusters, attrition?.units);
    return {
      label: arms[arm] as string,
      units: clusters,
      clusters,
      participants: clusters * clusterSize,
      recruited: recruitedClusters * recruitedPerCluster,
      recruitedClusters,
    };
  });
  return {
    groups,
    recruitedPerCluster,
    arms: groups.map(({ label, recruited, recruitedClusters }) => ({
      label,
      exposures: recruited,
      measurements: recruited,
      clusterPeriods: recruitedClusters,
    })),
  };
}
