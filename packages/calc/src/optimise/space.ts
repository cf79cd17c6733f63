import { moneyAndTime } from '../appraise.js';
import { type Bound, bind } from '../bind.js';
import type { Load } from '../comparison/limits.js';
import { ceilForgiving, recruitedFor } from '../designs/allocation.js';
import type { Reallocation } from '../designs/family.js';
import { type Design, familyOf } from '../designs/registry.js';
import { CalcError } from '../errors.js';
import type { Box } from '../numeric/branch-and-bound.js';
import type { AppraisalRequest } from '../parse-request.js';
import { largestCount } from '../request.js';
import { totalsOf } from '../totals.js';
import type { SearchPlan } from './search-plan.js';

/** One design at one size. */
export interface Sized {
  bound: Bound;
  units: number;
  clusterSize: number | undefined;
}

/** The sizes a search goes over: some that span a box, and one, the innermost, that is solved for. */
export interface Space {
  box: Box;
  inner(box: Box): { from: number; to: number };
  at(outer: readonly number[], inner: number): Sized;
  /** How far below a solved inner size a smaller one may still reach the power. */
  lookBelow: number;
  fewestUnits: number;
  /** Whether `mostPowerAt` is known to rise with every size, so that a search can prove its answer. */
  rises: boolean;
  /** How many ranges a search may look at before it gives up proving: fewer where each takes its time. */
  patience: number;
  /** A whole design of so many units in the base group, of a cluster size and ratio opposite near those wanted. */
  near(units: number, wanted: Shape): { outer: number[]; inner: number };
}

/** The proportions of a design, whatever its number of units: what the closed forms are about. */
export interface Shape {
  clusterSize?: number | undefined;
  /** Of the units opposite to those of the base group. */
  ratio?: number | undefined;
}

/**
 * The sizes of a request that a search may take: cluster size and units where they are free, then the units, or
 * the group opposite where the allocation is free.
 *
 * Throws CalcError as `appraise` does, and `unsupported` where the design has no cluster size or no arms to share.
 */
export function spaceOf(request: AppraisalRequest, { clusterSize, allocation }: SearchPlan): Space {
  const base = bind({ ...request, aim: { find: 'power', units: largestCount } });
  if (clusterSize && base.plan.clusterSize === undefined) {
    throw new CalcError(
      'unsupported',
      'search.clusterSize',
      'Only designs that randomise clusters have a cluster size to search.',
    );
  }
  const arms = familyOf(request.design.family).reallocation?.(request.design);
  const always = risesWithGroups(base);
  const sizes: Sizes = {
    ranges: clusterSize ? [clusterSize] : [],
    at: (outer) => (clusterSize ? outer[0] : base.plan.clusterSize),
    near: (wanted = 1) => (clusterSize ? [within(clusterSize, Math.round(wanted))] : []),
  };
  if (!allocation) return asAllocated(base, sizes, always);
  if (!arms) {
    throw new CalcError(
      'unsupported',
      'search.allocation',
      'The groups of this design are always equal, or share by sequence: there is no allocation to search.',
    );
  }
  return reallocated(base, sizes, arms, allocation, always);
}

/** The cluster size as a dimension of its own, or as it is. */
interface Sizes {
  ranges: readonly Range[];
  at(outer: readonly number[]): number | undefined;
  near(wanted: number | undefined): number[];
}

interface Range {
  from: number;
  to: number;
}

function asAllocated(base: Bound, sizes: Sizes, always: boolean): Space {
  const { minimumUnits, lookBelow } = base.plan;
  return {
    box: boxOf(sizes.ranges),
    inner: () => ({ from: minimumUnits, to: largestCount }),
    at: (outer, units) => ({ bound: base, units, clusterSize: sizes.at(outer) }),
    lookBelow,
    fewestUnits: minimumUnits,
    // Groups in whole ratios grow together, whatever the test.
    rises: always || lookBelow === 0,
    patience: patienceOf(base),
    near: (units, wanted) => ({ outer: sizes.near(wanted.clusterSize), inner: units }),
  };
}

