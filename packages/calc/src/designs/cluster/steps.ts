import type { Step } from '../../appraisal.js';
import { tex, texFactor } from '../../explain/tex.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import { type Compared, distinctComparisons, ownEffectSteps } from '../comparison-steps.js';
import type { WorkedSize } from '../family.js';
import type { Clustering } from './clustering.js';
import type { ClusterDesign } from './schema.js';

/** From the variance of one participant to the standard error between clusters and its df. */
export function clusterSteps(
  design: ClusterDesign,
  clustering: Clustering,
  result: WorkedSize,
  outcomes: readonly OutcomeModel[],
): Step[] {
  const { groupUnits, analysis, clusterSize: m = design.clusterSize } = result;
  return [
    ...(clustering.designEffect ? [designEffectStep(design, clustering.designEffect(m), m)] : []),
    ...distinctComparisons(analysis.contrasts, outcomes, groupUnits).flatMap((compared) => [
      ...ownEffectSteps(compared, outcomes[0] as OutcomeModel),
      standardErrorStep(clustering, compared, m),
    ]),
    ...(analysis.df === null ? [] : [dfStep(groupUnits, analysis.df)]),
  ];
}

function designEffectStep({ icc = 0, clusterSizeCv: cv }: ClusterDesign, effect: number, m: number): Step {
  return {
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
  };
}

function standardErrorStep(
  { rateCv, designEffect }: Clustering,
  { contrast, outcome, n0: k0, n1: k1, of }: Compared,
  m: number,
): Step {
  const [v0, v1] = outcome.variances;
  const value = contrast.standardError;
  const label = `Standard error of the effect${of}`;
  if (rateCv !== undefined) {
    const arm = (v: number, k: number) =>
      `\\frac1{${tex(k)}}\\left(\\frac{${tex(v)}}{${tex(m)}}+${texFactor(rateCv)}^2\\right)`;
    return {
      label,
      formula:
        '\\mathrm{SE}=\\sqrt{\\frac1{k_0}\\left(\\frac{v_0}m+\\kappa^2\\right)+\\frac1{k_1}\\left(\\frac{v_1}m+\\kappa^2\\right)}',
      substituted: `\\sqrt{${arm(v0, k0)}+${arm(v1, k1)}}`,
      value,
      source: 'After Hayes & Bennett 1999, Int J Epidemiol 28:319',
    };
  }
  const effect = designEffect?.(m) as number;
  return {
    label,
    formula: '\\mathrm{SE}=\\sqrt{\\mathrm{DE}\\left(\\frac{v_0}{k_0m}+\\frac{v_1}{k_1m}\\right)}',
    substituted: `\\sqrt{${tex(effect)}\\left(\\frac{${tex(v0)}}{${tex(k0)}\\times${tex(m)}}+\\frac{${tex(v1)}}{${tex(k1)}\\times${tex(m)}}\\right)}`,
    value,
    source: 'Donner, Birkett & Buck 1981',
  };
}

function dfStep(clusters: readonly number[], df: number): Step {
  return {
    label: 'Degrees of freedom',
    formula: `\\nu=${clusters.map((_, arm) => `k_${arm}`).join('+')}-${clusters.length}`,
    substituted: `${clusters.map(tex).join('+')}-${clusters.length}`,
    value: df,
    source: 'Donner & Klar 2000: an analysis of cluster means',
  };
}
