import type { Infeasible } from './appraisal.js';
import type { Bound, Evaluated } from './bind.js';
import { normalQuantile } from './distributions/normal.js';
import { smallestInteger } from './numeric/integer-search.js';
import { findRoot } from './numeric/root.js';
import { secantRoot } from './numeric/secant.js';
import type { OutcomeModel } from './outcomes/outcome-model.js';
import { largestCount } from './request.js';
import type { Contrast } from './tests/analysis.js';

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

function solveSize(bound: Bound, power: number): Solution | Shortfall {
  const { plan } = bound;
  const guess = guessUnits(bound, power);
  const unrounded = plan.equalPair && guess <= largestCount ? unroundedUnits(bound, guess, power) : undefined;
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
  const shares = bound
    .analyse(plan.groupUnits(start))
    .contrasts.map(
      (contrast) =>
        (bound.noncentralityNeeded(contrast, null, power) * contrast.standardError) /
        Math.abs(contrast.effect),
    );
  const units = start * Math.max(...shares) ** 2;
  if (!(units < largestCount)) return units;
  const { df } = bound.analyse(plan.groupUnits(Math.max(plan.minimumUnits, Math.ceil(units))));
  return df === null ? units : units * (1 + bound.criticalValue(null) ** 2 / (2 * df));
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
  return model.varianceFixed
    ? closedFormEffect(bound, bound.evaluate(groupUnits, clusterSize), model, power)
    : searchedEffect(bound, groupUnits, model, power, clusterSize);
}

function closedFormEffect(bound: Bound, { analysis }: Evaluated, model: OutcomeModel, power: number): number {
  const needed = analysis.contrasts.map(
    (contrast) => bound.noncentralityNeeded(contrast, analysis.df, power) * contrast.standardError,
  );
  return (
    (Math.sign(model.target - model.nullTarget) * Math.max(...needed)) / model.dilution + model.nullTarget
  );
}

const effectGrid = 64;

function searchedEffect(
  bound: Bound,
  groupUnits: readonly number[],
  model: OutcomeModel,
  power: number,
  clusterSize: number | undefined,
): number | Shortfall {
  const targetAt = (share: number) => model.nullTarget + share * (model.targetLimit - model.nullTarget);
  const powerAt = (share: number) => {
    const moved = model.at(targetAt(share));
    return bound.evaluate(
      groupUnits,
      clusterSize,
      bound.outcomes.map(() => moved),
    ).power;
  };
  let below = 0;
  for (let step = 1; step <= effectGrid; step += 1) {
    const share = step / effectGrid;
    if (powerAt(share) >= power) {
      const { root } = findRoot((x) => powerAt(x) - power, below, share, { tolerance: 1e-14 });
      return targetAt(root);
    }
    below = share;
  }
  return {
    code: 'effect',
    message: 'No effect on this side of the control proportion reaches the power at this size.',
    limitingPower: powerAt(1),
  };
}

function solveClusterSize(bound: Bound, units: number, power: number): Solution | Shortfall {
  const { plan } = bound;
  const limitAt = (count: number) => bound.evaluate(plan.groupUnits(count), Number.POSITIVE_INFINITY);
  const limit = limitAt(units);
  const reaches = (clusterSize: number) => bound.evaluate(plan.groupUnits(units), clusterSize).power >= power;
  const clusterSize =
    limit.power > power ? smallestInteger(reaches, { from: 1, to: largestCount, guess: 16 }) : undefined;
  if (clusterSize !== undefined) return { units, clusterSize, outcomes: bound.outcomes };
  const fewestUnits = smallestInteger((count) => limitAt(count).power > power, {
    from: plan.minimumUnits,
    to: largestCount,
    guess: units + 1,
    lookBelow: plan.lookBelow,
  });
  return {
    code: 'clusters',
    message: `With these clusters no cluster size reaches the power: however large they grow, power stays below ${(100 * limit.power).toFixed(1)} %.`,
    limitingPower: limit.power,
    ...(fewestUnits === undefined ? {} : { fewestUnits }),
  };
}
