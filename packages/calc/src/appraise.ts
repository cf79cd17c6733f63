import type { Appraisal, Caution, ComparisonResult, Feasible } from './appraisal.js';
import { type Bound, bind, type Evaluated } from './bind.js';
import { generalCautions } from './cautions.js';
import { costSheet } from './costs/cost-sheet.js';
import type { Layout } from './designs/family.js';
import { type AppraisalRequest, parseRequest } from './parse-request.js';
import { type Solution, solve } from './solve.js';
import { criticalValue } from './tests/superiority.js';
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
  const { request, plan } = bound;
  const { units, clusterSize, outcomes } = solution;
  const evaluated = solution.evaluated ?? bound.evaluate(plan.groupUnits(units), clusterSize, outcomes);
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
    df: evaluated.analysis.df,
    comparisons: comparisonResults(evaluated),
    cautions: [...plan.cautions(layout, outcomes), ...generalCautions(request, outcomes.length, missing)],
  };
  setDefined(appraisal, {
    unroundedUnits: solution.unroundedUnits,
    clusterSize,
    clusters: totals.clusters,
    recruitedClusters: totals.recruitedClusters,
    detectable: solution.detectable,
    designEffect: clusterSize === undefined ? undefined : plan.designEffect?.(clusterSize),
    alphaPerComparison: plan.comparisons && bound.alphaPerComparison,
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
function precision(
  { request: { test }, alphaPerComparison }: Bound,
  { analysis, criticalValue: adjusted }: Evaluated,
): Pick<Feasible, 'standardError' | 'expectedHalfWidth'> {
  const standardError = analysis.contrasts[0]?.standardError as number;
  const unadjusted =
    alphaPerComparison === test.alpha ? adjusted : criticalValue(test.alpha / test.sides, analysis.df);
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
  const { recruited } = totals;
  const { recruitedPerCluster } = layout;
  const schedule =
    request.timeline && scheduleOf(request.timeline, { recruited, recruitedPerCluster }, plan.periods);
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

/** Sets what has a value, so that an answer is the same before and after JSON. */
function setDefined<T extends object>(target: T, fields: Partial<T>): void {
  for (const field in fields) {
    if (fields[field] !== undefined) target[field] = fields[field] as T[typeof field];
  }
}
