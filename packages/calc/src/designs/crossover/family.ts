import type { Caution, Step } from '../../appraisal.js';
import { CalcError } from '../../errors.js';
import { tex, texFactor } from '../../explain/tex.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { ContinuousOutcome, RequestFor } from '../../request.js';
import { recruitedFor } from '../allocation.js';
import type { DesignPlan, Family, Layout } from '../family.js';
import { individualPlanningValues } from '../planning-values.js';
import { abbaStandardError } from './formula.js';
import { type CrossoverDesign, crossoverSchema } from './schema.js';

/** Each participant receives both treatments, in one order or the other. */
export const crossover: Family<CrossoverDesign> = {
  name: 'Crossover',
  schema: crossoverSchema,
  combines: { continuous: ['superiority'] },
  planningValues: [
    ...individualPlanningValues,
    { path: 'design.correlation', key: 'withinPersonCorrelation' },
  ],
  plan(request) {
    refuseOtherSequences(request.design);
    const outcome = plainContinuous(request);
    const { correlation } = request.design;
    return {
      unitName: 'participants in each sequence',
      arms: ['Control', 'Active'],
      comparisons: request.design.comparisons,
      hasDf: true,
      minimumUnits: 2,
      lookBelow: 0,
      periods: 2,
      groupUnits: (units) => [units, units],
      analyse: ([first = 0, second = 0], [model]) => ({
        df: first + second - 2,
        contrasts: [
          {
            arm: 1,
            versus: 0,
            effect: (model as OutcomeModel).effect,
            standardError: abbaStandardError(outcome.sd, correlation, first + second),
          },
        ],
      }),
      layout: (units) => crossoverLayout(request, units),
      cautions: () => crossoverCautions(request),
      steps: ({ groupUnits, analysis }) => steps(outcome.sd, correlation, groupUnits, analysis),
    };
  },
};

function refuseOtherSequences({ sequences, carryover }: CrossoverDesign): void {
  if ([...sequences].sort().join('/') !== 'AB/BA') {
    throw new CalcError(
      'unsupported',
      'design.sequences',
      'Only the two sequences AB and BA are computed yet, each named once.',
    );
  }
  if (carryover) {
    throw new CalcError(
      'not-estimable',
      'design.carryover',
      'In AB/BA a carryover effect cannot be told from the treatment effect within participants: plan a washout, or choose other sequences.',
    );
  }
}

function plainContinuous({ outcome }: RequestFor<CrossoverDesign>): ContinuousOutcome {
  const continuous = outcome as ContinuousOutcome;
  const extra = continuous.sdActive !== undefined ? 'sdActive' : continuous.repeated ? 'repeated' : undefined;
  if (extra) {
    throw new CalcError(
      'unsupported',
      `outcome.${extra}`,
      extra === 'sdActive'
        ? 'A crossover is planned with one SD for both treatments; leave the active arm’s SD out.'
        : 'A crossover already compares each participant with themselves; leave the repeated measurements out.',
    );
  }
  return continuous;
}

function crossoverLayout({ design, attrition }: RequestFor<CrossoverDesign>, units: number): Layout {
  const recruited = recruitedFor(units, attrition?.participants);
  const exposures = recruited * design.sequences.length;
  return {
    groups: design.sequences.map((label) => ({ label, units, participants: units, recruited })),
    arms: ['Control', 'Active'].map((label) => ({
      label,
      exposures,
      measurements: exposures,
      clusterPeriods: 0,
    })),
  };
}

function crossoverCautions({ attrition, timeline }: RequestFor<CrossoverDesign>): Caution[] {
  const cautions: Caution[] = [
    {
      code: 'carryover',
      message:
        'No carryover from the first period into the second is assumed. A carryover of a share of the effect biases the estimate by half that share; testing for it first does not help.',
      source: 'Senn 2002',
    },
  ];
  if (!timeline?.washout) {
    cautions.push({
      code: 'no-washout',
      message:
        'No washout between the periods is planned. State one, and what it rests on, or why none is needed.',
      source: 'Jones & Kenward 2014',
    });
  }
  if (attrition?.participants) {
    cautions.push({
      code: 'completers-only',
      message:
        'Only participants who complete both periods are analysed; those lost after one period are replaced in the number recruited, and add nothing.',
      source: 'Senn 2002',
    });
  }
  return cautions;
}

function steps(
  sd: number,
  correlation: number,
  sizes: readonly number[],
  analysis: ReturnType<DesignPlan['analyse']>,
): Step[] {
  const participants = sizes.reduce((sum, size) => sum + size, 0);
  return [
    {
      label: 'Standard error of the effect, within participants',
      formula: '\\mathrm{SE}=\\sigma\\sqrt{\\frac{2(1-\\rho)}{N}}',
      substituted: `${tex(sd)}\\sqrt{\\frac{2(1-${texFactor(correlation)})}{${tex(participants)}}}`,
      value: analysis.contrasts[0]?.standardError as number,
      source: 'Senn 2002; Jones & Kenward 2014',
    },
    ...(analysis.df === null ? [] : [dfStep(participants, analysis.df)]),
  ];
}

function dfStep(participants: number, df: number): Step {
  return {
    label: 'Degrees of freedom',
    formula: '\\nu=N-2',
    substituted: `${tex(participants)}-2`,
    value: df,
    source: 'Jones & Kenward 2014: participants, periods and treatment fitted',
  };
}
