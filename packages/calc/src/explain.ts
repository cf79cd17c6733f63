import type { Feasible, Step } from './appraisal.js';
import { moneyAndTime } from './appraise.js';
import { type Bound, bind, type Evaluated } from './bind.js';
import type { Layout } from './designs/family.js';
import { outcomeSteps, targetName } from './explain/outcome-steps.js';
import { testSteps } from './explain/test-steps.js';
import { tex, texAmount } from './explain/tex.js';
import type { OutcomeModel } from './outcomes/outcome-model.js';
import { type AppraisalRequest, parseRequest } from './parse-request.js';
import { type Solution, solve } from './solve.js';
import { totalsOf } from './totals.js';

/**
 * The working of one request, line by line, each with its source: what a statistician needs to redo it.
 *
 * Throws CalcError as `appraise` does. An aim out of reach has the single line that shows why.
 */
export function explain(request: AppraisalRequest): Step[] {
  const bound = bind(parseRequest(request));
  const solution = solve(bound);
  if ('code' in solution) {
    return [
      {
        label: solution.message,
        formula: '1-\\beta_{\\max}',
        substituted: tex(solution.limitingPower ?? 0),
        value: solution.limitingPower ?? 0,
        source:
          solution.code === 'clusters'
            ? 'After Hemming, Girling, Sitch, Marsh & Lilford 2011, BMC Med Res Methodol 11:102'
            : 'The power equation, at its limit',
      },
    ];
  }
  const { plan } = bound;
  const { units, clusterSize, outcomes } = solution;
  const groupUnits = plan.groupUnits(units);
  const evaluated = bound.evaluate(groupUnits, clusterSize, outcomes);
  const { analysis } = evaluated;
  const layout = plan.layout(units, clusterSize);
  const outcome = outcomes[0] as OutcomeModel;
  return [
    ...outcomeSteps(bound.request, outcome),
    ...plan.steps({ units, clusterSize, groupUnits, analysis }, outcomes),
    ...testSteps(bound, evaluated),
    ...answerSteps(bound, solution, evaluated),
    ...recruitmentSteps(bound, layout),
    ...moneyAndTimeSteps(bound, layout),
  ];
}

function answerSteps({ request, plan }: Bound, solution: Solution, evaluated: Evaluated): Step[] {
  const { aim } = request;
  if (aim.find === 'size') {
    const fewest: Step = {
      label: `Fewest ${plan.unitName} that reach the power`,
      formula: '\\min\\{u:1-\\beta(u)\\ge 1-\\beta_{\\mathrm{aim}}\\}',
      substituted: `1-\\beta(${solution.units})=${tex(evaluated.power)}\\ge${tex(aim.power)}`,
      value: solution.units,
      source: 'Search over whole units, on the power above',
    };
    return solution.unroundedUnits === undefined
      ? [fewest]
      : [
          fewest,
          {
            label: 'The same before rounding up',
            formula: '1-\\beta(u)=1-\\beta_{\\mathrm{aim}}',
            substituted: `1-\\beta(${tex(solution.unroundedUnits)})=${tex(aim.power)}`,
            value: solution.unroundedUnits,
            source: 'The power above, for real-valued arms of equal size',
          },
        ];
  }
  if (aim.find === 'cluster-size') {
    return [
      {
        label: 'Smallest cluster size that reaches the power',
        formula: '\\min\\{m:1-\\beta(m)\\ge 1-\\beta_{\\mathrm{aim}}\\}',
        substituted: `1-\\beta(${solution.clusterSize})=${tex(evaluated.power)}\\ge${tex(aim.power)}`,
        value: solution.clusterSize as number,
        source: 'Search over whole cluster sizes, on the power above',
      },
    ];
  }
  if (aim.find === 'effect') {
    return [
      {
        label: `Detectable ${targetName(request.outcome)}`,
        formula: '\\text{target with }1-\\beta=1-\\beta_{\\mathrm{aim}}',
        substituted: `1-\\beta=${tex(aim.power)}`,
        value: solution.detectable as number,
        source: 'The power equation above, solved for the effect',
      },
    ];
  }
  return [];
}

function recruitmentSteps({ request }: Bound, layout: Layout): Step[] {
  const lost = request.attrition?.participants;
  const lostClusters = request.attrition?.units;
  const { recruited } = totalsOf(layout);
  const [group] = layout.groups;
  if (!group || (!lost && !lostClusters)) return [];
  const kept = (share: number | undefined) => `1-${tex(share ?? 0)}`;
  const clustered = group.clusters !== undefined;
  return [
    {
      label: clustered
        ? 'Recruited in all: clusters before some are lost, times the recruits of each'
        : 'Recruited in all, so that the analysed remain',
      formula: clustered
        ? '\\sum_g\\left\\lceil\\frac{k_g}{1-a_k}\\right\\rceil r_g'
        : '\\sum_g\\left\\lceil\\frac{n_g}{1-a}\\right\\rceil',
      substituted: layout.groups
        .map((each) =>
          clustered
            ? `\\left\\lceil\\frac{${each.clusters}}{${kept(lostClusters)}}\\right\\rceil\\times${each.recruited / (each.recruitedClusters as number)}`
            : `\\left\\lceil\\frac{${each.participants}}{${kept(lost)}}\\right\\rceil`,
        )
        .join('+'),
      value: recruited,
      source: 'Inflation for loss, each group rounded up',
    },
  ];
}

function moneyAndTimeSteps(bound: Bound, layout: Layout): Step[] {
  const { costs, timeline } = moneyAndTime(bound, layout, totalsOf(layout));
  return [...(timeline ? [monthsStep(timeline)] : []), ...(costs ? [costStep(costs, bound)] : [])];
}

function monthsStep(timeline: NonNullable<Feasible['timeline']>): Step {
  return {
    label: `Months: ${timeline.phases.map((phase) => phase.label.toLowerCase()).join(', ')}`,
    formula: '\\sum\\text{phases}',
    substituted: timeline.phases.map((phase) => texAmount(phase.to - phase.from)).join('+'),
    value: timeline.months,
    source: 'The study’s timeline',
  };
}

function costStep(costs: NonNullable<Feasible['costs']>, { request }: Bound): Step {
  return {
    label: `Cost, ${request.costs?.currency}: ${costs.lines.map((line) => line.label.toLowerCase()).join('; ')}`,
    formula: '\\sum\\text{quantity}\\times\\text{rate}',
    substituted: costs.lines.map((line) => texAmount(line.amount)).join('+'),
    value: costs.total,
    source: 'The study’s cost plan',
  };
}
