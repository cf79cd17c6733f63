import { CalcError } from '../errors.js';
import { exponentialRemainder } from '../numeric/remainders.js';
import type { Attrition, Hypothesis, TimeToEventOutcome } from '../request.js';
import type { OutcomeModel } from './outcome-model.js';
import { ratioModel } from './ratio.js';

/**
 * The chance that a participant's event is seen, when entry is spread evenly over the accrual.
 *
 * *Formula*: λ/(λ+η)·[1 − (e^{−(λ+η)F} − e^{−(λ+η)(A+F)})/((λ+η)A)], and its limit λ/(λ+η)·(1 − e^{−(λ+η)F}) at
 * A = 0; computed as (1 − e^{−μF}) + e^{−μF}·(e^{−μA} − 1 + μA)/(μA) with μ = λ + η, which loses no digits.
 * *Source*: Lachin & Foulkes 1986, Biometrics 42:507.
 * *Units*: hazards per month; accrual and follow-up in months.
 * *Accuracy*: relative 1e-14 (event-probability.json). A hazard of 0 gives 0; NaN gives NaN.
 */
export function eventProbability(
  hazard: number,
  accrual: number,
  followUp: number,
  dropoutHazard = 0,
): number {
  if (hazard === 0) return 0;
  const leaving = hazard + dropoutHazard;
  const entry = leaving * accrual;
  const duringAccrual = entry === 0 ? 0 : exponentialRemainder(-entry) / entry;
  const seen = -Math.expm1(-leaving * followUp) + Math.exp(-leaving * followUp) * duringAccrual;
  return (hazard / leaving) * seen;
}

/**
 * The hazard of exponential survival.
 *
 * *Formula*: −log S(t)/t. *Units*: per month.
 */
export function hazardOf({ at, probability }: TimeToEventOutcome['controlSurvival']): number {
  return -Math.log(probability) / at;
}

/**
 * A hazard ratio, by the log-rank test.
 *
 * *Formula*: Schoenfeld SE² = (1 + r)²/(r·D) with r = n₁/n₀ and D = n₀P₀ + n₁P₁ events; Freedman
 * |δ|/SE = √(D·r)·|1 − HR|/(1 + r·HR), whose SE is the one that this implies.
 * *Source*: Schoenfeld 1981, Biometrika 68:316 and 1983, Biometrics 39:499; Freedman 1982, Stat Med 1:121.
 * *Units*: effect log HR; times in months.
 * *Throws* CalcError `counted-twice` where loss is stated as a dropout hazard and as attrition too; `unsupported`
 * for Freedman's formula outside superiority.
 */
export function timeToEventModel(
  outcome: TimeToEventOutcome,
  dilution: number,
  hypothesis: Hypothesis,
  attrition?: Attrition,
): OutcomeModel {
  const { accrual, followUp, dropoutHazard = 0, method } = outcome;
  if (dropoutHazard > 0 && (attrition?.participants ?? 0) > 0) {
    throw new CalcError(
      'counted-twice',
      'attrition.participants',
      'Loss is stated twice, as a dropout hazard and as attrition: keep the dropout hazard, or the attrition.',
    );
  }
  if (method === 'freedman' && hypothesis !== 'superiority') {
    throw new CalcError(
      'unsupported',
      'outcome.method',
      'Freedman’s formula is for superiority only; take Schoenfeld’s for a margin.',
    );
  }
  const hazard = hazardOf(outcome.controlSurvival);
  const p0 = eventProbability(hazard, accrual, followUp, dropoutHazard);
  const target = {
    kind: 'time-to-event',
    name: 'hazard ratio',
    path: 'outcome.hazardRatio',
    ratio: outcome.hazardRatio,
  } as const;
  return ratioModel(target, dilution, (logRatio) => {
    const ratio = Math.exp(logRatio);
    const p1 = eventProbability(ratio * hazard, accrual, followUp, dropoutHazard);
    // δ/(1 − HR) is −1 at no effect.
    const freedman = logRatio === 0 ? 1 : Math.abs(logRatio / Math.expm1(logRatio));
    return {
      variances: [Number.NaN, Number.NaN],
      variance: (n0, n1) => {
        const r = n1 / n0;
        const spread = method === 'freedman' ? freedman * (1 + r * ratio) : 1 + r;
        return spread ** 2 / (r * (n0 * p0 + n1 * p1));
      },
      eventProbabilities: [p0, p1],
    };
  });
}

/**
 * Events at which the log-rank test has its power, for `noncentrality` = z_α + z_β.
 *
 * *Formula*: Schoenfeld (z_α + z_β)²(1 + r)²/(r·d²), d = |log HR| or dir·log HR + log margin; Freedman
 * (z_α + z_β)²(1 + r·HR)²/(r·(1 − HR)²). r is the allocation, active over control.
 * *Source*: Schoenfeld 1983, Biometrics 39:499; Freedman 1982, Stat Med 1:121.
 */
export function requiredEvents(
  noncentrality: number,
  ratio: number,
  distance: number,
  method: TimeToEventOutcome['method'],
  hazardRatio: number,
): number {
  const spread =
    method === 'freedman' ? (1 + ratio * hazardRatio) / Math.abs(1 - hazardRatio) : (1 + ratio) / distance;
  return (noncentrality * spread) ** 2 / ratio;
}
