import type { z } from 'zod';
import type { Caution, Group, Step } from '../appraisal.js';
import type { PlanningValueKey } from '../comparison/planning-values.js';
import type { OutcomeModel } from '../outcomes/outcome-model.js';
import type { Comparisons, Hypothesis, OutcomeKind, RequestFor } from '../request.js';
import type { Analysis } from '../tests/analysis.js';

/** Everything Steelyard knows of one kind of design: its schema, what it combines with, and its plan. */
export interface Family<D> {
  name: string;
  schema: z.ZodType<D>;
  /** The hypotheses it answers, by outcome; what is not listed is a CalcError. */
  combines: Partial<Record<OutcomeKind, readonly Hypothesis[]>>;
  /** Where in the request each of the ledger's planning values goes. */
  planningValues: readonly { path: string; key: PlanningValueKey }[];
  /** Binds the formula to one request. Throws CalcError where the method's conditions are not met. */
  plan(request: RequestFor<D>): DesignPlan;
}

/** A family's formula bound to one request: effect, standard error and df at any size follow from it. */
export interface DesignPlan {
  /** What `units` counts, as in “participants in the control arm”. */
  unitName: string;
  /** Treatments, control first. */
  arms: readonly string[];
  comparisons?: Comparisons | undefined;
  /** Has the design a df of its own, so that `reference` means something? */
  hasDf: boolean;
  /** Fewest units at which every group has two and the test a degree of freedom. */
  minimumUnits: number;
  /** How far below a bisection's answer rounded group sizes may still reach the aim. */
  lookBelow: number;
  /** Two equal parallel arms, whose equation has a real-valued solution too. */
  equalPair?: boolean;
  /** Participants analysed per cluster; undefined where individuals are randomised. */
  clusterSize?: number | undefined;
  groupUnits(units: number): number[];
  /** Group sizes may be real; one outcome model per active arm. */
  analyse(groupUnits: readonly number[], outcomes: readonly OutcomeModel[], clusterSize?: number): Analysis;
  layout(units: number, clusterSize?: number): Layout;
  /** How months pass after recruitment: one follow-up, or periods with washouts between. */
  periods?: number;
  designEffect?(clusterSize: number): number;
  cautions(layout: Layout, outcomes: readonly OutcomeModel[]): Caution[];
  /** The lines of the working that are this family's own: from the effect to the standard error and df. */
  steps(result: WorkedSize, outcomes: readonly OutcomeModel[]): Step[];
}

export interface WorkedSize {
  units: number;
  clusterSize?: number | undefined;
  groupUnits: readonly number[];
  analysis: Analysis;
}

/** Who is randomised, treated and measured at a given size. */
export interface Layout {
  groups: Group[];
  arms: { label: string; exposures: number; measurements: number; clusterPeriods: number }[];
  recruitedPerCluster?: number;
}
