import type { Step } from '../../appraisal.js';
import { tex, texFactor } from '../../explain/tex.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { WorkedSize } from '../family.js';
import { type PeriodInformation, periodInformation } from './information.js';
import { analysedMeasurements } from './layout.js';
import { type Cell, isMeasured, type Schedule } from './schedule.js';
import type { PeriodsDesign } from './schema.js';

interface Worked {
  design: PeriodsDesign;
  schedule: Schedule;
  information: PeriodInformation;
}

const correlationSource = (decay: boolean | undefined) =>
  decay
    ? 'Kasza, Hemming, Hooper, Matthews & Forbes 2019, Stat Methods Med Res 28:703'
    : 'Hooper, Teerenstra, de Hoop & Eldridge 2016, Stat Med 35:4718';
const informationSource =
  'Generalised least squares; Hussey & Hughes 2007, Contemp Clin Trials 28:182; Li et al. 2021';

/** The working from the schedule to the standard error and df, for σ = 1 until the last but one line. */
export function periodSteps(
  { design, schedule, information }: Worked,
  { groupUnits, clusterSize = design.clusterSize, analysis }: WorkedSize,
  model: OutcomeModel,
): Step[] {
  const standardError = analysis.contrasts[0]?.standardError as number;
  const total = information.total(groupUnits, clusterSize);
  const measurements = analysedMeasurements(schedule, groupUnits, clusterSize);
  const variance = (model.variances[0] + model.variances[1]) / 2;
  const steps: Step[] = [
    scheduleStep(schedule),
    ...covarianceSteps(design, clusterSize),
    ...(design.clusterSizeCv ? [unequalSizesStep(design, schedule, groupUnits, clusterSize, total)] : []),
    informationStep(information, groupUnits, clusterSize, total),
  ];
  if (model.kind === 'binary') {
    steps.push({
      label: 'Variance of one participant, over both arms',
      formula: '\\sigma^2=\\frac{v_0+v_1}{2}',
      substituted: `\\frac{${tex(model.variances[0])}+${tex(model.variances[1])}}{2}`,
      value: variance,
      source: 'Hussey & Hughes 2007, Contemp Clin Trials 28:182',
    });
  }
  steps.push(
    {
      label: 'Standard error of the effect',
      formula: '\\mathrm{SE}=\\sqrt{\\sigma^2/I}',
      substituted: `\\sqrt{${tex(variance)}/${texFactor(total)}}`,
      value: standardError,
      source: informationSource,
    },
    {
      label: 'Design effect, against as many independent measurements',
      formula: '\\mathrm{DE}=\\frac{\\mathrm{SE}^2}{4\\sigma^2/N}',
      substituted: `\\frac{${texFactor(standardError)}^2}{4\\times${texFactor(variance)}/${tex(measurements)}}`,
      value: measurements / (4 * total),
      source: 'Woertman et al. 2013, J Clin Epidemiol 66:752',
    },
  );
  if (analysis.df === null) return steps;
  const clusters = groupUnits.reduce((sum, count) => sum + count, 0);
  return [
    ...steps,
    {
      label: 'Degrees of freedom',
      formula: '\\nu=\\textstyle\\sum_s k_s-2',
      substituted: `${tex(clusters)}-2`,
      value: analysis.df,
      source: 'A convention, as for an analysis of cluster means; rough below 12 clusters',
    },
  ];
}

const cellInTex = (cell: Cell) => (isMeasured(cell) ? String(cell) : '\\cdot');

function scheduleStep(schedule: Schedule): Step {
  const rows = schedule.map((row) => row.map(cellInTex).join('&')).join('\\\\');
  return {
    label: 'Cells measured: a row for each sequence, a column for each period, 1 for active',
    formula: '\\#\\{(s,t):x_{st}\\in\\{0,1\\}\\}',
    substituted: `\\#\\begin{pmatrix}${rows}\\end{pmatrix}`,
    value: schedule.flat().filter(isMeasured).length,
    source: 'The design’s schedule',
  };
}

function covarianceSteps({ icc, cac, decay, iac = 0 }: PeriodsDesign, m: number): Step[] {
  const source = correlationSource(decay);
  const rho = tex(icc);
  const within = (factor: string) => `\\frac{${factor}(1-${rho})}{${tex(m)}}`;
  return [
    {
      label: 'Variance of a cluster’s mean in one period, for σ = 1',
      formula: '\\rho+\\frac{1-\\rho}{m}',
      substituted: `${rho}+\\frac{1-${rho}}{${tex(m)}}`,
      value: icc + (1 - icc) / m,
      source,
    },
    {
      label: `Covariance of its means in two ${decay ? 'neighbouring ' : ''}periods`,
      formula: `\\rho\\,r+\\frac{a(1-\\rho)}{m}${decay ? ',\\quad r^{|s-t|}\\text{ between periods }s\\text{ and }t' : ''}`,
      substituted: `${texFactor(icc)}\\times${texFactor(cac)}+${within(`${texFactor(iac)}\\times`)}`,
      value: icc * cac + (iac * (1 - icc)) / m,
      source,
    },
  ];
}

/** What unequal sizes cost, against the same clusters all of the mean size. */
function unequalSizesStep(
  design: PeriodsDesign,
  schedule: Schedule,
  clusters: readonly number[],
  clusterSize: number,
  total: number,
): Step {
  const equal = periodInformation(schedule, { ...design, clusterSizeCv: 0 }).total(clusters, clusterSize);
  return {
    label: `Share of the information left by cluster sizes with a CV of ${design.clusterSizeCv}`,
    formula:
      '\\frac{I}{I_0},\\quad \\mathbf V_s^{-1}\\to\\mathrm E_M\\!\\left[\\mathbf V_s(M)^{-1}\\right],\\;M\\sim\\mathrm{Gamma}',
    substituted: `\\frac{${tex(total)}}{${tex(equal)}}`,
    value: total / equal,
    source: 'A cluster’s information averaged over gamma-distributed sizes',
  };
}

function informationStep(
  information: PeriodInformation,
  clusters: readonly number[],
  clusterSize: number,
  total: number,
): Step {
  const { perCluster, takenByPeriods } = information.inDetail(clusters, clusterSize);
  const summed = perCluster.reduce((sum, each, index) => sum + each * (clusters[index] as number), 0);
  if (!(Math.abs(summed - takenByPeriods - total) <= 1e-6 * total)) {
    return {
      label: 'Information on the effect, for σ = 1, from the means of clusters alone',
      formula: 'I=\\sum_sp_s(a_s-\\bar a)^2,\\quad x_{st}=a_s+g_t',
      substituted: tex(total),
      value: total,
      source: 'The limit of generalised least squares where a cluster’s periods share all of its variance',
    };
  }
  const terms = perCluster.map((each, index) => `${tex(clusters[index] as number)}\\times${texFactor(each)}`);
  return {
    label: 'Information on the effect, for σ = 1',
    formula:
      'I=\\sum_sk_s\\,\\tilde{\\mathbf x}_s^{\\mathsf T}\\mathbf V_s^{-1}\\tilde{\\mathbf x}_s-\\mathbf b^{\\mathsf T}\\mathbf A^{-1}\\mathbf b,\\quad\\tilde x_{st}=x_{st}-\\bar x_t',
    substituted: `${terms.join('+')}-${texFactor(takenByPeriods)}`,
    value: total,
    source: informationSource,
  };
}
