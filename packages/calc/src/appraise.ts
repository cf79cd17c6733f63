import type { Appraisal, Caution, ComparisonResult, Feasible } from './appraisal.js';
import { type Bound, bind, type Evaluated } from './bind.js';
import { generalCautions } from './cautions.js';
import { costSheet } from './costs/cost-sheet.js';
import type { Layout } from './designs/family.js';
import { type AppraisalRequest, parseRequest } from './parse-request.js';
import type { TimelinePlan } from './request.js';
import { type Solution, solve } from './solve.js';
import { criticalValue } from './tests/one-bound.js';
import { scheduleOf } from './timeline/timeline.js';
import { type Totals, totalsOf } from './totals.js';

/**
 * Answers one request: sizes, power, precision, money, months and cautions of one design.
 *
 * Throws CalcError on input that breaks the schema or a method's conditions; an aim out of reach is an answer.
 */
export function appraise(request: AppraisalRequest): Appraisal {
  const bound = bind(parseRequest(request));
  const solution = solve(bound);
  if ('code' in solution) {
    return { feasible: false, infeasible: solution, cautions: infeasibleCautions(bound) };
  }
  return feasible(bound, solution);
}

function feasible(bound: Bound, solution: Solution): Feasible {
  const { request, plan, multiplicity } = bound;
  const { units, clusterSize, outcomes } = solution;
  const groupUnits = plan.groupUnits(units);
  const evaluated = solution.evaluated ?? bound.evaluate(groupUnits, clusterSize, outcomes);
  const { analysis } = evaluated;
  const worked = { units, clusterSize, groupUnits, analysis };
  const events = plan.events?.(worked, outcomes);
  const joint = multiplicity.joint?.(analysis, evaluated.criticalValue, bound.test);
  const layout = plan.layout(units, clusterSize);
  const totals = totalsOf(layout);
  const { costs, timeline, missing } = moneyAndTime(bound, layout, totals);
  const { standardError, expectedHalfWidth } = precision(bound, evaluated);
  const appraisal: Feasible = {
    feasible: true,
    units,
    groups: layout.groups,
    arms: layout.arms.map(({ label, exposures, measurements }) => ({ label, exposures, measurements })),
    participants: totals.participants,
    recruited: totals.recruited,
    measurements: totals.measurements,
    power: evaluated.power,
    standardError,
    expectedHalfWidth,
    criticalValue: evaluated.criticalValue,
    df: analysis.df,
    comparisons: comparisonResults(evaluated),
    cautions: [...plan.cautions(layout, outcomes), ...generalCautions(request, outcomes.length, missing)],
  };
  setDefined(appraisal, {
    unroundedUnits: solution.unroundedUnits,
    clusterSize,
    clusters: totals.clusters,
    recruitedClusters: totals.recruitedClusters,
    detectable: solution.detectable,
    designEffect: plan.designEffect?.(worked),
    requiredEvents: events?.required,
    expectedEvents: events?.expected,
    disjunctivePower: joint?.disjunctive,
    conjunctivePower: joint?.conjunctive,
    alphaPerComparison: plan.comparisons && multiplicity.alphaPerComparison,
    costs,
    timeline,
  });
  return appraisal;
}

/** Without an answer there are still the cautions of the size asked about, where the aim names one. */
function infeasibleCautions(bound: Bound): Caution[] {
  const { request, plan, outcomes } = bound;
  if (!('units' in request.aim)) return generalCautions(request, outcomes.length, []);
  const layout = plan.layout(request.aim.units);
  const { missing } = moneyAndTime(bound, layout, totalsOf(layout));
  return [...plan.cautions(layout, outcomes), ...generalCautions(request, outcomes.length, missing)];
}

/** The first comparison's standard error, and half the width of its unadjusted interval. */
export function precision(
  { request: { test }, multiplicity }: Bound,
  { analysis, criticalValue: adjusted }: Evaluated,
): Pick<Feasible, 'standardError' | 'expectedHalfWidth'> {
  const standardError = analysis.contrasts[0]?.standardError as number;
  const unadjusted =
    multiplicity.alphaPerComparison === test.alpha
      ? adjusted
      : criticalValue(test.alpha / test.sides, analysis.df);
  return { standardError, expectedHalfWidth: unadjusted * standardError };
}

function comparisonResults({ analysis, powers }: Evaluated): ComparisonResult[] {
  return analysis.contrasts.map(({ arm, versus, effect, standardError }, index) => ({
    arm,
    versus,
    effect,
    standardError,
    power: powers[index] as number,
  }));
}

export function moneyAndTime(
  { request, plan }: Bound,
  layout: Layout,
  totals: Totals,
): Pick<Feasible, 'costs' | 'timeline'> & { missing: readonly string[] } {
  if (!request.costs && !request.timeline) return { missing: [] };
  const { recruited } = totals;
  const { recruitedPerCluster } = layout;
  const schedule =
    request.timeline && scheduleOf(timelineOf(request), { recruited, recruitedPerCluster }, plan.periods);
  const missing = schedule?.missing ?? [];
  const months = schedule?.timeline.months;
  const found: ReturnType<typeof moneyAndTime> = {
    missing:
      request.costs?.perMonth !== undefined && !schedule
        ? [...missing, 'the timeline that the cost per month needs']
        : missing,
  };
  setDefined(found, {
    costs: request.costs && costSheet(request.costs, layout, totals, months),
    timeline: schedule?.timeline,
  });
  return found;
}

/** A time-to-event outcome brings its own follow-up. */
function timelineOf({ timeline, outcome }: AppraisalRequest): TimelinePlan {
  return outcome.kind === 'time-to-event' ? { ...timeline, followUp: outcome.followUp } : { ...timeline };
}

/** Sets what has a value, so that an answer is the same before and after JSON. */
function setDefined<T extends object>(target: T, fields: Partial<T>): void {
  for (const field in fields) {
    if (fields[field] !== undefined) target[field] = fields[field] as T[typeof field];
  }
}
