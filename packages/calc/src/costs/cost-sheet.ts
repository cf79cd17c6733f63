import type { CostLine, CostSheet } from '../appraisal.js';
import type { Layout } from '../designs/family.js';
import { CalcError } from '../errors.js';
import type { CostPlan } from '../request.js';
import type { Totals } from '../totals.js';

/**
 * What a design costs: by arm, direct and shared, and by line.
 *
 * Formula: direct = per arm + per exposure × exposures + per measurement × measurements + per cluster-period ×
 * cluster-periods of the arm; shared = fixed + per cluster + per recruited + per month, split between the arms
 * in proportion to their exposures; overhead multiplies both. Lines and arms both sum to the total.
 * Units: the plan's currency. Throws CalcError `schema` where a list by arm has not one figure per arm.
 */
export function costSheet(
  plan: CostPlan,
  layout: Layout,
  totals: Totals,
  months: number | undefined,
): CostSheet {
  const lines: CostLine[] = [];
  const charge = (label: string, quantity: number, rate: number | undefined): number => {
    if (rate === undefined) return 0;
    const amount = quantity * rate;
    lines.push({ label, quantity, rate, amount });
    return amount;
  };

  const clustered = totals.recruitedClusters !== undefined;
  const shared =
    charge('Fixed', 1, plan.fixed) +
    (clustered ? charge('Clusters', totals.recruitedClusters ?? 0, plan.perCluster) : 0) +
    charge('Recruited participants', totals.recruited, plan.perRecruited) +
    (months === undefined ? 0 : charge('Months', months, plan.perMonth));
  const perMeasurement = charge('Measurements', totals.measurements, plan.perMeasurement);
  charge('Arms', layout.arms.length, plan.perArm);
  const overhead = 1 + (plan.overhead ?? 0);

  const arms = layout.arms.map((arm, index) => {
    const direct =
      (plan.perArm ?? 0) +
      (perMeasurement === 0 ? 0 : (perMeasurement * arm.measurements) / totals.measurements) +
      charge(`Exposures, ${arm.label}`, arm.exposures, plan.perExposure?.[index]) +
      (clustered
        ? charge(`Cluster-periods, ${arm.label}`, arm.clusterPeriods, plan.perClusterPeriod?.[index])
        : 0);
    const share = (shared * arm.exposures) / totals.exposures;
    const total = (direct + share) * overhead;
    return {
      label: arm.label,
      direct: direct * overhead,
      shared: share * overhead,
      total,
      perExposure: total / arm.exposures,
    };
  });

  if (plan.overhead !== undefined) {
    charge(
      'Overhead',
      lines.reduce((sum, line) => sum + line.amount, 0),
      plan.overhead,
    );
  }
  const total = arms.reduce((sum, arm) => sum + arm.total, 0);
  return { total, perRecruited: total / totals.recruited, arms, lines };
}

/** Refuses lists of costs by arm that do not have one figure per arm. */
export function checkCostsByArm(plan: CostPlan, arms: number): void {
  for (const field of ['perExposure', 'perClusterPeriod'] as const) {
    const figures = plan[field];
    if (figures && figures.length !== arms) {
      throw new CalcError(
        'schema',
        `costs.${field}`,
        `State one figure per arm, control first: ${arms}, not ${figures.length}.`,
      );
    }
  }
}
