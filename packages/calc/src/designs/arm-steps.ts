import type { Step } from '../appraisal.js';
import { activeSymbol } from '../explain/outcome-steps.js';
import { tex, texFactor } from '../explain/tex.js';
import { scoreShare } from '../outcomes/ordinal.js';
import type { OutcomeModel } from '../outcomes/outcome-model.js';
import type { RequestFor } from '../request.js';
import type { Analysis } from '../tests/analysis.js';
import { type Compared, distinctComparisons, ownEffectSteps } from './comparison-steps.js';

/**
 * The working of each comparison: effect and standard error, then the df they share. Comparisons of arms of the
 * same sizes and with the same effect are worked once.
 */
export function armSteps(
  request: RequestFor<unknown>,
  outcomes: readonly OutcomeModel[],
  sizes: readonly number[],
  analysis: Analysis,
): Step[] {
  const { contrasts, df } = analysis;
  const first = outcomes[0] as OutcomeModel;
  const steps = distinctComparisons(contrasts, outcomes, sizes).flatMap((compared) => [
    ...ownEffectSteps(compared, first),
    ...contrastSteps(request, compared),
  ]);
  return df === null ? steps : [...steps, dfStep(request, first, sizes, df)];
}

function contrastSteps(request: RequestFor<unknown>, compared: Compared): Step[] {
  const { eventProbabilities, categories } = compared.outcome;
  if (eventProbabilities) return timeToEventSteps(request, compared, eventProbabilities);
  if (categories) return ordinalSteps(compared, categories);
  return [
    plainStandardErrorStep(request, compared),
    ...nullStandardErrorSteps(compared),
    ...correctionSteps(compared),
  ];
}

function plainStandardErrorStep(
  { test }: RequestFor<unknown>,
  { contrast, outcome, n0, n1, of }: Compared,
): Step {
  const [v0, v1] = outcome.variances;
  return {
    label: `Standard error of the effect${of}`,
    formula: '\\mathrm{SE}=\\sqrt{\\frac{v_0}{n_0}+\\frac{v_1}{n_1}}',
    substituted: `\\sqrt{\\frac{${tex(v0)}}{${tex(n0)}}+\\frac{${tex(v1)}}{${tex(n1)}}}`,
    value: contrast.standardError,
    source: standardErrorSource(outcome, test.hypothesis !== 'superiority'),
  };
}

function standardErrorSource({ kind }: OutcomeModel, margin: boolean): string {
  if (kind === 'count') return 'Zhu & Lakkis 2014, Stat Med 33:376';
  if (kind === 'continuous') return 'Julious 2004, Stat Med 23:1921';
  return margin
    ? 'Blackwelder 1982, Control Clin Trials 3:345'
    : 'Fleiss, Levin & Paik 2003; Cohen 1988 on the arcsine scale';
}

function nullStandardErrorSteps({ contrast, outcome, n0, n1, of }: Compared): Step[] {
  if (contrast.nullStandardError === undefined) return [];
  const [p0 = 0, p1 = 0] = outcome.proportions ?? [];
  const pooled = (n0 * p0 + n1 * p1) / (n0 + n1);
  return [
    {
      label: `Standard error under no difference${of}`,
      formula: `\\mathrm{SE}_0=\\sqrt{\\bar p\\,(1-\\bar p)\\left(\\tfrac1{n_0}+\\tfrac1{n_1}\\right)},\\quad \\bar p=\\frac{n_0p_0+n_1${activeSymbol(outcome)}}{n_0+n_1}`,
      substituted: `\\sqrt{${tex(pooled)}\\,(1-${tex(pooled)})\\left(\\tfrac1{${tex(n0)}}+\\tfrac1{${tex(n1)}}\\right)}`,
      value: contrast.nullStandardError,
      source: 'Fleiss, Levin & Paik 2003',
    },
  ];
}

function correctionSteps({ contrast, n0, n1, of }: Compared): Step[] {
  if (contrast.correction === undefined) return [];
  return [
    {
      label: `Continuity correction, taken off the effect${of}`,
      formula: '\\tfrac12\\left(\\tfrac1{n_0}+\\tfrac1{n_1}\\right)',
      substituted: `\\tfrac12\\left(\\tfrac1{${tex(n0)}}+\\tfrac1{${tex(n1)}}\\right)`,
      value: contrast.correction,
      source: 'Casagrande, Pike & Smith 1978; Fleiss, Tytun & Ury 1980',
    },
  ];
}

