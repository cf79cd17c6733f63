import type { Step } from '../../appraisal.js';
import { tex, texFactor } from '../../explain/tex.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { RequestFor } from '../../request.js';
import type { WorkedSize } from '../family.js';
import { armVariances } from './formula.js';
import type { PartiallyNestedDesign } from './schema.js';

const roberts = 'Roberts & Roberts 2005, Clin Trials 2:152';

/** From the treatment groups to the control participants, each arm's variance, the standard error and the df. */
export function steps(
  { design }: RequestFor<PartiallyNestedDesign>,
  { groupUnits, analysis }: WorkedSize,
  { variances: [variance] }: OutcomeModel,
): Step[] {
  const { icc, groupSize: m, allocation = [1, 1] } = design;
  const [controls = 0, groups = 0] = groupUnits;
  const [share0, share1] = armVariances(controls, groups, m, icc);
  const [a, b] = [variance * share0, variance * share1];
  const worked: Step[] = [
    {
      label: 'Control participants',
      formula: 'n_0=\\left\\lceil g\\,m\\,\\frac{a_0}{a_1}\\right\\rceil',
      substituted: `\\left\\lceil${tex(groups)}\\times${tex(m)}\\times\\frac{${tex(allocation[0] as number)}}{${tex(allocation[1] as number)}}\\right\\rceil`,
      value: controls,
      source: 'The allocation asked for, in participants',
    },
    {
      label: 'Variance of the control mean',
      formula: 'V_0=\\frac{\\sigma^2}{n_0}',
      substituted: `\\frac{${tex(variance)}}{${tex(controls)}}`,
      value: a,
      source: 'Independent participants',
    },
    {
      label: 'Variance of the active mean, in groups',
      formula: 'V_1=\\frac{\\sigma^2\\,(1+(m-1)\\rho)}{g\\,m}',
      substituted: `\\frac{${tex(variance)}\\times(1+(${tex(m)}-1)\\times${texFactor(icc)})}{${tex(groups)}\\times${tex(m)}}`,
      value: b,
      source: `${roberts}; Moerbeek & Wong 2008, Stat Med 27:2850`,
    },
    {
      label: 'Standard error of the effect',
      formula: '\\mathrm{SE}=\\sqrt{V_0+V_1}',
      substituted: `\\sqrt{${tex(a)}+${tex(b)}}`,
      value: analysis.contrasts[0]?.standardError as number,
      source: roberts,
    },
  ];
  if (analysis.df === null) return worked;
  return [
    ...worked,
    {
      label: 'Degrees of freedom',
      formula: '\\nu=\\frac{(V_0+V_1)^2}{\\frac{V_0^2}{n_0-1}+\\frac{V_1^2}{g-1}}',
      substituted: `\\frac{(${tex(a)}+${tex(b)})^2}{\\frac{${texFactor(a)}^2}{${tex(controls)}-1}+\\frac{${texFactor(b)}^2}{${tex(groups)}-1}}`,
      value: analysis.df,
      source: `Satterthwaite 1946, Biometrics Bull 2:110; ${roberts}`,
    },
  ];
}
