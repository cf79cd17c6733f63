import type { Step } from '../../appraisal.js';
import { CalcError } from '../../errors.js';
import { tex, texFactor } from '../../explain/tex.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { RequestFor } from '../../request.js';
import {
  armLabels,
  armsReallocated,
  groupSizes,
  minimumBaseUnits,
  recruitedFor,
  roundingReach,
} from '../allocation.js';
import { clusterLayout } from '../cluster/layout.js';
import { groupedCautions } from '../cluster-cautions.js';
import type { Family, Layout, WorkedSize } from '../family.js';
import { requirePlainOutcome } from '../plain-outcome.js';
import { commonPlanningValues } from '../planning-values.js';
import { smallCountsCautions } from '../small-counts.js';
import { designEffect } from './formula.js';
import { type ThreeLevelClusterDesign, threeLevelClusterSchema } from './schema.js';

const arms = armLabels(2);
const words = { one: 'cluster', many: 'clusters' };

/** Whole clusters are allocated to two arms; each holds subclusters, and these hold the participants. */
export const threeLevelCluster: Family<ThreeLevelClusterDesign> = {
  name: 'Three-level cluster',
  schema: threeLevelClusterSchema,
  combines: {
    continuous: ['superiority', 'non-inferiority', 'equivalence'],
    binary: ['superiority', 'non-inferiority'],
  },
  planningValues: [
    ...commonPlanningValues,
    { path: 'attrition.units', key: 'clusterAttrition' },
    { path: 'design.iccCluster', key: 'icc' },
    { path: 'design.iccSubcluster', key: 'iccSubcluster' },
  ],
  reallocation: (design) => armsReallocated(design, design.allocation),
  plan(request) {
    const { design, test } = request;
    requirePlainOutcome(request.outcome);
    requireNestedCorrelations(design);
    const allocation = design.allocation ?? [1, 1];
    const inflation = designEffect(design);
    const perCluster = design.subclusterSize * design.subclustersPerCluster;
    return {
      unitName: 'clusters in the control arm',
      arms,
      hasDf: true,
      minimumUnits: minimumBaseUnits(allocation),
      lookBelow: roundingReach(allocation),
      losesClusters: true,
      groupUnits: (units) => groupSizes(units, allocation),
      designEffect: () => inflation,
      analyse: ([k0 = 0, k1 = 0], [outcome]) => {
        const { variances, effect } = outcome as OutcomeModel;
        const variance = (inflation / perCluster) * (variances[0] / k0 + variances[1] / k1);
        const contrast = { arm: 1, versus: 0, effect, standardError: Math.sqrt(variance) };
        return { df: k0 + k1 - 2, contrasts: [contrast] };
      },
      layout: (units) => threeLevelLayout(request, groupSizes(units, allocation)),
      cautions: (layout, outcomes) => {
        const clusters = layout.groups.map((group) => group.units);
        const grouping = {
          fewest: Math.min(...clusters),
          total: clusters.reduce((sum, count) => sum + count, 0),
          icc: design.iccCluster,
          reference: test.reference,
        };
        return [...groupedCautions(words, grouping), ...smallCountsCautions(layout, outcomes)];
      },
      steps: (result, outcomes) => steps(design, result, outcomes[0] as OutcomeModel),
    };
  },
};

function requireNestedCorrelations({ iccCluster, iccSubcluster }: ThreeLevelClusterDesign): void {
  if (iccSubcluster >= iccCluster) return;
  throw new CalcError(
    'impossible-correlation',
    'design.iccSubcluster',
    `Members of one subcluster share its cluster too, so their correlation (${iccSubcluster}) cannot be below that of the cluster (${iccCluster}).`,
  );
}

function threeLevelLayout(request: RequestFor<ThreeLevelClusterDesign>, sizes: readonly number[]): Layout {
  const { subclusterSize: n1, subclustersPerCluster: n2 } = request.design;
  return clusterLayout(request, arms, sizes, n1 * n2, n2 * recruitedFor(n1, request.attrition?.participants));
}

function steps(
  design: ThreeLevelClusterDesign,
  { groupUnits, analysis }: WorkedSize,
  { variances }: OutcomeModel,
): Step[] {
  const { iccCluster, iccSubcluster, subclusterSize: n1, subclustersPerCluster: n2 } = design;
  const [k0 = 0, k1 = 0] = groupUnits;
  const [v0, v1] = variances;
  const inflation = designEffect(design);
  const mean = (variance: number, clusters: number) =>
    `\\frac{${tex(variance)}}{${tex(clusters)}\\times${tex(n1)}\\times${tex(n2)}}`;
  const worked: Step[] = [
    {
      label: 'Design effect',
      formula: '\\mathrm{DE}=1+(n_1-1)\\rho_2+n_1(n_2-1)\\rho_1',
      substituted: `1+(${tex(n1)}-1)\\times${texFactor(iccSubcluster)}+${tex(n1)}\\times(${tex(n2)}-1)\\times${texFactor(iccCluster)}`,
      value: inflation,
      source: 'Heo & Leon 2008, Biometrics 64:1256',
    },
    {
      label: 'Standard error of the effect',
      formula:
        '\\mathrm{SE}=\\sqrt{\\mathrm{DE}\\left(\\frac{v_0}{k_0n_1n_2}+\\frac{v_1}{k_1n_1n_2}\\right)}',
      substituted: `\\sqrt{${tex(inflation)}\\left(${mean(v0, k0)}+${mean(v1, k1)}\\right)}`,
      value: analysis.contrasts[0]?.standardError as number,
      source: 'Heo & Leon 2008, Biometrics 64:1256',
    },
  ];
  if (analysis.df === null) return worked;
  return [
    ...worked,
    {
      label: 'Degrees of freedom',
      formula: '\\nu=k_0+k_1-2',
      substituted: `${tex(k0)}+${tex(k1)}-2`,
      value: analysis.df,
      source: 'Donner & Klar 2000: an analysis of cluster means',
    },
  ];
}
