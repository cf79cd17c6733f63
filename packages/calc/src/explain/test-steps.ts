import type { Step } from '../appraisal.js';
import type { Bound, Evaluated } from '../bind.js';
import type { Contrast } from '../tests/analysis.js';
import { criticalValueSteps, dependentPowerStep, jointPowerSteps } from './multiplicity-steps.js';
import { tex, texFactor } from './tex.js';

/** The lines of the working that belong to the test: critical value, distance to the margin, power. */
export function testSteps(bound: Bound, evaluated: Evaluated): Step[] {
  const { analysis, criticalValue, powers } = evaluated;
  return [
    ...criticalValueSteps(bound, evaluated),
    ...analysis.contrasts.flatMap((contrast, index) => {
      const of =
        analysis.contrasts.length === 1
          ? ''
          : `, ${bound.plan.arms[contrast.arm]} against ${bound.plan.arms[contrast.versus]}`;
      const tested = {
        contrast,
        critical: criticalValue,
        df: analysis.df,
        power: powers[index] as number,
        of,
        dependent: dependentPowerStep(bound, evaluated, index, of),
      };
      return bound.request.test.hypothesis === 'equivalence'
        ? equivalenceSteps(bound, tested)
        : oneBoundSteps(bound, tested);
    }),
    ...jointPowerSteps(bound, evaluated),
  ];
}

/** One comparison at its critical value. */
interface Tested {
  contrast: Contrast;
  critical: number;
  df: number | null;
  power: number;
  /** Which comparison, where there are several. */
  of: string;
  /** The line of its power, where that depends on other comparisons. */
  dependent: Step | undefined;
}

function oneBoundSteps(bound: Bound, { contrast, critical, df, power, of, dependent }: Tested): Step[] {
  const superiority = bound.request.test.hypothesis === 'superiority';
  const { standardError: se, nullStandardError: se0, correction } = contrast;
  const distance = bound.test.distance(contrast.effect);
  const symbol = superiority ? '|\\delta|' : 'd';
  const taken = correction === undefined ? '' : '-\\mathrm{cc}';
  const takenValue = correction === undefined ? '' : `-${tex(correction)}`;
  const source = superiority ? 'Julious 2004' : 'Julious 2004; Blackwelder 1982';
  const distanceSteps = superiority ? [] : [distanceStep(bound, contrast, distance, of)];
  if (dependent) return [...distanceSteps, dependent];
  return [
    ...distanceSteps,
    df === null
      ? {
          label: `Power${of}`,
          formula: `1-\\beta=\\Phi\\!\\left(\\frac{${symbol}${taken}-c\\,\\mathrm{SE}${se0 === undefined ? '' : '_0'}}{\\mathrm{SE}}\\right)`,
          substituted: `\\Phi\\!\\left(\\frac{${tex(distance)}${takenValue}-${tex(critical)}\\times${texFactor(se0 ?? se)}}{${tex(se)}}\\right)`,
          value: power,
          source:
            se0 === undefined
              ? `Normal distribution of the estimate; ${source}`
              : 'Fleiss, Levin & Paik 2003',
        }
      : {
          label: `Power${of}`,
          formula: `1-\\beta=P\\!\\left(T'_{\\nu}(${symbol}/\\mathrm{SE})>c\\right)`,
          substituted: `P\\!\\left(T'_{${tex(df)}}(${tex(distance / se)})>${tex(critical)}\\right)`,
          value: power,
          source: `Noncentral t distribution; ${source}, Stat Med 23:1921`,
        },
  ];
}

/** The margin as the test uses it: a ratio's is logged. */
function marginOf({ request }: Bound): { symbol: string; put: string } {
  const { kind } = request.outcome;
  const margin = tex(request.test.margin as number);
  return kind === 'continuous' || kind === 'binary'
    ? { symbol: '\\Delta', put: margin }
    : { symbol: '\\log\\Delta', put: `\\log ${margin}` };
}

function distanceStep(bound: Bound, { effect }: Contrast, distance: number, of: string): Step {
  const { symbol, put } = marginOf(bound);
  const benefit = bound.test.distance(effect + 1) > distance;
  return {
    label: `Distance from the effect to the margin${of}`,
    formula: `d=${symbol}${benefit ? '+' : '-'}\\delta`,
    substituted: `${put}${benefit ? '+' : '-'}${texFactor(effect)}`,
    value: distance,
    source: `${bound.request.outcome.better === 'lower' ? 'Lower' : 'Higher'} is better; Blackwelder 1982, Control Clin Trials 3:345`,
  };
}

function equivalenceSteps(bound: Bound, { contrast, critical, df, power, of }: Tested): Step[] {
  const { effect, standardError: se } = contrast;
  const { symbol, put } = marginOf(bound);
  const nearer = bound.test.distance(effect);
  const farther = nearer + 2 * Math.abs(effect);
  const bounds: Step[] = [
    {
      label: `Distance from the effect to the nearer margin${of}`,
      formula: `d=${symbol}-|\\delta|`,
      substituted: `${put}-${tex(Math.abs(effect))}`,
      value: nearer,
      source: 'Schuirmann 1987, J Pharmacokinet Biopharm 15:657',
    },
    {
      label: `Distance from the effect to the farther margin${of}`,
      formula: `d'=${symbol}+|\\delta|`,
      substituted: `${put}+${tex(Math.abs(effect))}`,
      value: farther,
      source: 'Schuirmann 1987, J Pharmacokinet Biopharm 15:657',
    },
  ];
  const [near, far, c] = [tex(nearer / se), tex(farther / se), tex(critical)];
  return [
    ...bounds,
    df === null
      ? {
          label: `Power${of}`,
          formula:
            "1-\\beta=\\left[\\Phi\\!\\left(\\frac{d}{\\mathrm{SE}}-c\\right)-\\Phi\\!\\left(c-\\frac{d'}{\\mathrm{SE}}\\right)\\right]_+",
          substituted: `\\left[\\Phi(${near}-${c})-\\Phi(${c}-${far})\\right]_+`,
          value: power,
          source: 'Two one-sided tests; Schuirmann 1987',
        }
      : {
          label: `Power${of}`,
          formula:
            "1-\\beta=\\int_0^\\infty\\left[\\Phi\\!\\left(\\frac{d}{\\mathrm{SE}}-cs\\right)-\\Phi\\!\\left(cs-\\frac{d'}{\\mathrm{SE}}\\right)\\right]_+f_\\nu(s)\\,ds,\\quad \\nu s^2\\sim\\chi^2_\\nu",
          substituted: `\\int_0^\\infty\\left[\\Phi(${near}-${c}s)-\\Phi(${c}s-${far})\\right]_+f_{${tex(df)}}(s)\\,ds`,
          value: power,
          source: 'Two one-sided tests; Schuirmann 1987; Owen 1965, Biometrika 52:437',
        },
  ];
}
