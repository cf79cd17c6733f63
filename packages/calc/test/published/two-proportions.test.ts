import { describe, expect, it } from 'vitest';
import type { AppraisalRequest } from '../../src/index.js';
import { feasible, twoMeans, unrounded } from '../requests.js';

type Method = 'pooled' | 'unpooled' | 'continuity-corrected' | 'arcsine';

const proportions = (
  control: number,
  active: number,
  power: number,
  method: Method = 'pooled',
  alpha = 0.05,
): AppraisalRequest => ({
  ...twoMeans,
  outcome: { kind: 'binary', control, active, method },
  test: { hypothesis: 'superiority', alpha, sides: 2 },
  aim: { find: 'size', power },
});

describe('published sizes for two proportions', () => {
  it('agree with the examples of power.prop.test in the R documentation', () => {
    const request = proportions(0.5, 0.75, 0.9);
    expect(feasible({ ...request, aim: { find: 'power', units: 50 } }).power).toBeCloseTo(0.7401659, 6);
    expect(unrounded(request)).toBeCloseTo(76.70693, 4);
    // The documentation prints 0.8026141, to its root finder's tolerance.
    const { detectable } = feasible({ ...request, aim: { find: 'effect', units: 50, power: 0.9 } });
    expect(Math.abs((detectable as number) - 0.8026141)).toBeLessThanOrEqual(1e-4);
  });

  it('agree with Pocock 1983, chapter 9 (from memory): 578 an arm, unpooled', () => {
    expect(feasible(proportions(0.9, 0.95, 0.9, 'unpooled')).units).toBe(578);
  });

  it('agree with Schulz & Grimes 2005, Lancet 365:1348 (from memory), whose multiplier is 10.51', () => {
    const exactMultiplier = (1.959963984540054 + 1.2815515655446004) ** 2;
    const size = unrounded(proportions(0.1, 0.06, 0.9, 'unpooled'));
    expect((size * 10.51) / exactMultiplier).toBeCloseTo(961.665, 2);
  });

  it('agree with the CONSORT 2001 example (from memory): 976, continuity-corrected', () => {
    expect(feasible(proportions(0.04, 0.015, 0.9, 'continuity-corrected')).units).toBe(976);
  });

  it('agree with the binary example of DELTA² (from memory): 174, or 200 recruited with 13 % missing', () => {
    const request = proportions(0.85, 0.7, 0.9, 'continuity-corrected');
    const { units, groups } = feasible({ ...request, attrition: { participants: 0.13 } });
    expect([units, groups[0]?.recruited]).toEqual([174, 200]);
  });

  it('agree with Fleiss, Levin & Paik 2003 (from memory): 827 at alpha 1 % and power 95 %', () => {
    expect(feasible(proportions(0.6, 0.7, 0.95, 'continuity-corrected', 0.01)).units).toBe(827);
  });

  it('agree with Cohen 1992, table 2, on the arcsine scale (from memory)', () => {
    const sizes = [0.2, 0.5, 0.8].map((h) => {
      const active = Math.sin(Math.asin(Math.sqrt(0.5)) + h / 2) ** 2;
      return Math.round(unrounded(proportions(0.5, active, 0.8, 'arcsine')));
    });
    expect(sizes).toEqual([392, 63, 25]);
  });

  it('agree with Chow, Shao & Wang, chapter 4 (from memory): 70 for equality, unpooled', () => {
    expect(feasible(proportions(0.65, 0.85, 0.8, 'unpooled')).units).toBe(70);
  });
});
