import type { Step } from '../appraisal.js';
import { repeatedMeasuresFactor } from '../outcomes/continuous.js';
import type { OutcomeModel } from '../outcomes/outcome-model.js';
import type { AppraisalRequest } from '../parse-request.js';
import type { ContinuousOutcome, Outcome } from '../request.js';
import { countOutcomeSteps, ordinalOutcomeSteps, timeToEventOutcomeSteps } from './ratio-steps.js';
import { tex, texFactor } from './tex.js';

/** The lines of the working that belong to the outcome: its effect after dilution, and its variance. */
export function outcomeSteps(request: AppraisalRequest, model: OutcomeModel): Step[] {
  const { outcome } = request;
  switch (outcome.kind) {
    case 'continuous':
      return [differenceStep(request, model), ...varianceSteps(outcome, model)];
    case 'binary':
      return proportionSteps(request, model);
    case 'time-to-event':
      return [logRatioStep(request, model), ...timeToEventOutcomeSteps(outcome, model)];
    case 'count':
      return [logRatioStep(request, model), ...countOutcomeSteps(outcome, model)];
    case 'ordinal':
      return [logRatioStep(request, model), ...ordinalOutcomeSteps(outcome, model)];
  }
}

/** What the outcome calls its target, as in “detectable hazard ratio”; all before dilution. */
export function targetName({ kind }: Outcome): string {
  const names: Record<Outcome['kind'], string> = {
    continuous: 'difference, before dilution',
    binary: 'active proportion',
    'time-to-event': 'hazard ratio, before dilution',
    count: 'rate ratio, before dilution',
    ordinal: 'odds ratio, before dilution',
  };
  return names[kind];
}

/** Where the target comes from: the question, or the answer itself where the aim is the effect. */
function targetOf({ aim }: AppraisalRequest): { name: string; source: string } {
  return aim.find === 'effect'
    ? { name: 'Detectable', source: 'Solved for the power asked for' }
    : { name: 'Target', source: 'The study’s question' };
}

const share = '(1-c)(1-a)';

function sharePut({ dilution }: AppraisalRequest): string {
  return `(1-${tex(dilution?.contamination ?? 0)})(1-${tex(dilution?.nonAdherence ?? 0)})`;
}

function differenceStep(request: AppraisalRequest, model: OutcomeModel): Step {
  const { name, source } = targetOf(request);
  const { dilution } = request;
  return {
    label: `${name} difference${dilution ? ', after dilution' : ''}`,
    formula: dilution ? `\\delta=(\\mu_1-\\mu_0)${share}` : '\\delta=\\mu_1-\\mu_0',
    substituted: dilution ? `${texFactor(model.target)}\\times${sharePut(request)}` : tex(model.target),
    value: model.effect,
    source,
  };
}

function logRatioStep(request: AppraisalRequest, model: OutcomeModel): Step {
  const { name, source } = targetOf(request);
  const [ratio = ''] = targetName(request.outcome).split(',');
  return {
    label: `${name} ${ratio}, on the log scale${request.dilution ? ', after dilution' : ''}`,
    formula: request.dilution ? `\\delta=${share}\\log\\psi` : '\\delta=\\log\\psi',
    substituted: `${request.dilution ? sharePut(request) : ''}\\log ${tex(model.target)}`,
    value: model.effect,
    source,
  };
}

function proportionSteps(request: AppraisalRequest, model: OutcomeModel): Step[] {
  const { name, source } = targetOf(request);
  const [p0 = 0, p1 = 0] = model.proportions ?? [];
  const active = activeSymbol(model);
  const steps: Step[] = [];
  if (request.dilution) {
    steps.push({
      label: 'Active proportion, after dilution',
      formula: `${active}=p_0+(p_1-p_0)${share}`,
      substituted: `${tex(p0)}+(${tex(model.target)}-${tex(p0)})\\times${sharePut(request)}`,
      value: p1,
      source,
    });
  }
  if (request.outcome.kind === 'binary' && request.outcome.method === 'arcsine') {
    return [
      ...steps,
      {
        label: `${name} difference, on the arcsine scale`,
        formula: `\\delta=2\\arcsin\\sqrt{${active}}-2\\arcsin\\sqrt{p_0}`,
        substituted: `2\\arcsin\\sqrt{${tex(p1)}}-2\\arcsin\\sqrt{${tex(p0)}}`,
        value: model.effect,
        source: 'Cohen 1988',
      },
      {
        label: 'Variance of one participant, on the arcsine scale',
        formula: 'v_0=v_1=1',
        substituted: '1',
        value: 1,
        source: 'Cohen 1988',
      },
    ];
  }
  return [
    ...steps,
    {
      label: `${name} difference of proportions`,
      formula: `\\delta=${active}-p_0`,
      substituted: `${tex(p1)}-${tex(p0)}`,
      value: model.effect,
      source,
    },
    ...[p0, p1].map((p, arm) => ({
      label: `Variance of one participant, ${arm === 0 ? 'control' : 'active'}`,
      formula: arm === 0 ? 'v_0=p_0(1-p_0)' : `v_1=${active}(1-${active})`,
      substituted: `${tex(p)}\\times(1-${tex(p)})`,
      value: p * (1 - p),
      source: 'Binomial variance',
    })),
  ];
}

/** The active proportion after dilution has a symbol of its own where it differs from the one asked for. */
export const activeSymbol = ({ dilution }: OutcomeModel): string => (dilution === 1 ? 'p_1' : 'p_1^{\\ast}');

function varianceSteps(outcome: ContinuousOutcome, model: OutcomeModel): Step[] {
  const { sd, sdActive, repeated } = outcome;
  if (!repeated) {
    return [sd, ...(sdActive === undefined ? [] : [sdActive])].map((each, arm) => ({
      label:
        sdActive === undefined
          ? 'Variance of one participant'
          : `Variance of one participant, ${arm === 0 ? 'control' : 'active'}`,
      formula: sdActive === undefined ? 'v_0=v_1=\\sigma^2' : `v_${arm}=\\sigma_${arm}^2`,
      substituted: `${texFactor(each)}^2`,
      value: each * each,
      source: 'Planning value',
    }));
  }
  const { baselines: p, followUps: m, correlation: rho } = repeated;
  const put = texFactor(rho);
  const followUps = `\\frac{1+${m - 1}\\times${put}}{${m}}`;
  return [
    {
      label: 'Share of the variance left by the repeated measurements',
      formula:
        p === 0 ? 'f=\\frac{1+(m-1)\\rho}{m}' : 'f=\\frac{1+(m-1)\\rho}{m}-\\frac{p\\rho^2}{1+(p-1)\\rho}',
      substituted: p === 0 ? followUps : `${followUps}-\\frac{${p}\\times${put}^2}{1+${p - 1}\\times${put}}`,
      value: repeatedMeasuresFactor(repeated),
      source: 'Frison & Pocock 1992, Stat Med 11:1685; Borm, Fransen & Lemmens 2007',
    },
    {
      label: 'Variance of one participant',
      formula: 'v_0=v_1=\\sigma^2f',
      substituted: `${texFactor(sd)}^2\\times${tex(repeatedMeasuresFactor(repeated))}`,
      value: model.variances[0],
      source: 'Planning value and the share above',
    },
  ];
}
