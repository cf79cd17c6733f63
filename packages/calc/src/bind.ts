import { checkCostsByArm } from './costs/cost-sheet.js';
import type { DesignPlan } from './designs/family.js';
import { familyOf } from './designs/registry.js';
import { CalcError } from './errors.js';
import type { OutcomeModel } from './outcomes/outcome-model.js';
import { outcomeModel } from './outcomes/registry.js';
import type { AppraisalRequest } from './parse-request.js';
import type { Analysis, Contrast } from './tests/analysis.js';
import { alphaPerComparison } from './tests/multiplicity/per-comparison.js';
import { criticalValue, noncentralityNeeded, superiorityPower } from './tests/superiority.js';

/** A request with its family's formula and its test put together: power at any size follows. */
export interface Bound {
  request: AppraisalRequest;
  plan: DesignPlan;
  /** One per active arm. */
  outcomes: readonly OutcomeModel[];
  alphaPerComparison: number;
  analyse(groupUnits: readonly number[], clusterSize?: number, outcomes?: readonly OutcomeModel[]): Analysis;
  evaluate(
    groupUnits: readonly number[],
    clusterSize?: number,
    outcomes?: readonly OutcomeModel[],
  ): Evaluated;
  /** What the statistic of each comparison must exceed. */
  criticalValue(df: number | null): number;
  /** The |δ|/SE at which a comparison reaches `power`. */
  noncentralityNeeded(contrast: Contrast, df: number | null, power: number): number;
}

export interface Evaluated {
  analysis: Analysis;
  criticalValue: number;
  powers: number[];
  /** Of the power goal: the smallest over the comparisons. */
  power: number;
}

/** Puts a parsed request together. Throws CalcError for combinations and conditions that do not hold. */
export function bind(request: AppraisalRequest): Bound {
  refuseCombination(request);
  const plan = familyOf(request.design.family).plan(request);
  refuseForDesign(request, plan);
  refuseAim(request, plan);
  if (request.costs) checkCostsByArm(request.costs, plan.arms.length);

  const { comparisons } = plan;
  const active = plan.arms.length - 1;
  const model = outcomeModel(request.outcome, request.dilution);
  const outcomes = targets(comparisons?.effects, active, model);
  const alpha = comparisons
    ? alphaPerComparison(comparisons, request.test.alpha, active)
    : request.test.alpha;
  const tailAlpha = alpha / request.test.sides;
  const criticalValueAt = (df: number | null) => criticalValue(tailAlpha, df);
  const normalReference = request.test.reference === 'normal';
  const analyse: Bound['analyse'] = (groupUnits, clusterSize, modelled = outcomes) => {
    const analysis = plan.analyse(groupUnits, modelled, clusterSize);
    return normalReference ? { ...analysis, df: null } : analysis;
  };

  return {
    request,
    plan,
    outcomes,
    alphaPerComparison: alpha,
    analyse,
    criticalValue: criticalValueAt,
    evaluate(groupUnits, clusterSize, modelled) {
      const analysis = analyse(groupUnits, clusterSize, modelled);
      const critical = criticalValueAt(analysis.df);
      const powers = analysis.contrasts.map((contrast) => superiorityPower(contrast, critical, analysis.df));
      return { analysis, criticalValue: critical, powers, power: Math.min(...powers) };
    },
    noncentralityNeeded: (contrast, df, power) =>
      noncentralityNeeded(contrast, criticalValueAt(df), df, power),
  };
}

function targets(
  effects: readonly number[] | undefined,
  active: number,
  model: OutcomeModel,
): OutcomeModel[] {
  if (effects && effects.length !== active) {
    throw new CalcError(
      'schema',
      'design.comparisons.effects',
      `State one effect per active arm: ${active}, not ${effects.length}.`,
    );
  }
  const models = effects?.map((effect) => model.at(effect)) ?? Array<OutcomeModel>(active).fill(model);
  models.forEach(({ kind, target, nullTarget }, index) => {
    const path = effects ? `design.comparisons.effects.${index}` : targetPath(kind);
    if (kind === 'binary' && (target <= 0 || target >= 1)) {
      throw new CalcError('schema', path, 'The active proportion must lie between 0 and 1, both excluded.');
    }
    if (target === nullTarget) {
      throw new CalcError(
        'no-effect',
        path,
        'There is no effect to find: a superiority trial needs a target difference.',
      );
    }
  });
  return models;
}

const targetPath = (kind: OutcomeModel['kind']) =>
  kind === 'binary' ? 'outcome.active' : 'outcome.difference';

function refuseCombination({ design, outcome, test }: AppraisalRequest): void {
  const { name, combines } = familyOf(design.family);
  const hypotheses = combines[outcome.kind];
  if (!hypotheses) {
    throw new CalcError(
      'unsupported',
      'outcome.kind',
      `${name} designs are not computed for a ${outcome.kind} outcome; they are for ${Object.keys(combines).join(' and ')}.`,
    );
  }
  if (!hypotheses.includes(test.hypothesis)) {
    throw new CalcError(
      'unsupported',
      'test.hypothesis',
      `${name} designs with a ${outcome.kind} outcome are not computed for ${test.hypothesis}; they are for ${hypotheses.join(' and ')}.`,
    );
  }
  if (test.margin !== undefined) {
    throw new CalcError('unsupported', 'test.margin', 'A superiority test has no margin; leave it out.');
  }
}

function refuseForDesign({ test, attrition }: AppraisalRequest, plan: DesignPlan): void {
  if (test.reference && !plan.hasDf) {
    throw new CalcError(
      'unsupported',
      'test.reference',
      'This comparison has no degrees of freedom and always uses the normal distribution; leave the reference out.',
    );
  }
  if (attrition?.units && plan.clusterSize === undefined) {
    throw new CalcError(
      'unsupported',
      'attrition.units',
      'Whole clusters can only be lost where clusters are randomised; state the loss of participants.',
    );
  }
}

function refuseAim({ aim, test }: AppraisalRequest, plan: DesignPlan): void {
  if ('power' in aim && aim.power <= test.alpha / test.sides) {
    throw new CalcError('schema', 'aim.power', 'The power must be above the type I error in one tail.');
  }
  if (aim.find === 'cluster-size' && plan.clusterSize === undefined) {
    throw new CalcError(
      'unsupported',
      'aim.find',
      'Only designs that randomise clusters have a cluster size to find.',
    );
  }
  if ('units' in aim && aim.units < plan.minimumUnits) {
    throw new CalcError(
      'too-few-units',
      'aim.units',
      `At least ${plan.minimumUnits} are needed here, so that every group has two.`,
    );
  }
}
