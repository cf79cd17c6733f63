import type { Step } from '../appraisal.js';
import type { OutcomeModel } from '../outcomes/outcome-model.js';
import { hazardOf } from '../outcomes/time-to-event.js';
import type { CountOutcome, OrdinalOutcome, TimeToEventOutcome } from '../request.js';
import { tex, texFactor } from './tex.js';

/** From survival and hazard ratio to the chance of an event in each arm. */
export function timeToEventOutcomeSteps(outcome: TimeToEventOutcome, model: OutcomeModel): Step[] {
  const { at, probability } = outcome.controlSurvival;
  const hazard = hazardOf(outcome.controlSurvival);
  const activeHazard = hazard * Math.exp(model.effect);
  const [p0, p1] = model.eventProbabilities as readonly [number, number];
  return [
    {
      label: 'Hazard per month, control',
      formula: '\\lambda_0=-\\frac{\\log S(t)}{t}',
      substituted: `-\\frac{\\log ${tex(probability)}}{${tex(at)}}`,
      value: hazard,
      source: 'Exponential survival',
    },
    {
      label: 'Hazard per month, active',
      formula: '\\lambda_1=\\lambda_0e^{\\delta}',
      substituted: `${tex(hazard)}\\times e^{${tex(model.effect)}}`,
      value: activeHazard,
      source: 'Proportional hazards',
    },
    eventStep(outcome, 0, hazard, p0),
    eventStep(outcome, 1, activeHazard, p1),
  ];
}

function eventStep(
  { accrual, followUp, dropoutHazard = 0 }: TimeToEventOutcome,
  arm: 0 | 1,
  hazard: number,
  value: number,
): Step {
  const lambda = `\\lambda_${arm}`;
  const leaving = dropoutHazard === 0 ? lambda : `(${lambda}+\\eta)`;
  const share = dropoutHazard === 0 ? '' : `\\frac{${lambda}}{${lambda}+\\eta}`;
  const rate = hazard + dropoutHazard;
  const put = texFactor(rate);
  const sharePut = dropoutHazard === 0 ? '' : `\\frac{${tex(hazard)}}{${tex(rate)}}`;
  const [F, whole] = [tex(followUp), tex(accrual + followUp)];
  return {
    label: `Chance that an event is seen, ${arm === 0 ? 'control' : 'active'}`,
    formula:
      accrual === 0
        ? `P_${arm}=${share}\\left[1-e^{-${leaving}F}\\right]`
        : `P_${arm}=${share}\\left[1-\\frac{e^{-${leaving}F}-e^{-${leaving}(A+F)}}{${leaving}A}\\right]`,
    substituted:
      accrual === 0
        ? `${sharePut}\\left[1-e^{-${put}\\times${F}}\\right]`
        : `${sharePut}\\left[1-\\frac{e^{-${put}\\times${F}}-e^{-${put}\\times${whole}}}{${put}\\times${tex(accrual)}}\\right]`,
    value,
    source: 'Lachin & Foulkes 1986, Biometrics 42:507',
  };
}

/** From rates to what one participant adds to the variance of the log rate ratio. */
export function countOutcomeSteps(outcome: CountOutcome, model: OutcomeModel): Step[] {
  const { controlRate, exposure, dispersion } = outcome;
  const rates = [controlRate, controlRate * Math.exp(model.effect)] as const;
  const extra = dispersion ? '+k' : '';
  const extraPut = dispersion ? `+${tex(dispersion)}` : '';
  return [
    {
      label: 'Rate, active',
      formula: '\\lambda_1=\\lambda_0e^{\\delta}',
      substituted: `${tex(controlRate)}\\times e^{${tex(model.effect)}}`,
      value: rates[1],
      source: 'Ratio of rates',
    },
    ...rates.map((rate, arm) => ({
      label: `Variance of one participant, ${arm === 0 ? 'control' : 'active'}, on the log scale`,
      formula: `v_${arm}=\\frac1{t\\lambda_${arm}}${extra}`,
      substituted: `\\frac1{${tex(exposure)}\\times${texFactor(rate)}}${extraPut}`,
      value: model.variances[arm as 0 | 1],
      source: dispersion ? 'Negative binomial; Zhu & Lakkis 2014, Stat Med 33:376' : 'Poisson variance',
    })),
  ];
}

/** The active arm's category probabilities, by shifting the cumulative odds. */
export function ordinalOutcomeSteps({ controlProbabilities }: OrdinalOutcome, model: OutcomeModel): Step[] {
  const ratio = Math.exp(model.effect);
  const active = model.categories?.[1] ?? [];
  let before = 0;
  return controlProbabilities.map((p, k) => {
    const upTo = k === controlProbabilities.length - 1 ? 1 : before + p;
    const odds = (cumulative: number) =>
      `(${texFactor(ratio)}\\times${tex(cumulative)}+1-${tex(cumulative)})`;
    const step = {
      label: `Active probability of category ${k + 1}`,
      formula:
        'p_{1k}=\\frac{\\psi p_{0k}}{(\\psi C_k+1-C_k)(\\psi C_{k-1}+1-C_{k-1})},\\quad C_k=\\sum_{j\\le k}p_{0j},\\ \\psi=e^{\\delta}',
      substituted: `\\frac{${texFactor(ratio)}\\times${tex(p)}}{${odds(upTo)}${odds(before)}}`,
      value: active[k] as number,
      source: 'Proportional odds; McCullagh 1980, J R Stat Soc B 42:109',
    };
    before = upTo;
    return step;
  });
}
