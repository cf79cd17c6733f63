import type { z } from 'zod';
import type { Caution, Group, Step } from '../appraisal.js';
import type { PlanningValuePlace } from '../comparison/planning-values.js';
import type { OutcomeModel } from '../outcomes/outcome-model.js';
import type { Comparisons, Hypothesis, OutcomeKind, RequestFor } from '../request.js';
import type { Analysis } from '../tests/analysis.js';
import type { Lever } from './levers.js';

/** Everything Steelyard knows of one kind of design: its schema, what it combines with, and its plan. */
export interface Family<D> {
  name: string;
  schema: z.ZodType<D>;
  /** The hypotheses it answers, by outcome; what is not listed is a CalcError. */
  combines: Partial<Record<OutcomeKind, readonly Hypothesis[]>>;
  /** Where in the request each of the ledger's planning values goes. */
  planningValues: readonly PlanningValuePlace[];
  /** Changes of an option that may cut its participants. */
  levers?: readonly Lever[];
  /** Binds the formula to one request. Throws CalcError where the method's conditions are not met. */
  plan(request: RequestFor<D>): DesignPlan;
  /** How the shares of control and active arms change; none where groups are not arms, or always equal. */
  reallocation?(design: D): Reallocation<D>;
}

/** A design with any number of units in its base group, and any number in the (first) group opposite. */
export interface Reallocation<D> {
  base: 'control' | 'active';
  /** What one unit of the base group counts against one of the group opposite. */
  perUnit: number;
  fewestOpposite: number;
  at(units: number, opposite: number): D;
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
  /** Participants analysed per cluster, where it is one number that may be asked for. */
  clusterSize?: number | undefined;
  /** Can whole clusters be lost? */
  losesClusters?: boolean;
  groupUnits(units: number): number[];
  /** Group sizes may be real; one outcome model per active arm. */
  analyse(groupUnits: readonly number[], outcomes: readonly OutcomeModel[], clusterSize?: number): Analysis;
  layout(units: number, clusterSize?: number): Layout;
  /** Periods instead of one follow-up: after recruitment with washouts between, or with recruitment within each. */
  periods?: { count: number; recruitment: 'before' | 'within' };
  designEffect?(result: WorkedSize): number | undefined;
  /** Events that the aim requires and that the size leads one to expect, of a time-to-event outcome. */
  events?(result: WorkedSize, outcomes: readonly OutcomeModel[]): { required?: number; expected: number };
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