function reallocated(
  base: Bound,
  sizes: Sizes,
  arms: Reallocation<Design>,
  allocation: Range,
  always: boolean,
): Space {
  const [low, high] =
    arms.base === 'control'
      ? [allocation.from, allocation.to]
      : [arms.perUnit / allocation.to, arms.perUnit / allocation.from];
  const opposite = (fewest: number, most: number) => ({
    from: Math.max(arms.fewestOpposite, ceilForgiving(fewest * low)),
    to: Math.floor(most * high + 1e-9),
  });
  return {
    box: boxOf([...sizes.ranges, { from: 2, to: largestCount }]),
    inner: (box) => opposite(box.low.at(-1) as number, box.high.at(-1) as number),
    at: (outer, inner) => {
      const units = outer.at(-1) as number;
      const bound = bind({ ...base.request, design: arms.at(units, inner) });
      return { bound, units, clusterSize: sizes.at(outer) };
    },
    lookBelow: 0,
    fewestUnits: 2,
    rises: always,
    patience: patienceOf(base),
    near: (units, { clusterSize, ratio = Math.sqrt(low * high) }) => ({
      outer: [...sizes.near(clusterSize), units],
      inner: within(opposite(units, units), Math.round(units * ratio)),
    }),
  };
}

/**
 * With a larger group a t test, at the most that its df could be, or a normal test with a variance for each arm gains
 * power. Not always so where the arms decide the variance together, or the comparisons are tested together.
 */
function risesWithGroups({ plan, outcomes, multiplicity, analyse }: Bound): boolean {
  return (
    multiplicity.separate &&
    outcomes.every((outcome) => !outcome.variance) &&
    analyse(plan.groupUnits(plan.minimumUnits)).contrasts.every(
      ({ nullStandardError }) => nullStandardError === undefined,
    )
  );
}

/** Comparisons that are tested together take some hundred times as long as those that are not. */
const patienceOf = ({ multiplicity: { separate, alphaPerComparison } }: Bound) =>
  separate && alphaPerComparison !== undefined ? 20_000 : 2_000;

const within = ({ from, to }: Range, x: number) => Math.max(from, Math.min(to, x || from));

const boxOf = (ranges: readonly Range[]): Box => ({
  low: ranges.map(({ from }) => from),
  high: ranges.map(({ to }) => to),
});

export function powerAt({ bound, units, clusterSize }: Sized): number {
  return bound.evaluate(bound.plan.groupUnits(units), clusterSize).power;
}

/** The power with the most df that so many units could have: it rises with every size, and the power is not above it. */
export function mostPowerAt(sized: Sized): number {
  const { bound, units, clusterSize } = sized;
  const analysis = bound.analyse(bound.plan.groupUnits(units), clusterSize);
  const { df, dfAtMost } = analysis;
  if (df === null || dfAtMost === undefined) return powerAt(sized);
  const widened = { ...analysis, df: dfAtMost };
  const { criticalValue, powers } = bound.multiplicity;
  return powers(widened, criticalValue(widened), bound.test).goal;
}

/** What a size takes of the limits, and how many participants it recruits. */
export type SizedLoad = Load & { recruited: number };

export function loadAt({ bound, units, clusterSize }: Sized): SizedLoad {
  const layout = bound.plan.layout(units, clusterSize);
  const totals = totalsOf(layout);
  const { costs, timeline } = moneyAndTime(bound, layout, totals);
  return {
    recruited: totals.recruited,
    clusters: totals.recruitedClusters,
    participantsPerCluster: clusterSize && recruitedFor(clusterSize, bound.request.attrition?.participants),
    money: costs?.total,
    months: timeline?.months,
  };
}

/** The request that asks for the power at that size. */
export function requestAt({ bound: { request }, units, clusterSize }: Sized): AppraisalRequest {
  const design = clusterSize === undefined ? request.design : { ...request.design, clusterSize };
  return { ...request, design, aim: { find: 'power', units } } as AppraisalRequest;
}
