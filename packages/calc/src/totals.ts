import type { Layout } from './designs/family.js';

export interface Totals {
  participants: number;
  clusters?: number;
  recruited: number;
  recruitedClusters?: number;
  measurements: number;
  exposures: number;
}

/** Sums over the groups and arms of a layout. */
export function totalsOf({ groups, arms }: Layout): Totals {
  const sum = <T>(items: readonly T[], of: (item: T) => number) =>
    items.reduce((total, item) => total + of(item), 0);
  const totals: Totals = {
    participants: sum(groups, (group) => group.participants),
    recruited: sum(groups, (group) => group.recruited),
    measurements: sum(arms, (arm) => arm.measurements),
    exposures: sum(arms, (arm) => arm.exposures),
  };
  if (groups[0]?.clusters === undefined) return totals;
  return {
    ...totals,
    clusters: sum(groups, (group) => group.clusters ?? 0),
    recruitedClusters: sum(groups, (group) => group.recruitedClusters ?? 0),
  };
}
