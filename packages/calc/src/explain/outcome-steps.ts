import type { Step } from '../appraisal.js';
import { repeatedMeasuresFactor } from '../outcomes/continuous.js';
import type { OutcomeModel } from '../outcomes/outcome-model.js';
import type { AppraisalRequest } from '../parse-request.js';
import type { ContinuousOutcome } from '../request.js';
import { tex } from './tex.js';

/** The lines of the working that belong to the outcome: its effect after dilution, and its variance. */
export function outcomeSteps({ outcome, dilution }: AppraisalRequest, model: OutcomeModel): Step[] {
  const steps: Step[] = [];
  const arcsine = outcome.kind === 'binary' && outcome.method === 'arcsine';
  const diluted = dilution ? '(1-c)(1-a)' : '';
  const dilutedBy = dilution
    ? `\\times(1-${tex(dilution.contamination ?? 0)})(1-${tex(dilution.nonAdherence ?? 0)})`
    : '';
  if (outcome.kind === 'binary') {
    const shift = `(${tex(model.target)}-${tex(model.nullTarget)})${dilutedBy}`;
    const p1 = model.nullTarget + (model.target - model.nullTarget) * model.dilution;
    steps.push({
      label: arcsine ? 'Target difference, on the arcsine scale' : 'Target difference of proportions',
      formula: arcsine ? '\\delta=2\\arcsin\\sqrt{p_1}-2\\arcsin\\sqrt{p_0}' : `\\delta=(p_1-p_0)${diluted}`,
      substituted: arcsine ? `2\\arcsin\\sqrt{${tex(p1)}}-2\\arcsin\\sqrt{${tex(model.nullTarget)}}` : shift,
      value: model.effect,
      source: arcsine ? 'Cohen 1988' : 'The study’s question',
    });
  } else {
    steps.push({
      label: dilution ? 'Target difference, after dilution' : 'Target difference',
      formula: `\\delta=\\mu_1-\\mu_0${dilution ? `,\\ \\text{diluted }${diluted}` : ''}`,
      substituted: `${tex(model.target)}${dilutedBy}`,
      value: model.effect,
      source: 'The study’s question',
    });
  }
  if (outcome.kind === 'continuous') steps.push(...varianceSteps(outcome, model));
  if (outcome.kind === 'binary' && !arcsine) {
    for (const [arm, p] of [model.nullTarget, model.nullTarget + model.effect].entries()) {
      steps.push({
        label: `Variance of one participant, ${arm === 0 ? 'control' : 'active'}`,
        formula: `v_${arm}=p_${arm}(1-p_${arm})`,
        substituted: `${tex(p)}\\times(1-${tex(p)})`,
        value: p * (1 - p),
        source: 'Binomial variance',
      });
    }
  }
  return steps;
}

function varianceSteps(outcome: ContinuousOutcome, model: OutcomeModel): Step[] {
  const { sd, sdActive, repeated } = outcome;
  if (!repeated) {
    return [sd, ...(sdActive === undefined ? [] : [sdActive])].map((each, arm) => ({
      label:
        sdActive === undefined
          ? 'Variance of one participant'
          : `Variance of one participant, ${arm === 0 ? 'control' : 'active'}`,
      formula: sdActive === undefined ? 'v_0=v_1=\\sigma^2' : `v_${arm}=\\sigma_${arm}^2`,
      substituted: `${tex(each)}^2`,
      value: each * each,
      source: 'Planning value',
    }));
  }
  const { baselines: p, followUps: m, correlation: rho } = repeated;
  return [
    {
      label: 'Share of the variance left by the repeated measurements',
      formula: 'f=\\frac{1+(m-1)\\rho}{m}-\\frac{p\\rho^2}{1+(p-1)\\rho}',
      substituted: `\\frac{1+${m - 1}\\times${tex(rho)}}{${m}}-\\frac{${p}\\times${tex(rho)}^2}{1+${p - 1}\\times${tex(rho)}}`,
      value: repeatedMeasuresFactor(repeated),
      source: 'Frison & Pocock 1992, Stat Med 11:1685; Borm, Fransen & Lemmens 2007',
    },
    {
      label: 'Variance of one participant',
      formula: 'v_0=v_1=\\sigma^2f',
      substituted: `${tex(sd)}^2\\times${tex(repeatedMeasuresFactor(repeated))}`,
      value: model.variances[0],
      source: 'Planning value and the share above',
    },
  ];
}
