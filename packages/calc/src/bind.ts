import { list } from './comparison/wording.js';
import { checkCostsByArm } from './costs/cost-sheet.js';
import type { DesignPlan } from './designs/family.js';
import { familyOf } from './designs/registry.js';
import { CalcError } from './errors.js';
import type { OutcomeModel } from './outcomes/outcome-model.js';
import { outcomeModel } from './outcomes/registry.js';
import type { AppraisalRequest } from './parse-request.js';
import type { OutcomeKind } from './request.js';
import type { Analysis } from './tests/analysis.js';
import type { Multiplicity } from './tests/multiplicity/multiplicity.js';
import { multiplicityFor } from './tests/multiplicity/registry.js';
import { type SingleTest, singleTest } from './tests/single-test.js';

const outcomeWords: Record<OutcomeKind, string> = {
  continuous: 'a mean',
  binary: 'a proportion',
  'time-to-event': 'a time to an event',
  count: 'a rate',
  ordinal: 'ordered categories',
};

/** A request with its family's formula and its test put together: power at any size follows. */
export interface Bound {
  request: AppraisalRequest;
  plan: DesignPlan;
  /** One per active arm. */
  outcomes: readonly OutcomeModel[];
  test: SingleTest;
  multiplicity: Multiplicity;
  analyse(groupUnits: readonly number[], clusterSize?: number, outcomes?: readonly OutcomeModel[]): Analysis;
  evaluate(
    groupUnits: readonly number[],
    clusterSize?: number,
    outcomes?: readonly OutcomeModel[],
  ): Evaluated;
}

export interface Evaluated {
  analysis: Analysis;
  /** What the statistic of each comparison must exceed. */
  criticalValue: number;
  powers: number[];
  /** Of the power goal. */
  power: number;
}

/** Puts a parsed request together. Throws CalcError for combinations and conditions that do not hold. */
export function bind(request: AppraisalRequest): Bound {
  refuseCombination(request);
  const plan = familyOf(request.design.family).plan(request);
  refuseForDesign(request, plan);
  refuseAim(request, plan);
  if (request.costs) checkCostsByArm(request.costs, plan.arms.length);

  const active = plan.arms.length - 1;
  const test = singleTest(request.test, request.outcome);
  const model = outcomeModel(request);
  const outcomes = targets(request, plan, model);
  const multiplicity = multiplicityFor(request.test, plan.comparisons, active);
  const normalReference = request.test.reference === 'normal';
  const analyse: Bound['analyse'] = (groupUnits, clusterSize, modelled = outcomes) => {
    const analysis = plan.analyse(groupUnits, modelled, clusterSize);
    return normalReference ? { ...analysis, df: null } : analysis;
  };

  return {
    request,
    plan,
    outcomes,
    test,
    multiplicity,
    analyse,
    evaluate(groupUnits, clusterSize, modelled) {
      const analysis = analyse(groupUnits, clusterSize, modelled);
      const criticalValue = multiplicity.criticalValue(analysis);
      const { each, goal } = multiplicity.powers(analysis, criticalValue, test);
      return { analysis, criticalValue, powers: each, power: goal };
    },
  };
}

/** The outcome of each active arm: the study's target, or the effects that the comparisons state. */
function targets({ test }: AppraisalRequest, plan: DesignPlan, model: OutcomeModel): OutcomeModel[] {
  const active = plan.arms.length - 1;
  const effects = plan.comparisons?.effects;
  if (effects && effects.length !== active) {
    throw new CalcError(
      'schema',
      'design.comparisons.effects',
      `State one effect per active arm: ${active}, not ${effects.length}.`,
    );
  }
  const path = (index: number) => (effects ? `design.comparisons.effects.${index}` : model.targetPath);
  effects?.forEach((effect, index) => {
    const message = model.refuseTarget?.(effect);
    if (message) throw new CalcError('schema', path(index), message);
  });
  const models = effects?.map((effect) => model.at(effect)) ?? Array<OutcomeModel>(active).fill(model);
  models.forEach(({ target, nullTarget }, index) => {
    if (test.hypothesis === 'superiority' && target === nullTarget) {
      throw new CalcError(
        'no-effect',
        path(index),
        'There is no effect to find: a superiority trial needs a target difference.',
      );
    }
  });
  return models;
}

function refuseCombination({ design, outcome, test }: AppraisalRequest): void {
  const { name, combines } = familyOf(design.family);
  const hypotheses = combines[outcome.kind];
  if (!hypotheses) {
    throw new CalcError(
      'unsupported',
      'outcome.kind',
      `${name} designs are not computed for ${outcomeWords[outcome.kind]}; they are for ${list(Object.keys(combines).map((kind) => outcomeWords[kind as OutcomeKind]))}.`,
    );
  }
  if (!hypotheses.includes(test.hypothesis)) {
    throw new CalcError(
      'unsupported',
      'test.hypothesis',
      `${name} designs are not computed for ${test.hypothesis} of ${outcomeWords[outcome.kind]}; they are for ${list(hypotheses)}.`,
    );
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
  if (attrition?.units && !plan.losesClusters) {
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
  if (aim.find === 'effect' && test.hypothesis !== 'superiority') {
    throw new CalcError(
      'unsupported',
      'aim.find',
      'An effect is found for superiority only: here the margin is what matters.',
    );
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
      `At least ${plan.minimumUnits} are needed here, so that every group has enough to be analysed and the test a degree of freedom.`,
    );
  }
}
