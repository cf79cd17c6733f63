import type { Infeasible } from './appraisal.js';
import type { Bound, Evaluated } from './bind.js';
import { normalQuantile } from './distributions/normal.js';
import { smallestInteger } from './numeric/integer-search.js';
import { maximum } from './numeric/maximum.js';
import { findRoot } from './numeric/root.js';
import { secantRoot } from './numeric/secant.js';
import type { OutcomeModel } from './outcomes/outcome-model.js';
import { powerRoot } from './power-root.js';
import { largestCount } from './request.js';
import type { Analysis, Contrast } from './tests/analysis.js';

export interface Solution {
  units: number;
  clusterSize?: number | undefined;
  /** The outcomes the answer is evaluated at: the request's own, or those of the detectable effect. */
  outcomes: readonly OutcomeModel[];
  /** At the answer, where the search ended on it: the last size it found to reach the power. */
  evaluated?: Evaluated | undefined;
  detectable?: number;
  unroundedUnits?: number;
}

type Shortfall = Infeasible['infeasible'];

/** The size or effect that the aim asks for, or why none will do. */
export function solve(bound: Bound): Solution | Shortfall {
  const { aim } = bound.request;
  const { clusterSize } = bound.plan;
  const asked = { clusterSize, outcomes: bound.outcomes };
  const beyond = beyondMargin(bound);
  if (beyond) return beyond;
  switch (aim.find) {
    case 'power':
      return { ...asked, units: aim.units };
    case 'size':
      return solveSize(bound, aim.power);
    case 'effect': {
      const target = detectableEffect(bound, aim.units, aim.power, clusterSize);
      if (typeof target !== 'number') return target;
      const model = (bound.outcomes[0] as OutcomeModel).at(target);
      return { ...asked, units: aim.units, outcomes: bound.outcomes.map(() => model), detectable: target };
    }
    case 'cluster-size':
      return solveClusterSize(bound, aim.units, aim.power);
  }
}

/** Non-inferiority or equivalence cannot be shown of an effect that is at its margin or beyond. */
function beyondMargin({ request: { test }, test: { distance }, outcomes }: Bound): Shortfall | undefined {
  if (test.hypothesis === 'superiority') return undefined;
  const nearest = Math.min(...outcomes.map(({ effect }) => distance(effect)));
  if (nearest > 0) return undefined;
  return {
    code: 'margin',
    message: `The expected effect lies ${nearest === 0 ? 'at' : 'beyond'} the margin, so no size can show ${test.hypothesis}. Reconsider the margin, the expected effect or the question.`,
    limitingPower: nearest === 0 ? test.alpha : 0,
  };
}

function solveSize(bound: Bound, power: number): Solution | Shortfall {
  const { plan } = bound;
  const guess = guessUnits(bound, power);
  const superiority = bound.request.test.hypothesis === 'superiority';
  const unrounded =
    plan.equalPair && superiority && guess <= largestCount ? unroundedUnits(bound, guess, power) : undefined;
  // Below the real-valued solution nothing reaches the power: there is no rounding that could.
  const floor = unrounded === undefined ? 0 : unrounded * (1 - 1e-9);
  let evaluated: Evaluated | undefined;
  const reaches = (units: number) => {
    if (units < floor) return false;
    const at = bound.evaluate(plan.groupUnits(units));
    if (at.power >= power) evaluated = at;
    return at.power >= power;
  };
  const units =
    guess > largestCount
      ? undefined
      : smallestInteger(reaches, {
          from: plan.minimumUnits,
          to: largestCount,
          guess: Math.ceil(unrounded ?? guess),
          lookBelow: plan.lookBelow,
        });
  if (units === undefined) {
    return {
      code: 'effect',
      message: `The effect is too small against its variability: more than ${largestCount.toLocaleString('en-GB')} units would be needed in a group.`,
      limitingPower: bound.evaluate(plan.groupUnits(largestCount)).power,
    };
  }
  const solution: Solution = { units, clusterSize: plan.clusterSize, outcomes: bound.outcomes, evaluated };
  return unrounded === undefined ? solution : { ...solution, unroundedUnits: unrounded };
}

