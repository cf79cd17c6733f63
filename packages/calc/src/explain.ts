import type { Feasible, Step } from './appraisal.js';
import { moneyAndTime } from './appraise.js';
import { type Bound, bind, type Evaluated } from './bind.js';
import type { Layout } from './designs/family.js';
import { outcomeSteps } from './explain/outcome-steps.js';
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

function testSteps(bound: Bound, { analysis, criticalValue, powers }: Evaluated): Step[] {
  const { test } = bound.request;
  const { df } = analysis;
  const count = analysis.contrasts.length;
  const adjusted = bound.alphaPerComparison !== test.alpha;
  const tail = bound.alphaPerComparison / test.sides;
  const steps: Step[] = [];
  if (adjusted) {
    steps.push({
      label: 'Type I error of each comparison',
      formula: '\\alpha_c=\\alpha/C',
      substituted: `${tex(test.alpha)}/${count}`,
      value: bound.alphaPerComparison,
      source: 'Bonferroni’s inequality',
    });
  }
  const alpha = adjusted ? '\\alpha_c' : '\\alpha';
  const tailFormula = test.sides === 2 ? `${alpha}/2` : alpha;
  steps.push({
    label: `Critical value, ${test.sides === 2 ? 'two-sided' : 'one-sided'}`,
    formula: df === null ? `P(Z>c)=${tailFormula}` : `P(T_\\nu>c)=${tailFormula}`,
    substituted: df === null ? `P(Z>c)=${tex(tail)}` : `P(T_{${tex(df)}}>c)=${tex(tail)}`,
    value: criticalValue,
    source: df === null ? 'Normal distribution' : 'Student’s t distribution',
  });
  analysis.contrasts.forEach((contrast, index) => {
    const { standardError: se, nullStandardError: se0, correction } = contrast;
    const delta = Math.abs(contrast.effect);
    const name =
      count === 1
        ? 'Power'
        : `Power, ${bound.plan.arms[contrast.arm]} against ${bound.plan.arms[contrast.versus]}`;
    const taken = correction === undefined ? '' : '-\\mathrm{cc}';
    const takenValue = correction === undefined ? '' : `-${tex(correction)}`;
    const power = powers[index] as number;
    steps.push(
      df === null
        ? {
            label: name,
            formula: `1-\\beta=\\Phi\\!\\left(\\frac{|\\delta|${taken}-c\\,\\mathrm{SE}${se0 === undefined ? '' : '_0'}}{\\mathrm{SE}}\\right)`,
            substituted: `\\Phi\\!\\left(\\frac{${tex(delta)}${takenValue}-${tex(criticalValue)}\\times${tex(se0 ?? se)}}{${tex(se)}}\\right)`,
            value: power,
            source: 'Fleiss, Levin & Paik 2003; Julious 2004',
          }
        : {
            label: name,
            formula: "1-\\beta=P\\!\\left(T'_{\\nu}(|\\delta|/\\mathrm{SE})>c\\right)",
            substituted: `P\\!\\left(T'_{${tex(df)}}(${tex(delta / se)})>${tex(criticalValue)}\\right)`,
            value: power,
            source: 'Noncentral t distribution; Julious 2004, Stat Med 23:1921',
          },
    );
  });
  return steps;
}

function answerSteps({ request, plan, outcomes }: Bound, solution: Solution, evaluated: Evaluated): Step[] {
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
        label:
          outcomes[0]?.kind === 'binary'
            ? 'Detectable active proportion'
            : 'Detectable difference, before dilution',
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
  const clustered = group.clusters !== undefined;
  return [
    {
      label: 'Recruited in all, so that the analysed remain',
      formula: clustered
        ? '\\sum_g\\left\\lceil\\frac{k_g}{1-a_k}\\right\\rceil\\left\\lceil\\frac{m}{1-a}\\right\\rceil'
        : '\\sum_g\\left\\lceil\\frac{n_g}{1-a}\\right\\rceil',
      substituted: layout.groups
        .map((each) =>
          clustered
            ? `${each.recruitedClusters}\\times${layout.recruitedPerCluster}`
            : `\\left\\lceil\\frac{${each.participants}}{1-${tex(lost ?? 0)}}\\right\\rceil`,
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
