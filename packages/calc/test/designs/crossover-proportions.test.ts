import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise } from '../../src/index.js';
import { feasible, twoMeans } from '../requests.js';

const asked = (control: number, active: number, correlation: number, units: number): AppraisalRequest => ({
  ...twoMeans,
  outcome: { kind: 'binary', control, active },
  design: { family: 'crossover', sequences: ['AB', 'BA'], correlation },
  aim: { find: 'effect', units, power: 0.8 },
});

describe('the detectable proportion of a crossover', () => {
  it('is one that the correlation allows: its odds are at most the control’s over φ²', () => {
    const { detectable, power } = feasible(asked(0.1, 0.15, 0.6, 60));
    const odds = (p: number) => p / (1 - p);
    expect(odds(detectable as number)).toBeLessThan(odds(0.1) / 0.36);
    expect(power).toBeCloseTo(0.8, 10);
  });

  it('is out of reach where only impossible proportions would do', () => {
    for (const [control, active] of [
      [0.1, 0.15],
      [0.1, 0.05],
      [0.9, 0.95],
    ] as const) {
      const appraisal = appraise(asked(control, active, 0.6, 8));
      expect(appraisal).toMatchObject({ feasible: false, infeasible: { code: 'effect' } });
      const limit = appraisal.feasible ? Number.NaN : appraisal.infeasible.limitingPower;
      expect(limit).toBeGreaterThan(0);
      expect(limit).toBeLessThan(0.8);
    }
  });
});