/**
 * Units from |δ|/SE growing with their square root under the normal distribution, and z²/(2 df) of them more
 * where there is a df: close enough that the search begins within a unit or so of its end.
 *
 * Source: Guenther 1981, Am Stat 35:243, for the correction.
 */
function guessUnits(bound: Bound, power: number): number {
  const { plan } = bound;
  const start = Math.max(plan.minimumUnits, 100);
  const atStart = { ...bound.analyse(plan.groupUnits(start)), df: null };
  const critical = bound.multiplicity.criticalValue(atStart);
  const shares = atStart.contrasts.map(
    (contrast) =>
      (bound.test.noncentralityNeeded(contrast, critical, null, power) * contrast.standardError) /
      bound.test.distance(contrast.effect),
  );
  const share = Math.max(...shares);
  const factor = bound.multiplicity.separate ? share : jointShare(bound, atStart, critical, power, share);
  const units = start * factor ** 2;
  if (!(units < largestCount)) return units;
  const { df } = bound.analyse(plan.groupUnits(Math.max(plan.minimumUnits, Math.ceil(units))));
  return df === null ? units : units * (1 + critical ** 2 / (2 * df));
}

/** How much larger each |δ|/SE has to be for a goal of several comparisons, from what the hardest of them needs. */
function jointShare(
  { multiplicity, test }: Bound,
  { df, contrasts }: Analysis,
  critical: number,
  power: number,
  guess: number,
): number {
  const powerAt = (share: number) => {
    const closer = contrasts.map((each) => ({ ...each, standardError: each.standardError / share }));
    return multiplicity.powers({ df, contrasts: closer }, critical, test).goal;
  };
  return powerRoot(powerAt, power, guess, 1e-4) ?? 0;
}

/**
 * The real-valued solution of two equal arms: power(n) = aim, on the normal-quantile scale of the power and
 * over √n, where the curve is nearly straight.
 */
function unroundedUnits(bound: Bound, guess: number, power: number): number | undefined {
  const aimed = normalQuantile(power);
  const surplus = (root: number) => normalQuantile(bound.evaluate([root * root, root * root]).power) - aimed;
  const near = Math.sqrt(guess);
  const contrast = bound.analyse([guess, guess]).contrasts[0] as Contrast;
  const slope = Math.abs(contrast.effect) / contrast.standardError / near;
  const close = secantRoot(surplus, near, slope, 1e-12);
  if (close !== undefined) return close * close;
  const covariates = bound.outcomes[0]?.covariates ?? 0;
  const lowest = bound.plan.hasDf ? 1 + covariates / 2 + 1e-6 : 1e-6;
  const highest = 2 * Math.max(near, Math.sqrt(bound.plan.minimumUnits));
  const { root, converged } = findRoot(surplus, Math.sqrt(lowest), highest, { tolerance: 1e-14 });
  return converged ? root * root : undefined;
}

/** The target nearest the null that reaches the power at a given size, before dilution. */
export function detectableEffect(
  bound: Bound,
  units: number,
  power: number,
  clusterSize: number | undefined,
): number | Shortfall {
  const model = bound.outcomes[0] as OutcomeModel;
  const groupUnits = bound.plan.groupUnits(units);
  if (!model.varianceFixed) return searchedEffect(bound, groupUnits, model, power, clusterSize);
  const alike = bound.outcomes.map(() => model);
  const separate = closedFormEffect(bound, bound.evaluate(groupUnits, clusterSize, alike), model, power);
  return bound.multiplicity.separate
    ? separate
    : jointEffect(bound, groupUnits, model, power, clusterSize, separate);
}

