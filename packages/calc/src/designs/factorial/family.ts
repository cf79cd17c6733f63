import type { Step } from '../../appraisal.js';
import { tex, texFactor } from '../../explain/tex.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { ContinuousOutcome, RequestFor } from '../../request.js';
import { recruitedFor } from '../allocation.js';
import type { Family, Layout, WorkedSize } from '../family.js';
import { requirePlainOutcome } from '../plain-outcome.js';
import { commonPlanningValues } from '../planning-values.js';
import { varianceFactor } from './formula.js';
import { type FactorialDesign, factorialSchema } from './schema.js';

const cells = ['Control', 'A', 'B', 'AB'] as const;

/** Two treatments crossed: each participant receives neither, one or both. */
export const factorial: Family<FactorialDesign> = {
  name: 'Factorial',
  schema: factorialSchema,
  combines: { continuous: ['superiority'] },
  planningValues: commonPlanningValues,
  plan(request) {
    requirePlainOutcome(request.outcome);
    const { estimand } = request.design;
    return {
      unitName: 'participants in each of the four cells',
      arms: cells,
      hasDf: true,
      minimumUnits: 2,
      lookBelow: 0,
      groupUnits: (units) => [units, units, units, units],
      analyse: (sizes, [outcome]) => {
        const { variances, effect } = outcome as OutcomeModel;
        const standardError = Math.sqrt(variances[0] * varianceFactor(estimand, sizes));
        const participants = sizes.reduce((sum, size) => sum + size, 0);
        return { df: participants - 4, contrasts: [{ arm: 1, versus: 0, effect, standardError }] };
      },
      layout: (units) => factorialLayout(request, units),
      cautions: () => [],
      steps: (result) => steps(request, result),
    };
  },
};

function factorialLayout({ attrition }: RequestFor<FactorialDesign>, units: number): Layout {
  const recruited = recruitedFor(units, attrition?.participants);
  return {
    groups: cells.map((label) => ({ label, units, participants: units, recruited })),
    arms: cells.map((label) => ({ label, exposures: recruited, measurements: recruited, clusterPeriods: 0 })),
  };
}

function steps({ design, outcome }: RequestFor<FactorialDesign>, { units, analysis }: WorkedSize): Step[] {
  const { sd } = outcome as ContinuousOutcome;
  const mainEffect = design.estimand === 'main-effect';
  const factor = mainEffect ? 2 : 4;
  const participants = 4 * units;
  const size: Step = {
    label: 'Participants in the four cells',
    formula: 'N=4u',
    substituted: `4\\times${tex(units)}`,
    value: participants,
    source: 'Equal cells: control, A, B and AB',
  };
  const error: Step = {
    label: mainEffect
      ? 'Standard error of the main effect, averaged over the other treatment'
      : 'Standard error of the interaction, a difference of two differences',
    formula: `\\mathrm{SE}=\\frac{${factor}\\sigma}{\\sqrt N}`,
    substituted: `\\frac{${factor}\\times${texFactor(sd)}}{\\sqrt{${tex(participants)}}}`,
    value: analysis.contrasts[0]?.standardError as number,
    source: 'Brookes et al. 2004, J Clin Epidemiol 57:229',
  };
  if (analysis.df === null) return [size, error];
  const df: Step = {
    label: 'Degrees of freedom',
    formula: '\\nu=N-4',
    substituted: `${tex(participants)}-4`,
    value: analysis.df,
    source: 'Pooled SD of the four cells',
  };
  return [size, error, df];
}
