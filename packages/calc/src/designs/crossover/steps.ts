import type { Step } from '../../appraisal.js';
import { tex, texFactor } from '../../explain/tex.js';
import type { SquareMatrix } from '../../numeric/linear-algebra.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { WorkedSize } from '../family.js';
import { pairedProportions } from './binary.js';
import type { TreatmentInformation } from './formula.js';
import { type CrossoverDesign, lettersOf } from './schema.js';

const source = 'Jones & Kenward 2014, Design and Analysis of Cross-Over Trials; Senn 2002';
const paired = 'Connor 1987, Biometrics 43:207';

/** The working of a mean difference: what the sequences tell of each treatment, its standard error, df. */
export function meanSteps(
  design: CrossoverDesign,
  { information, variances = [] }: TreatmentInformation,
  { units, groupUnits, analysis }: WorkedSize,
  [model]: readonly OutcomeModel[],
): Step[] {
  const variance = model?.variances[0] as number;
  const several = analysis.contrasts.length > 1;
  const letters = lettersOf(design.sequences);
  const fitted = design.carryover ? 'periods and carryover' : 'periods';
  const steps = analysis.contrasts.flatMap(({ standardError }, k): Step[] => {
    const factor = variances[k] as number;
    const of = several ? `, ${letters[k + 1]} against A` : '';
    return [
      {
        label: `Variance factor, one participant in each sequence, ${fitted} fitted${of}`,
        formula: `f${several ? '_k' : ''}=\\left[\\mathbf C^{-1}\\right]_{kk},\\quad\\mathbf C=\\textstyle\\sum_s\\mathbf X_s^{\\mathsf T}(\\mathbf I-\\mathbf J/T)\\mathbf X_s\\text{ after ${fitted}}`,
        substituted: `\\left[${matrixTex(information)}^{-1}\\right]_{${k + 1}${k + 1}}`,
        value: factor,
        source,
      },
      {
        label: `Standard error of the effect, within participants${of}`,
        formula: '\\mathrm{SE}=\\sqrt{\\frac{\\sigma^2(1-\\rho)f}{u}}',
        substituted: `\\sqrt{\\frac{${texFactor(variance)}\\times(1-${texFactor(design.correlation)})\\times${texFactor(factor)}}{${tex(units)}}}`,
        value: standardError,
        source,
      },
    ];
  });
  if (analysis.df === null) return steps;
  const participants = groupUnits.reduce((sum, count) => sum + count, 0);
  const periods = design.sequences[0]?.length ?? 0;
  const lost = `(${letters.length}-1)`;
  return [
    ...steps,
    {
      label: 'Degrees of freedom',
      formula: `\\nu=NT-N-(T-1)-(K-1)${design.carryover ? '-(K-1)' : ''}`,
      substituted: `${tex(participants)}\\times${periods}-${tex(participants)}-(${periods}-1)-${lost}${design.carryover ? `-${lost}` : ''}`,
      value: analysis.df,
      source: `Participants, ${fitted} and treatments fitted; ${source}`,
    },
  ];
}

function matrixTex({ order, entries }: SquareMatrix): string {
  const rows = Array.from({ length: order }, (_, i) =>
    Array.from(entries.subarray(i * order, (i + 1) * order), tex).join('&'),
  );
  return `\\begin{pmatrix}${rows.join('\\\\')}\\end{pmatrix}`;
}

/** The working of two proportions in the same participants. */
export function proportionSteps(
  { correlation }: CrossoverDesign,
  { groupUnits, analysis }: WorkedSize,
  [model]: readonly OutcomeModel[],
): Step[] {
  const [p0 = 0, p1 = 0] = model?.proportions ?? [];
  const { covariance, discordance } = pairedProportions(p0, p1, correlation);
  const participants = groupUnits.reduce((sum, count) => sum + count, 0);
  const [contrast] = analysis.contrasts;
  const spread = [p0, p1].map((p) => `${tex(p)}(1-${tex(p)})`).join('\\times');
  return [
    {
      label: 'Covariance of a participant’s two answers',
      formula: '\\pi=\\varphi\\sqrt{p_0q_0p_1q_1}',
      substituted: `${texFactor(correlation)}\\sqrt{${spread}}`,
      value: covariance,
      source: paired,
    },
    {
      label: 'Chance that the two answers differ',
      formula: '\\psi=p_1q_0+p_0q_1-2\\pi',
      substituted: `${tex(p1)}(1-${tex(p0)})+${tex(p0)}(1-${tex(p1)})-2\\times${texFactor(covariance)}`,
      value: discordance,
      source: paired,
    },
    {
      label: 'Standard error of the effect',
      formula: '\\mathrm{SE}=\\sqrt{\\frac{\\psi-\\delta^2}{N}}',
      substituted: `\\sqrt{\\frac{${tex(discordance)}-${texFactor(contrast?.effect as number)}^2}{${tex(participants)}}}`,
      value: contrast?.standardError as number,
      source: paired,
    },
    {
      label: 'Standard error under no difference',
      formula: '\\mathrm{SE}_0=\\sqrt{\\frac{\\psi}{N}}',
      substituted: `\\sqrt{\\frac{${tex(discordance)}}{${tex(participants)}}}`,
      value: contrast?.nullStandardError as number,
      source: paired,
    },
  ];
}