function closedFormEffect(
  bound: Bound,
  { analysis, criticalValue }: Evaluated,
  model: OutcomeModel,
  power: number,
): number {
  const needed = analysis.contrasts.map(
    (contrast) =>
      bound.test.noncentralityNeeded(contrast, criticalValue, analysis.df, power) * contrast.standardError,
  );
  return (
    (Math.sign(model.target - model.nullTarget) * Math.max(...needed)) / model.dilution + model.nullTarget
  );
}

/** For a goal of several comparisons, from the effect that the hardest of them needs by itself. */
function jointEffect(
  bound: Bound,
  groupUnits: readonly number[],
  model: OutcomeModel,
  power: number,
  clusterSize: number | undefined,
  separate: number,
): number | Shortfall {
  const powerAt = (share: number) => {
    const moved = model.at(model.nullTarget + share * (separate - model.nullTarget));
    return bound.evaluate(
      groupUnits,
      clusterSize,
      bound.outcomes.map(() => moved),
    ).power;
  };
  const share = powerRoot(powerAt, power, 1, 1e-13);
  if (share !== undefined) return model.nullTarget + share * (separate - model.nullTarget);
  return {
    code: 'effect',
    message:
      'So low a power is reached by chance alone with this many comparisons, without any effect. Ask for more power.',
  };
}

const effectGrid = 64;

function searchedEffect(
  bound: Bound,
  groupUnits: readonly number[],
  model: OutcomeModel,
  power: number,
  clusterSize: number | undefined,
): number | Shortfall {
  const targetAt = (share: number) =>
    model.targetAlong?.(share) ?? model.nullTarget + share * (model.targetLimit - model.nullTarget);
  const powerAt = (share: number) => {
    const moved = model.at(targetAt(share));
    return bound.evaluate(
      groupUnits,
      clusterSize,
      bound.outcomes.map(() => moved),
    ).power;
  };
  const firstIn = (below: number, share: number) =>
    targetAt(findRoot((x) => powerAt(x) - power, below, share, { tolerance: 1e-14 }).root);
  let peak = 0;
  let highest = 0;
  for (let step = 1; step <= effectGrid; step += 1) {
    const share = step / effectGrid;
    const reached = powerAt(share);
    if (reached >= power) return firstIn(share - 1 / effectGrid, share);
    if (reached > highest) {
      highest = reached;
      peak = share;
    }
  }
  // Power falls again where a rarer event makes the larger effect harder to see: the peak may lie between steps.
  const below = Math.max(0, peak - 1 / effectGrid);
  peak = maximum(powerAt, below, Math.min(1, peak + 1 / effectGrid));
  highest = Math.max(highest, powerAt(peak));
  if (highest >= power) return firstIn(below, peak);
  return {
    code: 'effect',
    message: `No effect on this side of none reaches the power at this size: the highest is ${(100 * highest).toFixed(1)} %.`,
    limitingPower: highest,
  };
}

function solveClusterSize(bound: Bound, units: number, power: number): Solution | Shortfall {
  const { plan } = bound;
  const at = (count: number, clusterSize: number) =>
    bound.evaluate(plan.groupUnits(count), clusterSize).power;
  // Where only a size beyond all that may be named would reach the power, that is no answer either.
  const limitAt = (count: number) => {
    const limit = at(count, Number.POSITIVE_INFINITY);
    return limit > power ? at(count, largestCount) : limit;
  };
  const limit = limitAt(units);
  const clusterSize =
    limit > power
      ? smallestInteger((size) => at(units, size) >= power, { from: 1, to: largestCount, guess: 16 })
      : undefined;
  if (clusterSize !== undefined) return { units, clusterSize, outcomes: bound.outcomes };
  const fewestUnits = smallestInteger((count) => limitAt(count) > power, {
    from: plan.minimumUnits,
    to: largestCount,
    guess: units + 1,
    lookBelow: plan.lookBelow,
  });
  return {
    code: 'clusters',
    message: `With these clusters no cluster size reaches the power: however large they grow, power stays below ${(100 * limit).toFixed(1)} %.`,
    limitingPower: limit,
    ...(fewestUnits === undefined ? {} : { fewestUnits }),
  };
}
