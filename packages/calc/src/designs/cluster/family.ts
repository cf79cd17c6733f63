import type { Caution, Step } from '../../appraisal.js';
import { CalcError } from '../../errors.js';
import { tex, texFactor } from '../../explain/tex.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { RequestFor } from '../../request.js';
import { armLabels, groupSizes, minimumBaseUnits, recruitedFor, roundingReach } from '../allocation.js';
import type { Family, Layout, WorkedSize } from '../family.js';
import { individualPlanningValues } from '../planning-values.js';
import { designEffect, variancePerCluster } from './formula.js';
import { type ClusterDesign, clusterSchema } from './schema.js';

/** Whole clusters are allocated to two arms; participants are measured once. */
export const cluster: Family<ClusterDesign> = {
  name: 'Cluster',
  schema: clusterSchema,
  combines: { continuous: ['superiority'], binary: ['superiority'] },
  planningValues: [
    ...individualPlanningValues,
    { path: 'attrition.units', key: 'clusterAttrition' },
    { path: 'design.icc', key: 'icc' },
    { path: 'design.clusterSizeCv', key: 'clusterSizeCv' },
  ],
  plan(request) {
    const { design } = request;
    const allocation = design.allocation ?? [1, 1];
    const icc = iccOf(request, allocation.length);
    const arms = armLabels(allocation.length);
    return {
      unitName: 'clusters in the control arm',
      arms,
      hasDf: true,
      minimumUnits: minimumBaseUnits(allocation),
      lookBelow: roundingReach(allocation),
      clusterSize: design.clusterSize,
      groupUnits: (units) => groupSizes(units, allocation),
      designEffect: (clusterSize) => designEffect(icc, clusterSize, design.clusterSizeCv),
      analyse: ([k0 = 0, k1 = 0], [outcome], clusterSize = design.clusterSize) => {
        const { variances, effect } = outcome as OutcomeModel;
        const factor = variancePerCluster(icc, clusterSize, design.clusterSizeCv);
        const standardError = Math.sqrt(factor * (variances[0] / k0 + variances[1] / k1));
        return { df: k0 + k1 - 2, contrasts: [{ arm: 1, versus: 0, effect, standardError }] };
      },
      layout: (units, clusterSize = design.clusterSize) =>
        clusterLayout(request, arms, groupSizes(units, allocation), clusterSize),
      cautions: (layout) => clusterCautions(request, icc, layout),
      steps: (result, outcomes) => steps(design, icc, result, outcomes[0] as OutcomeModel),
    };
  },
};

/** The ICC, once all that this family does not take has been refused. */
function iccOf({ outcome, design }: RequestFor<ClusterDesign>, arms: number): number {
  const refuse = (path: string, message: string) => new CalcError('unsupported', path, message);
  if (arms > 2) throw refuse('design.allocation', 'Clusters in more than two arms are not computed yet.');
  if (design.comparisons) {
    throw refuse('design.comparisons', 'With two arms there is one comparison; leave the comparisons out.');
  }
  if (design.rateCv !== undefined) {
    throw refuse('design.rateCv', 'The CV of the rate belongs to counts; state the ICC for this outcome.');
  }
  if (outcome.kind === 'binary' && outcome.method !== undefined) {
    throw refuse(
      'outcome.method',
      'In clusters proportions are compared with their unpooled variances; leave the method out.',
    );
  }
  if (outcome.kind === 'continuous' && outcome.sdActive !== undefined) {
    throw refuse(
      'outcome.sdActive',
      'A cluster design is planned with one SD; leave the active arm’s SD out.',
    );
  }
  if (outcome.kind === 'continuous' && outcome.repeated) {
    throw refuse(
      'outcome.repeated',
      'A cluster design with repeated measurements of its members is not computed.',
    );
  }
  if (design.icc === undefined) {
    throw new CalcError(
      'schema',
      'design.icc',
      'State the ICC: a cluster design cannot be planned without one.',
    );
  }
  return design.icc;
}

