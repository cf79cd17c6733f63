import { describe, expect, it } from 'vitest';
import type { AppraisalRequest, Comparisons, Feasible } from '../../src/index.js';
import { feasible } from '../requests.js';
import { SeededRandom } from './seeded-random.js';

type Adjustment = Comparisons['adjust'];

/** Trials simulated for each strategy: whole where CI is set, a tenth otherwise. */
const trials = process.env.CI ? 200_000 : 20_000;

const sd = 10;
const allocation = [1.6, 1, 0.8, 1.3];
const units = 40;

const request = (adjust: Adjustment, sides: 1 | 2, effects: number[]): AppraisalRequest => ({
  outcome: { kind: 'continuous', difference: 5, sd },
  test: { hypothesis: 'superiority', alpha: 0.05, sides },
  design: {
    family: 'multi-arm',
    allocation,
    comparisons: { against: 'control', adjust, powerGoal: 'disjunctive', effects },
  },
  aim: { find: 'power', units },
});

/** Means and pooled SD of one trial, and the statistic of each arm turned the way of its own effect. */
function trial(
  random: SeededRandom,
  sizes: readonly number[],
  means: readonly number[],
  turns: readonly number[],
) {
  const df = sizes.reduce((sum, size) => sum + size, 0) - sizes.length;
  const found = sizes.map((size, arm) => (means[arm] as number) + (sd * random.normal()) / Math.sqrt(size));
  const pooled = sd * Math.sqrt(random.chiSquared(df) / df);
  const [control = 0] = found;
  const [n0 = 0] = sizes;
  return turns.map((turn, index) => {
    const n1 = sizes[index + 1] as number;
    return (turn * ((found[index + 1] as number) - control)) / (pooled * Math.sqrt(1 / n0 + 1 / n1));
  });
}

/** What each adjustment rejects, given statistics (or their sizes) and its critical values. */
function rejectedBy(adjust: Adjustment, statistics: readonly number[], limits: readonly number[]): boolean[] {
  if (adjust === 'fixed-sequence') {
    let open = true;
    return statistics.map((statistic) => {
      open &&= statistic > (limits[0] as number);
      return open;
    });
  }
  if (adjust === 'holm') {
    const order = statistics
      .map((_, index) => index)
      .sort((a, b) => (statistics[b] as number) - (statistics[a] as number));
    const rejected = statistics.map(() => false);
    for (const [step, index] of order.entries()) {
      if (!((statistics[index] as number) > (limits[step] as number))) break;
      rejected[index] = true;
    }
    return rejected;
  }
  return statistics.map((statistic) => statistic > (limits[0] as number));
}

/** Holm’s later steps are those of fewer comparisons. */
function limitsOf(adjust: Adjustment, sides: 1 | 2, { criticalValue, df }: Feasible): number[] {
  if (adjust !== 'holm') return [criticalValue];
  const stepped = (alpha: number): number => {
    const single: AppraisalRequest = {
      ...request('none', sides, [5, 5, 5]),
      test: { hypothesis: 'superiority', alpha, sides },
    };
    const answer = feasible(single);
    expect(answer.df).toBe(df);
    return answer.criticalValue;
  };
  return [criticalValue, stepped(0.05 / 2), stepped(0.05)];
}

function expectNear(simulated: number, computed: number, name: string): void {
  const allowed = 4 * Math.sqrt((computed * (1 - computed)) / trials) + 1e-12;
  expect(Math.abs(simulated - computed), `${name}: ${simulated} against ${computed}`).toBeLessThanOrEqual(
    allowed,
  );
}

const adjustments: Adjustment[] = ['none', 'bonferroni', 'holm', 'dunnett', 'fixed-sequence'];

describe.each(adjustments)('simulated trials under the adjustment %s', (adjust) => {
  it.each([
    [2, [6, 5, 7]],
    [1, [6, -5, 4]],
  ] as [1 | 2, number[]][])('reject as often as computed: %s-sided, effects %j', (sides, effects) => {
    const answer = feasible(request(adjust, sides, effects));
    const sizes = answer.groups.map((group) => group.participants);
    const limits = limitsOf(adjust, sides, answer);
    const random = new SeededRandom(1955 + sides);
    const each = effects.map(() => 0);
    let any = 0;
    let all = 0;
    for (let count = 0; count < trials; count++) {
      const statistics = trial(random, sizes, [0, ...effects], effects.map(Math.sign));
      const rejected = rejectedBy(adjust, statistics, limits);
      rejected.forEach((is, index) => {
        if (is) each[index] = (each[index] as number) + 1;
      });
      if (rejected.some(Boolean)) any += 1;
      if (rejected.every(Boolean)) all += 1;
    }
    each.forEach((count, index) => {
      expectNear(count / trials, answer.comparisons[index]?.power as number, `comparison ${index + 1}`);
    });
    expectNear(any / trials, answer.disjunctivePower as number, 'any');
    expectNear(all / trials, answer.conjunctivePower as number, 'all');
    expectNear(any / trials, answer.power, 'goal');
  });

  it.each([1, 2] as const)('keep the type I error where no arm differs: %s-sided', (sides) => {
    const answer = feasible(request(adjust, sides, [5, 5, 5]));
    const sizes = answer.groups.map((group) => group.participants);
    const limits = limitsOf(adjust, sides, answer);
    const random = new SeededRandom(1964 + sides);
    let any = 0;
    for (let count = 0; count < trials; count++) {
      const turned = trial(random, sizes, [0, 0, 0, 0], [1, 1, 1]);
      const statistics = sides === 2 ? turned.map(Math.abs) : turned;
      if (rejectedBy(adjust, statistics, limits).some(Boolean)) any += 1;
    }
    const error = any / trials;
    const allowed = 4 * Math.sqrt((0.05 * 0.95) / trials);
    if (adjust === 'none') expect(error).toBeGreaterThan(0.05 + allowed);
    else expect(error).toBeLessThanOrEqual(0.05 + allowed);
    if (adjust === 'dunnett' || adjust === 'fixed-sequence') expectNear(error, 0.05, 'type I error');
  });
});
