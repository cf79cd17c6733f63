import { CalcError } from '../../errors.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { RequestFor } from '../../request.js';
import type { Analysis, Contrast } from '../../tests/analysis.js';
import { armLabels, armsReallocated, groupSizes, minimumBaseUnits, roundingReach } from '../allocation.js';
import { type ComparedArms, comparedArms, loadingOnControl } from '../compared-arms.js';
import type { Family } from '../family.js';
import { baselinePeriod, smallerClusters } from '../levers.js';
import { commonPlanningValues } from '../planning-values.js';
import { smallCountsCautions } from '../small-counts.js';
import { clusterCautions } from './cautions.js';
import { type Clustering, clusteringOf } from './clustering.js';
import { clusterLayout } from './layout.js';
import { type ClusterDesign, clusterSchema } from './schema.js';
import { clusterSteps } from './steps.js';

/** Whole clusters are allocated to two or more arms; participants are measured once. */
export const cluster: Family<ClusterDesign> = {
  name: 'Cluster',
  schema: clusterSchema,
  combines: {
    continuous: ['superiority', 'non-inferiority', 'equivalence'],
    binary: ['superiority', 'non-inferiority'],
    count: ['superiority'],
  },
  planningValues: [
    ...commonPlanningValues,
    { path: 'attrition.units', key: 'clusterAttrition' },
    { path: 'design.icc', key: 'icc', outcomes: ['continuous', 'binary'] },
    { path: 'design.clusterSizeCv', key: 'clusterSizeCv', outcomes: ['continuous', 'binary'] },
    { path: 'design.rateCv', key: 'rateCv', outcomes: ['count'] },
  ],
  reallocation: (design) => armsReallocated(design, design.allocation),
  levers: [smallerClusters, baselinePeriod],
  plan(request) {
    const { design } = request;
    const allocation = design.allocation ?? [1, 1];
    refuseComparisons(request, allocation.length);
    const pairs = comparedArms(allocation.length, design.comparisons?.against);
    const clustering = clusteringOf(request);
    const arms = armLabels(allocation.length);
    return {
      unitName: 'clusters in the control arm',
      arms,
      comparisons: design.comparisons,
      hasDf: true,
      minimumUnits: minimumBaseUnits(allocation),
      lookBelow: roundingReach(allocation),
      clusterSize: design.clusterSize,
      losesClusters: true,
      groupUnits: (units) => groupSizes(units, allocation),
      designEffect: ({ clusterSize = design.clusterSize }) => clustering.designEffect?.(clusterSize),
      analyse: (clusters, outcomes, clusterSize = design.clusterSize) =>
        analyseClusters(clustering, clusters, pairs, outcomes, clusterSize),
      layout: (units, clusterSize = design.clusterSize) =>
        clusterLayout(request, arms, groupSizes(units, allocation), clusterSize),
      cautions: (layout, outcomes) => [
        ...clusterCautions(request, clustering, layout),
        ...smallCountsCautions(layout, outcomes),
      ],
      steps: (result, outcomes) => clusterSteps(design, clustering, result, outcomes),
    };
  },
};

/**
 * The clusters of each two arms that are compared.
 *
 * Formula: SE² = w₀/k₀ + w₁/k₁ with w the variance of one cluster's mean or log rate; df = clusters − arms; two
 * comparisons with the control correlate as those of individuals do, on clusters.
 * Source: Donner, Birkett & Buck 1981; Hayes & Bennett 1999 for rates; Donner & Klar 2000 for the df.
 */
function analyseClusters(
  { perCluster }: Clustering,
  clusters: readonly number[],
  pairs: readonly ComparedArms[],
  outcomes: readonly OutcomeModel[],
  clusterSize: number,
): Analysis {
  const contrasts = pairs.map(({ arm, versus, sharesControl }) => {
    const { variances, effect } = outcomes[arm - 1] as OutcomeModel;
    const k0 = clusters[versus] as number;
    const k1 = clusters[arm] as number;
    const variance = perCluster(variances[0], clusterSize) / k0 + perCluster(variances[1], clusterSize) / k1;
    const contrast: Contrast = { arm, versus, effect, standardError: Math.sqrt(variance) };
    if (sharesControl) contrast.loading = loadingOnControl(k0, k1);
    return contrast;
  });
  const total = clusters.reduce((sum, count) => sum + count, 0);
  return { df: total - clusters.length, contrasts };
}

function refuseComparisons({ outcome, test, design }: RequestFor<ClusterDesign>, arms: number): void {
  const refuse = (code: 'schema' | 'unsupported', path: string, message: string) =>
    new CalcError(code, path, message);
  if (arms === 2) {
    if (!design.comparisons) return;
    throw refuse(
      'unsupported',
      'design.comparisons',
      'With two arms there is one comparison; leave the comparisons out.',
    );
  }
  if (outcome.kind !== 'continuous' || test.hypothesis === 'equivalence') {
    throw refuse(
      'unsupported',
      'design.allocation',
      'Clusters in more than two arms are computed for superiority and non-inferiority of a continuous outcome: state two arms.',
    );
  }
  if (!design.comparisons) {
    throw refuse(
      'schema',
      'design.comparisons',
      'With more than two arms, state what is compared, how the type I error is kept and what the power is of.',
    );
  }
}
