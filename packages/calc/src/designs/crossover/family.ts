import { CalcError } from '../../errors.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import { remainingShare } from '../../outcomes/registry.js';
import type { Comparisons, RequestFor } from '../../request.js';
import { armLabels, recruitedFor } from '../allocation.js';
import type { DesignPlan, Family, Layout } from '../family.js';
import { requirePlainOutcome } from '../plain-outcome.js';
import { commonPlanningValues } from '../planning-values.js';
import { pairedContrast, requirePossiblePair } from './binary.js';
import { crossoverCautions } from './cautions.js';
import { crossoverDf, type TreatmentInformation, treatmentInformation } from './formula.js';
import { type CrossoverDesign, crossoverSchema, lettersOf } from './schema.js';
import { meanSteps, proportionSteps } from './steps.js';

/** Each participant receives several treatments, in one of several sequences. */
export const crossover: Family<CrossoverDesign> = {
  name: 'Crossover',
  schema: crossoverSchema,
  combines: { continuous: ['superiority', 'non-inferiority', 'equivalence'], binary: ['superiority'] },
  planningValues: [...commonPlanningValues, { path: 'design.correlation', key: 'withinPersonCorrelation' }],
  plan(request) {
    refuseOutcome(request);
    const { design } = request;
    const { sequences, correlation, carryover = false } = design;
    const arms = armLabels(lettersOf(sequences).length);
    const periods = sequences[0]?.length ?? 0;
    const information = estimable(sequences, carryover);
    const binary = request.outcome.kind === 'binary';
    if (binary) requirePair(request);
    else requirePossibleCorrelation(correlation, periods);
    const dfAt = (units: number) => crossoverDf(units * sequences.length, periods, arms.length, carryover);
    return {
      unitName: 'participants in each sequence',
      arms,
      comparisons: comparisonsOf(design, arms.length),
      hasDf: !binary,
      // Two in each sequence always leave a df: S(T−1) ≥ (T−1) + what is fitted, or nothing could be estimated.
      minimumUnits: 2,
      lookBelow: 0,
      periods: { count: periods, recruitment: 'before' },
      groupUnits: (units) => sequences.map(() => units),
      analyse: binary
        ? ([units = 0], [model]) => ({
            df: null,
            contrasts: [pairedContrast(model as OutcomeModel, correlation, 2 * units)],
          })
        : ([units = 0], outcomes) => ({
            df: dfAt(units),
            contrasts: outcomes.map(({ effect, variances }, k) => ({
              arm: k + 1,
              versus: 0,
              effect,
              standardError: Math.sqrt(
                (variances[0] * (1 - correlation) * (information.variances?.[k] as number)) / units,
              ),
            })),
          }),
      layout: (units) => crossoverLayout(request, arms, units),
      cautions: (layout, outcomes) => crossoverCautions(request, layout, outcomes),
      steps: (result, outcomes) =>
        binary ? proportionSteps(design, result, outcomes) : meanSteps(design, information, result, outcomes),
    } satisfies DesignPlan;
  },
};

function refuseOutcome({ outcome }: RequestFor<CrossoverDesign>): void {
  if (outcome.kind === 'binary' && outcome.method !== undefined) {
    throw new CalcError(
      'unsupported',
      'outcome.method',
      'In a crossover both proportions come from the same participants and are compared as pairs; leave the method out.',
    );
  }
  requirePlainOutcome(outcome);
}

/** What the sequences tell of the treatments. Throws CalcError `not-estimable` with the reason. */
function estimable(sequences: readonly string[], carryover: boolean): TreatmentInformation {
  const information = treatmentInformation(sequences, carryover);
  if (information.variances) return information;
  const { notEstimable } = carryover ? treatmentInformation(sequences, false) : information;
  if (notEstimable === undefined) {
    throw new CalcError(
      'not-estimable',
      'design.carryover',
      `In ${sequences.join('/')} a carryover effect cannot be told from the treatment effect within participants: plan a washout and leave carryover out, or choose sequences with more periods, such as ABB and BAA.`,
    );
  }
  throw new CalcError(
    'not-estimable',
    'design.sequences',
    `In ${sequences.join('/')} the difference of ${notEstimable} from A cannot be told within participants from that between the periods or other treatments: let participants receive both, in different orders, such as AB and BA.`,
  );
}

/** Proportions are compared in AB/BA only, as pairs. */
function requirePair({ design, outcome, dilution }: RequestFor<CrossoverDesign>): void {
  if ([...design.sequences].sort().join('/') !== 'AB/BA') {
    throw new CalcError(
      'unsupported',
      'design.sequences',
      'Proportions are compared in the two sequences AB and BA only, each named once.',
    );
  }
  if (outcome.kind !== 'binary') return;
  const { control, active } = outcome;
  requirePossiblePair(control, control + (active - control) * remainingShare(dilution), design.correlation);
}

function requirePossibleCorrelation(correlation: number, periods: number): void {
  const lowest = -1 / (periods - 1);
  if (correlation > lowest) return;
  throw new CalcError(
    'impossible-correlation',
    'design.correlation',
    `${periods} periods cannot all have a correlation of ${correlation} with each other; it must be above ${lowest.toPrecision(3)}.`,
  );
}

/** More than two treatments are each compared with A; left unsaid, without adjustment. */
function comparisonsOf({ comparisons }: CrossoverDesign, treatments: number): Comparisons | undefined {
  if (!comparisons) {
    return treatments > 2 ? { against: 'control', adjust: 'none', powerGoal: 'per-comparison' } : undefined;
  }
  const refuse = (field: keyof Comparisons, message: string) =>
    new CalcError('unsupported', `design.comparisons.${field}`, message);
  if (comparisons.against !== 'control') {
    throw refuse('against', 'In a crossover each treatment is compared with A, the control.');
  }
  if (comparisons.adjust !== 'none' && comparisons.adjust !== 'bonferroni') {
    throw refuse('adjust', 'The comparisons of a crossover are left unadjusted or adjusted by Bonferroni.');
  }
  if (comparisons.powerGoal !== 'per-comparison') {
    throw refuse('powerGoal', 'The power of a crossover is computed per comparison.');
  }
  return comparisons;
}

function crossoverLayout(
  { design, attrition }: RequestFor<CrossoverDesign>,
  arms: readonly string[],
  units: number,
): Layout {
  const recruited = recruitedFor(units, attrition?.participants);
  const given = design.sequences.join('');
  return {
    groups: design.sequences.map((label) => ({ label, units, participants: units, recruited })),
    arms: arms.map((label, arm) => {
      const occurrences = [...given].filter((letter) => letter === 'ABCDEFGHIJ'[arm]).length;
      const exposures = recruited * occurrences;
      return { label, exposures, measurements: exposures, clusterPeriods: 0 };
    }),
  };
}
