import type { RequestFor } from '../../request.js';
import { recruitedFor } from '../allocation.js';
import type { Layout } from '../family.js';
import { type Cell, measuredPeriods, type Schedule } from './schedule.js';
import type { PeriodsDesign } from './schema.js';

export const periodArms = ['Control', 'Active'] as const;

/** Are the same participants measured every period, rather than new ones? */
export const isCohort = ({ iac = 0 }: PeriodsDesign): boolean => iac > 0;

/** Who is recruited and measured: each measured period brings new participants, or the cohort again. */
export function periodLayout(
  { design, attrition }: RequestFor<PeriodsDesign>,
  schedule: Schedule,
  clusters: readonly number[],
  clusterSize: number,
): Layout {
  const recruitedPerCluster = recruitedFor(clusterSize, attrition?.participants);
  const cohort = isCohort(design);
  const groups = schedule.map((row, index) => {
    const count = clusters[index] as number;
    const recruitedClusters = recruitedFor(count, attrition?.units);
    const intakes = cohort ? 1 : measuredPeriods(row);
    return {
      label: `Sequence ${index + 1}`,
      units: count,
      clusters: count,
      participants: count * clusterSize * intakes,
      recruited: recruitedClusters * recruitedPerCluster * intakes,
      recruitedClusters,
    };
  });
  const over = (isCounted: (cell: Cell) => boolean) =>
    groups.reduce(
      (sum, { recruitedClusters }, index) =>
        sum + recruitedClusters * (schedule[index] ?? []).filter(isCounted).length,
      0,
    );
  return {
    groups,
    recruitedPerCluster,
    arms: periodArms.map((label, arm) => {
      const exposures = recruitedPerCluster * over((cell) => cell === arm);
      return {
        label,
        exposures,
        measurements: exposures,
        clusterPeriods: over((cell) => cell === arm || (arm === 1 && cell === 'transition')),
      };
    }),
  };
}

/** Measurements that are analysed: a participant of a cohort counts in every period. */
export function analysedMeasurements(
  schedule: Schedule,
  clusters: readonly number[],
  clusterSize: number,
): number {
  return schedule.reduce(
    (sum, row, index) => sum + (clusters[index] as number) * clusterSize * measuredPeriods(row),
    0,
  );
}
