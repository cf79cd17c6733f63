import { describe, expect, it } from 'vitest';
import { normalUpperQuantile } from '../../src/distributions/normal.js';
import type { AppraisalRequest } from '../../src/index.js';
import { twoOneSidedPower } from '../../src/tests/two-one-sided.js';
import { feasible, twoMeans } from '../requests.js';

interface Hazards {
  hazardRatio: number;
  alpha?: number;
  sides?: 1 | 2;
  power?: number;
  method?: 'schoenfeld' | 'freedman';
}

/** A trial in which four in five of an unchanged arm have the event: 80 % by the end of a fixed follow-up. */
const hazards = ({
  hazardRatio,
  alpha = 0.05,
  sides = 2,
  power = 0.8,
  method,
}: Hazards): AppraisalRequest => ({
  ...twoMeans,
  outcome: {
    kind: 'time-to-event',
    hazardRatio,
    controlSurvival: { at: 12, probability: 0.2 },
    accrual: 0,
    followUp: 12,
    ...(method ? { method } : {}),
  },
  test: { hypothesis: 'superiority', alpha, sides },
  aim: { find: 'size', power },
});
const events = (given: Hazards) => feasible(hazards(given)).requiredEvents as number;
const evenUp = (required: number) => 2 * Math.ceil(required / 2);

describe('published numbers of events', () => {
  it('agree with Trials 2015 16, s13063-015-0727-9, table 1 (read): rounded up per arm, half of all censored', () => {
    const table = { 1.25: 1264, 1.5: 384, 1.75: 204, 2: 132 };
    for (const [hazardRatio, size] of Object.entries(table)) {
      expect(evenUp(events({ hazardRatio: Number(hazardRatio) })) / 0.5).toBe(size);
    }
  });

  it('agree with Stat Med 2017 36:4121, table 3, proportional hazards (read): one-sided, even numbers', () => {
    const table = {
      0.85: 938,
      0.8: 498,
      0.75: 300,
      0.7: 196,
      0.65: 134,
      0.6: 96,
      0.55: 70,
      0.5: 52,
      0.45: 40,
      0.4: 30,
    };
    for (const [hazardRatio, size] of Object.entries(table)) {
      expect(evenUp(events({ hazardRatio: Number(hazardRatio), sides: 1 }))).toBe(size);
    }
  });

  it('agree with Biom J 2021 63:1406, table 4, Schoenfeld column (read): events per arm, within one', () => {
    const table = {
      0.8479: 455,
      0.7211: 116,
      0.8054: 265,
      0.615: 53,
      0.7202: 115,
      0.5258: 30,
      0.6423: 64,
      0.4507: 20,
      0.5712: 40,
      0.3872: 14,
    };
    for (const [hazardRatio, size] of Object.entries(table)) {
      const perArm = Math.ceil(events({ hazardRatio: Number(hazardRatio), sides: 1 }) / 2);
      expect(Math.abs(perArm - size)).toBeLessThanOrEqual(1);
    }
  });

  it('agree with the protocol figures of Schoenfeld 1981 and 1983 (from memory): 380 and 508 at 0.75', () => {
    const found = [0.8, 0.9].map((power) => Math.ceil(events({ hazardRatio: 0.75, power })));
    expect(found).toEqual([380, 508]);
  });

  it('agree with Collett’s chronic active hepatitis example (from memory): 133 deaths at 0.57', () => {
    expect(Math.abs(events({ hazardRatio: 0.57, power: 0.9 }) - 133)).toBeLessThanOrEqual(0.5);
  });

  it('agree with the ivabradine example of CONSORT 2010, item 7a (from memory): 950 within 1 %', () => {
    expect(Math.abs(events({ hazardRatio: 0.81, power: 0.9 }) / 950 - 1)).toBeLessThanOrEqual(0.01);
  });

  it('agree with the formula of Freedman 1982, Stat Med 1:121, put in by hand: 385 and 515 at 0.75', () => {
    const found = [0.8, 0.9].map((power) =>
      Math.ceil(events({ hazardRatio: 0.75, power, method: 'freedman' })),
    );
    expect(found).toEqual([385, 515]);
  });
});

describe('the Cox regression examples of Chow, Shao & Wang, chapter 7 (from memory)', () => {
  it('need 82 for equality at a hazard ratio of 2 with events in 80 %', () => {
    expect(Math.ceil(events({ hazardRatio: 2 }) / 0.8)).toBe(82);
  });

  it('need 200 where the log hazard ratio lies log 2 − 0.3 from what is to be ruled out', () => {
    const { requiredEvents } = feasible({
      ...hazards({ hazardRatio: Math.exp(-0.3) }),
      outcome: { ...hazards({ hazardRatio: Math.exp(-0.3) }).outcome, better: 'higher' },
      test: { hypothesis: 'non-inferiority', alpha: 0.05, sides: 1, margin: 2 },
    });
    // 199.999 in the book's z values; exact ones give a little more.
    expect(Math.round((requiredEvents as number) / 0.8)).toBe(200);
  });

  it('need 172 for equivalence within a log hazard ratio of 0.5', () => {
    const { participants } = feasible({
      ...hazards({ hazardRatio: 1 }),
      test: { hypothesis: 'equivalence', alpha: 0.05, sides: 1, margin: Math.exp(0.5) },
    });
    expect(participants).toBe(172);
  });
});

describe('the margins of Chow, Shao & Wang, chapters 3 and 4 (from memory)', () => {
  const cholesterol: AppraisalRequest = {
    ...twoMeans,
    outcome: { kind: 'continuous', difference: 0, sd: 0.1, better: 'higher' },
    test: { hypothesis: 'non-inferiority', alpha: 0.05, sides: 1, margin: 0.05, reference: 'normal' },
    aim: { find: 'size', power: 0.8 },
  };

  it('need 50 a group for non-inferior means', () => {
    expect(feasible(cholesterol).units).toBe(50);
  });

  it('need 107 a group for equivalent means, the distance of 0.04 taken on both sides', () => {
    // The book's formula shares the type II error evenly, which is exact only with no difference.
    const test = { ...cholesterol.test, hypothesis: 'equivalence', margin: 0.04 } as const;
    expect(Math.abs(feasible({ ...cholesterol, test }).units - 107)).toBeLessThanOrEqual(1);
    const uneven = feasible({
      ...cholesterol,
      outcome: { kind: 'continuous', difference: 0.01, sd: 0.1 },
      test: { ...test, margin: 0.05 },
    });
    expect(uneven.units).toBeLessThan(107);
  });

  it('need 25 a group for non-inferior proportions', () => {
    const { units } = feasible({
      ...twoMeans,
      outcome: { kind: 'binary', control: 0.65, active: 0.85, better: 'higher' },
      test: { hypothesis: 'non-inferiority', alpha: 0.05, sides: 1, margin: 0.1 },
      aim: { find: 'size', power: 0.8 },
    });
    expect(units).toBe(25);
  });

  it('need 133 a group for equivalent proportions, the distance of 0.15 taken on both sides', () => {
    const power = (n: number) =>
      twoOneSidedPower(0, Math.sqrt((0.75 * 0.25 + 0.8 * 0.2) / n), null, normalUpperQuantile(0.05), 0.15);
    expect(power(133)).toBeGreaterThanOrEqual(0.8);
    expect(power(132)).toBeLessThan(0.8);
  });
});