function timeToEventSteps(
  { outcome: asked }: RequestFor<unknown>,
  { contrast, n0, n1, of }: Compared,
  [p0, p1]: readonly [number, number],
): Step[] {
  const events = n0 * p0 + n1 * p1;
  const r = n1 / n0;
  const freedman = asked.kind === 'time-to-event' && asked.method === 'freedman';
  const ratio = Math.exp(contrast.effect);
  return [
    {
      label: `Expected events${of}`,
      formula: 'D=n_0P_0+n_1P_1',
      substituted: `${tex(n0)}\\times${tex(p0)}+${tex(n1)}\\times${tex(p1)}`,
      value: events,
      source: 'Lachin & Foulkes 1986, Biometrics 42:507',
    },
    freedman
      ? {
          label: `Standard error of the log hazard ratio that Freedman’s power implies${of}`,
          formula:
            '\\mathrm{SE}=\\frac{|\\delta|\\,(1+r\\,\\mathrm{HR})}{\\sqrt{rD}\\,|1-\\mathrm{HR}|},\\quad r=\\frac{n_1}{n_0}',
          substituted: `\\frac{${tex(Math.abs(contrast.effect))}\\,(1+${texFactor(r)}\\times${texFactor(ratio)})}{\\sqrt{${texFactor(r)}\\times${tex(events)}}\\times|1-${texFactor(ratio)}|}`,
          value: contrast.standardError,
          source: 'Freedman 1982, Stat Med 1:121',
        }
      : {
          label: `Standard error of the log hazard ratio${of}`,
          formula: '\\mathrm{SE}=\\frac{1+r}{\\sqrt{rD}},\\quad r=\\frac{n_1}{n_0}',
          substituted: `\\frac{1+${texFactor(r)}}{\\sqrt{${texFactor(r)}\\times${tex(events)}}}`,
          value: contrast.standardError,
          source: 'Schoenfeld 1981, Biometrika 68:316; 1983, Biometrics 39:499',
        },
  ];
}

function ordinalSteps(
  { contrast, n0, n1, of }: Compared,
  [control, active]: readonly [readonly number[], readonly number[]],
): Step[] {
  const mean = control.map((p, k) => (n0 * p + n1 * (active[k] as number)) / (n0 + n1));
  const share = scoreShare(mean);
  return [
    {
      label: `Share of the information that the categories keep${of}`,
      formula: 'f=1-\\sum_k\\bar p_k^3,\\quad \\bar p_k=\\frac{n_0p_{0k}+n_1p_{1k}}{n_0+n_1}',
      substituted: `1-(${mean.map((p) => `${texFactor(p)}^3`).join('+')})`,
      value: share,
      source: 'Whitehead 1993, Stat Med 12:2257',
    },
    {
      label: `Standard error of the log odds ratio${of}`,
      formula: '\\mathrm{SE}=\\sqrt{\\frac{3(n_0+n_1)}{n_0n_1f}}',
      substituted: `\\sqrt{\\frac{3\\times(${tex(n0)}+${tex(n1)})}{${tex(n0)}\\times${tex(n1)}\\times${texFactor(share)}}}`,
      value: contrast.standardError,
      source: 'Whitehead 1993, Stat Med 12:2257',
    },
  ];
}

function dfStep(
  { outcome: asked }: RequestFor<unknown>,
  outcome: OutcomeModel,
  sizes: readonly number[],
  df: number,
): Step {
  if (outcome.unequalVariances && asked.kind === 'continuous') {
    const [n0 = 0, n1 = 0] = sizes;
    const [v0, v1] = outcome.variances;
    return {
      label: 'Degrees of freedom',
      formula: '\\nu=\\frac{(v_0/n_0+v_1/n_1)^2}{\\frac{(v_0/n_0)^2}{n_0-1}+\\frac{(v_1/n_1)^2}{n_1-1}}',
      substituted: `\\frac{(${tex(v0 / n0)}+${tex(v1 / n1)})^2}{\\frac{${texFactor(v0 / n0)}^2}{${tex(n0 - 1)}}+\\frac{${texFactor(v1 / n1)}^2}{${tex(n1 - 1)}}}`,
      value: df,
      source: 'Welch 1947, Biometrika 34:28',
    };
  }
  const total = sizes.reduce((sum, size) => sum + size, 0);
  const lost = outcome.covariates;
  return {
    label: 'Degrees of freedom',
    formula: `\\nu=N-K${lost ? '-1' : ''}`,
    substituted: `${tex(total)}-${sizes.length}${lost ? '-1' : ''}`,
    value: df,
    source: lost ? 'One spent on the baseline covariate' : 'Pooled SD of all arms',
  };
}
