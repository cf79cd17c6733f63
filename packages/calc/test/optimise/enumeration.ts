import { type AppraisalRequest, appraise, CalcError, type Feasible, type Limits } from '../../src/index.js';

/** Every whole-numbered design of a small grid, each appraised on its own: slow, and beyond doubt. */
export interface Grid {
  clusterSizes?: readonly number[];
  /** Units of the base group. */
  units: readonly number[];
  /** The design at a cluster size, with so many units opposite where they are free. */
  opposite?: (units: number) => readonly number[];
  design(
    units: number,
    opposite: number | undefined,
    clusterSize: number | undefined,
  ): AppraisalRequest['design'];
}

export function everyDesign(request: AppraisalRequest, grid: Grid): Feasible[] {
  const all: Feasible[] = [];
  for (const clusterSize of grid.clusterSizes ?? [undefined]) {
    for (const units of grid.units) {
      for (const opposite of grid.opposite?.(units) ?? [undefined]) {
        const design = grid.design(units, opposite, clusterSize);
        try {
          const appraisal = appraise({
            ...request,
            design,
            aim: { find: 'power', units },
          } as AppraisalRequest);
          if (appraisal.feasible) all.push(appraisal);
        } catch (error) {
          if (!(error instanceof CalcError) || error.code !== 'too-few-units') throw error;
        }
      }
    }
  }
  return all;
}

export const cost = ({ costs }: Feasible) => costs?.total as number;

export function keepsTo(limits: Limits, { recruitedClusters, timeline, costs }: Feasible): boolean {
  return (
    (recruitedClusters ?? 0) <= (limits.clusters ?? Number.POSITIVE_INFINITY) &&
    (costs?.total ?? 0) <= (limits.money ?? Number.POSITIVE_INFINITY) * (1 + 1e-9) &&
    (timeline?.months ?? 0) <= (limits.months ?? Number.POSITIVE_INFINITY) + 1e-9
  );
}

export const range = (from: number, to: number) =>
  Array.from({ length: to - from + 1 }, (_, step) => from + step);
