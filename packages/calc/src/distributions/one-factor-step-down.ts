import { normalUpper } from './normal.js';
import { type Alike, alike, gridsFor, type OneFactorT } from './one-factor.js';
import { expectations } from './one-factor-grid.js';

export interface StepDown {
  /** The probability that each statistic is rejected. */
  each: number[];
  all: number;
}

/**
 * Which statistics a step-down test rejects: the largest where it exceeds the first limit, the next where it exceeds
 * the second, and so on until one fails. The limits fall.
 *
 * *Formula*: given Z and S the statistics are independent; after step b the states are how many of the statistics
 * alike in distribution exceed limit b, of which there must be b at least. The test stops after step b where exactly b
 * exceed it and none of the rest limit b + 1. Expectation over Z and S as in `one-factor.ts`.
 * *Source*: Holm 1979, Scandinavian Journal of Statistics 6:65 (the test).
 * *Accuracy*: absolute 1e-10 (step-down.json). A loading outside −1…1, df ≤ 0 or NaN gives NaN.
 */
export function stepDown(statistics: OneFactorT, limits: readonly number[]): StepDown {
  const groups = alike(
    statistics,
    statistics.loadings.map(() => 0),
  );
  if (!groups) return { each: statistics.loadings.map(() => Number.NaN), all: Number.NaN };
  const states = statesOf(groups.map(({ members }) => members.length));
  const above = limits.map(() => new Float64Array(groups.length));
  const { factor, scale } = gridsFor(statistics, limits);
  const sums = expectations(factor, scale, groups.length + 1, (z, s, values) => {
    for (let step = 0; step < limits.length; step++) {
      const tails = above[step] as Float64Array;
      for (let g = 0; g < groups.length; g++) {
        const { loading, own, centre } = groups[g] as Alike;
        tails[g] = normalUpper(((limits[step] as number) * s - centre - loading * z) / own);
      }
    }
    rejections(states, above, values);
  });
  const each: number[] = [];
  groups.forEach(({ members }, g) => {
    for (const member of members) each[member] = Math.min(1, sums[g] as number);
  });
  return { each, all: Math.min(1, sums[groups.length] as number) };
}

/** How many of each group of alike statistics exceed a limit: a number for each combination, in mixed radix. */
interface States {
  counts: readonly number[];
  /** What one more of each group adds to the number. */
  strides: readonly number[];
  /** By state: how many there are of each group. */
  digits: readonly Uint8Array[];
  /** The states with any of a group, the largest number first. */
  withAny: readonly Int32Array[];
  /** The states in which so many exceed the limit in all. */
  withTotal: readonly Int32Array[];
  /** By state: its probability, while the steps are gone through. */
  chance: Float64Array;
}

function statesOf(counts: readonly number[]): States {
  let size = 1;
  const strides = counts.map((count) => {
    const stride = size;
    size *= count + 1;
    return stride;
  });
  const all = Array.from({ length: size }, (_, state) => state);
  const digits = counts.map((count, g) =>
    Uint8Array.from(all, (state) => Math.floor(state / (strides[g] as number)) % (count + 1)),
  );
  const total = (state: number) => digits.reduce((sum, digit) => sum + (digit[state] as number), 0);
  const most = counts.reduce((sum, count) => sum + count, 0);
  return {
    counts,
    strides,
    digits,
    withAny: digits.map((digit) => Int32Array.from(all.filter((state) => digit[state] !== 0).reverse())),
    withTotal: Array.from({ length: most + 1 }, (_, many) =>
      Int32Array.from(all.filter((state) => total(state) === many)),
    ),
    chance: new Float64Array(size),
  };
}

/**
 * Writes the probability that a statistic of each group is rejected, then that all are, where the statistics are
 * independent; above[step][g] is the probability that one of group g exceeds the limit of a step.
 */
function rejections(states: States, above: readonly Float64Array[], values: Float64Array): void {
  const { counts, digits, withTotal, chance } = states;
  const groups = counts.length;
  values.fill(0);
  chance.fill(0);
  chance[0] = 1;
  for (let step = 1; step <= above.length; step++) {
    const now = above[step - 1] as Float64Array;
    const before = above[step - 2];
    const next = above[step];
    for (let g = 0; g < groups; g++) {
      addBetween(states, g, (now[g] as number) - (before === undefined ? 0 : (before[g] as number)));
    }
    for (const state of withTotal[step - 1] as Int32Array) chance[state] = 0;
    for (const state of withTotal[step] as Int32Array) {
      let stopped = chance[state] as number;
      if (stopped < negligible) continue;
      for (let g = 0; g < groups && next !== undefined; g++) {
        const rest = (counts[g] as number) - ((digits[g] as Uint8Array)[state] as number);
        for (let k = 0; k < rest; k++) stopped *= 1 - (next[g] as number);
      }
      for (let g = 0; g < groups; g++) {
        const share = ((digits[g] as Uint8Array)[state] as number) / (counts[g] as number);
        values[g] = (values[g] as number) + stopped * share;
      }
      if (next === undefined) values[groups] = stopped;
    }
  }
}

const negligible = 1e-15;

/** Lets any number of the rest of group g lie between this step's limit and the one before, each with probability p. */
function addBetween({ counts, strides, digits, withAny, chance }: States, g: number, p: number): void {
  if (p < negligible) return;
  const count = counts[g] as number;
  const stride = strides[g] as number;
  const digit = digits[g] as Uint8Array;
  // The largest first, so that smaller ones are still as they were before this step.
  for (const state of withAny[g] as Int32Array) {
    let sum = chance[state] as number;
    let rest = count - (digit[state] as number);
    let ways = 1;
    // Some `more` of the `rest` there were: (rest choose more)·p^more.
    for (let more = 1, from = state - stride; rest < count; more++, from -= stride) {
      rest += 1;
      ways *= (p * rest) / more;
      sum += ways * (chance[from] as number);
    }
    chance[state] = sum;
  }
}