function clusterLayout(
  { attrition }: RequestFor<ClusterDesign>,
  arms: readonly string[],
  sizes: readonly number[],
  clusterSize: number,
): Layout {
  const recruitedPerCluster = recruitedFor(clusterSize, attrition?.participants);
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

function clusterCautions(
  { design, test }: RequestFor<ClusterDesign>,
  icc: number,
  layout: Layout,
): Caution[] {
  const cautions: Caution[] = [];
  const clusters = layout.groups.map((group) => group.units);
  const total = clusters.reduce((sum, count) => sum + count, 0);
  if (Math.min(...clusters) < 4) {
    cautions.push({
      code: 'few-clusters',
      message:
        'Fewer than 4 clusters in an arm: chance imbalance is large, and with three against three no permutation test can reach 5 %.',
      source: 'Hayes & Moulton 2017',
    });
  }
  if (test.reference === 'normal' && total < 40) {
    cautions.push({
      code: 'normal-reference',
      message: `With ${total} clusters the normal reference rejects too often; use the t reference below 40 clusters.`,
      source: 'Kahan et al. 2016',
    });
  }
  if (icc === 0) {
    cautions.push({
      code: 'icc-zero',
      message:
        'An ICC of 0 treats members of a cluster as strangers; plan with a small positive value unless you can show otherwise.',
      source: 'Donner, Birkett & Buck 1981',
    });
  }
  if (design.clusterSizeCv === undefined) {
    cautions.push({
      code: 'equal-sizes',
      message:
        'All clusters are taken to be of one size. Unequal sizes cost power: state their coefficient of variation.',
      source: 'Eldridge, Ashby & Kerry 2006',
    });
  }
  return cautions;
}

function steps(design: ClusterDesign, icc: number, result: WorkedSize, outcome: OutcomeModel): Step[] {
  const { groupUnits, analysis, clusterSize: m = design.clusterSize } = result;
  const [k0 = 0, k1 = 0] = groupUnits;
  const cv = design.clusterSizeCv;
  const effect = designEffect(icc, m, cv);
  const [v0, v1] = outcome.variances;
  return [
    {
      label: 'Design effect',
      formula:
        cv === undefined
          ? '\\mathrm{DE}=1+(m-1)\\rho'
          : '\\mathrm{DE}=1+\\bigl((1+\\mathrm{cv}^2)m-1\\bigr)\\rho',
      substituted:
        cv === undefined
          ? `1+(${tex(m)}-1)\\times${tex(icc)}`
          : `1+\\bigl((1+${texFactor(cv)}^2)\\times${tex(m)}-1\\bigr)\\times${tex(icc)}`,
      value: effect,
      source:
        cv === undefined
          ? 'Donner, Birkett & Buck 1981'
          : 'Donner, Birkett & Buck 1981; Eldridge, Ashby & Kerry 2006',
    },
    {
      label: 'Standard error of the effect',
      formula: '\\mathrm{SE}=\\sqrt{\\mathrm{DE}\\left(\\frac{v_0}{k_0m}+\\frac{v_1}{k_1m}\\right)}',
      substituted: `\\sqrt{${tex(effect)}\\left(\\frac{${tex(v0)}}{${tex(k0)}\\times${tex(m)}}+\\frac{${tex(v1)}}{${tex(k1)}\\times${tex(m)}}\\right)}`,
      value: analysis.contrasts[0]?.standardError as number,
      source: 'Donner, Birkett & Buck 1981',
    },
    ...(analysis.df === null ? [] : [dfStep(k0, k1, analysis.df)]),
  ];
}

function dfStep(k0: number, k1: number, df: number): Step {
  return {
    label: 'Degrees of freedom',
    formula: '\\nu=k_0+k_1-2',
    substituted: `${tex(k0)}+${tex(k1)}-2`,
    value: df,
    source: 'Donner & Klar 2000: an analysis of cluster means',
  };
}
