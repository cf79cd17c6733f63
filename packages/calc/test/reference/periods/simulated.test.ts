import { describe, expect, it } from 'vitest';
import type { AppraisalRequest } from '../../../src/index.js';
import { feasible } from '../../requests.js';
import simulated from './simulated.json' with { type: 'json' };

interface SimulatedCase {
  id: string;
  request: AppraisalRequest;
  runs: number;
  rejected: number;
  rejectedUnderNull: number;
}

/**
 * How often trials reject more than planned for, from 100 000 trials of simulation.R with seed 77. Where sizes vary the
 * information of the trial at hand does too, and power is lost by more in poor ones than it is gained in rich ones.
 */
const departures: Record<string, number> = {
  'baseline period, unequal sizes, covariance known': -0.0087,
};

describe('trials over cluster periods simulated in base R by simulation.R', () => {
  for (const { id, request, runs, rejected, rejectedUnderNull } of simulated as unknown as SimulatedCase[]) {
    const within = (p: number) => 4 * Math.sqrt((p * (1 - p)) / runs);

    it(`reject as often as planned, but for what is known: ${id}`, () => {
      const { power } = feasible(request);
      const known = departures[id] ?? 0;
      expect(Math.abs(rejected / runs - power - known)).toBeLessThanOrEqual(within(power));
    });

    it(`keep the type I error of one tail: ${id}`, () => {
      const { alpha, sides } = request.test;
      expect(Math.abs(rejectedUnderNull / runs - alpha / sides)).toBeLessThanOrEqual(within(alpha / sides));
    });
  }

  it('are of every family', () => {
    const families = new Set(
      (simulated as unknown as SimulatedCase[]).map(({ request }) => request.design.family),
    );
    expect(families.size).toBe(4);
  });
});
