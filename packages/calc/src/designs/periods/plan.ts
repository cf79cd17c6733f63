import { CalcError } from '../../errors.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { RequestFor } from '../../request.js';
import { groupSizes, minimumBaseUnits, roundingReach } from '../allocation.js';
import type { DesignPlan, Family } from '../family.js';
import { requirePlainOutcome } from '../plain-outcome.js';
import { commonPlanningValues } from '../planning-values.js';
import { periodCautions, rareOutcomeCautions } from './cautions.js';
import { type PeriodInformation, periodInformation } from './information.js';
import { analysedMeasurements, isCohort, periodArms, periodLayout } from './layout.js';
import { isEstimable, type Schedule } from './schedule.js';
import type { PeriodsDesign } from './schema.js';
import { periodSteps } from './steps.js';

/** What every family of designs over cluster periods shares. */
export const periodFamily: Pick<Family<PeriodsDesign>, 'combines' | 'planningValues'> = {
  combines: {
    continuous: ['superiority', 'non-inferiority', 'equivalence'],
    binary: ['superiority', 'non-inferiority'],
  },
  planningValues: [
    ...commonPlanningValues,
    { path: 'attrition.units', key: 'clusterAttrition' },
    { path: 'design.icc', key: 'icc' },
    { path: 'design.cac', key: 'clusterAutocorrelation' },
    { path: 'design.iac', key: 'individualAutocorrelation' },
    { path: 'design.clusterSizeCv', key: 'clusterSizeCv' },
  ],
};

/**
 * Clusters that go through control and active periods in one of several sequences.
 *
 * Formula: SE² = σ²/I with I the information of generalised least squares (periodInformation) and, for
 * proportions, σ² = (p₀q₀ + p₁q₁)/2; df = clusters − 2.
 * Source: Hussey & Hughes 2007; Hooper et al. 2016; Kasza et al. 2019; Li et al. 2021.
 * Throws CalcError `not-estimable`, at `schedulePath`, where no period has both treatments, `impossible-correlation`
 * where the correlations leave no error, `schema` where the allocation does not
 * have one share per sequence.
 */
export function periodPlan(
  request: RequestFor<PeriodsDesign>,
  schedule: Schedule,
  schedulePath: string,
): DesignPlan {
  const { design, outcome } = request;
  requirePlainOutcome(outcome);
  if (!isEstimable(schedule)) {
    throw new CalcError(
      'not-estimable',
      schedulePath,
      'No period is measured under both treatments, so the effect of treatment cannot be told from that of time: let some clusters be in control while others are treated.',
    );
  }
  const allocation = allocationOf(design, schedule.length);
  const information = periodInformation(schedule, design);
  requireError(information, schedule.length, design.clusterSize);
  return {
    unitName: 'clusters in the first sequence',
    arms: periodArms,
    hasDf: true,
    minimumUnits: fewestClusters(allocation),
    lookBelow: roundingReach(allocation),
    clusterSize: design.clusterSize,
    losesClusters: true,
    periods: { count: (schedule[0] ?? []).length, recruitment: 'within' },
    groupUnits: (units) => groupSizes(units, allocation),
    analyse: (clusters, [model], clusterSize = design.clusterSize) => {
      const { variances, effect } = model as OutcomeModel;
      const variance = (variances[0] + variances[1]) / 2;
      const standardError = Math.sqrt(variance / information.total(clusters, clusterSize));
      const total = clusters.reduce((sum, count) => sum + count, 0);
      return { df: total - 2, contrasts: [{ arm: 1, versus: 0, effect, standardError }] };
    },
    designEffect: ({ groupUnits, clusterSize = design.clusterSize }) =>
      analysedMeasurements(schedule, groupUnits, clusterSize) /
      (4 * information.total(groupUnits, clusterSize)),
    layout: (units, clusterSize = design.clusterSize) =>
      periodLayout(request, schedule, groupSizes(units, allocation), clusterSize),
    cautions: (layout, outcomes) => [
      ...periodCautions(request, layout, (clusters) => fewestInArm(schedule, clusters)),
      ...rareOutcomeCautions(schedule, isCohort(design), layout, outcomes),
    ],
    steps: (result, [model]) => periodSteps({ design, schedule, information }, result, model as OutcomeModel),
  };
}

/** Clusters whose means differ by period and treatment alone would show any effect for certain. */
function requireError(information: PeriodInformation, sequences: number, clusterSize: number): void {
  if (information.total(Array<number>(sequences).fill(1), clusterSize) < Number.POSITIVE_INFINITY) return;
  throw new CalcError(
    'impossible-correlation',
    'design.icc',
    'An ICC of 1 and a cluster autocorrelation of 1 together leave no error at all within a cluster: lower one of them.',
  );
}

function allocationOf({ allocation }: PeriodsDesign, sequences: number): readonly number[] {
  if (allocation && allocation.length !== sequences) {
    throw new CalcError(
      'schema',
      'design.allocation',
      `State one share of the clusters per sequence: ${sequences}, not ${allocation.length}.`,
    );
  }
  return allocation ?? Array<number>(sequences).fill(1);
}

/** One cluster in each sequence, and three in all for a degree of freedom. */
function fewestClusters(allocation: readonly number[]): number {
  let units = minimumBaseUnits(allocation, 1);
  while (groupSizes(units, allocation).reduce((sum, count) => sum + count, 0) < 3) units += 1;
  return units;
}

/** Clusters of the smaller arm in the period in which both have most. */
function fewestInArm(schedule: Schedule, clusters: readonly number[]): number {
  const inArm = (period: number, arm: 0 | 1) =>
    schedule.reduce((sum, row, index) => sum + (row[period] === arm ? (clusters[index] as number) : 0), 0);
  return Math.max(...(schedule[0] ?? []).map((_, period) => Math.min(inArm(period, 0), inArm(period, 1))));
}
