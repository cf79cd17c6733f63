import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, type Comparisons, explain, type Step } from '../../src/index.js';
import { clusters, feasible } from '../requests.js';
import { texValue } from '../tex-value.js';

const request = (comparisons: Partial<Comparisons>, allocation = [1.5, 1, 1.2]): AppraisalRequest => ({
  outcome: { kind: 'continuous', difference: 5, sd: 10 },
  test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
  design: {
    family: 'multi-arm',
    allocation,
    comparisons: { against: 'control', adjust: 'none', powerGoal: 'per-comparison', ...comparisons },
  },
  aim: { find: 'size', power: 0.8 },
});

const inClusters: AppraisalRequest = {
  ...clusters,
  design: {
    family: 'cluster',
    icc: 0.05,
    clusterSize: 20,
    allocation: [1, 1, 2],
    comparisons: { against: 'control', adjust: 'dunnett', powerGoal: 'conjunctive', effects: [5, 6] },
  },
};

const labelled = (steps: Step[], start: string) => steps.filter(({ label }) => label.startsWith(start));

describe('the working of several comparisons', () => {
  it.each<[string, AppraisalRequest]>([
    ['unadjusted', request({ powerGoal: 'disjunctive' })],
    ['Bonferroni', request({ adjust: 'bonferroni' })],
    ['Dunnett', request({ adjust: 'dunnett', effects: [5, -4] })],
    ['Holm', request({ adjust: 'holm', powerGoal: 'conjunctive' })],
    ['a fixed sequence', request({ adjust: 'fixed-sequence' })],
    ['all pairs', request({ adjust: 'bonferroni', against: 'all-pairs' })],
    ['clusters', inClusters],
  ])('under %s can be computed anew from its lines, and has the figures of the answer', (_, asked) => {
    const answer = feasible(asked);
    const steps = explain(asked);
    for (const { label, substituted, value } of steps) {
      const again = texValue(substituted);
      if (again === undefined) continue;
      expect(Math.abs(again - value), `${label}: ${substituted}`).toBeLessThan(
        1e-4 * Math.max(1, Math.abs(value)),
      );
    }
    const values = steps.map(({ value }) => value);
    const figures = [
      answer.power,
      answer.criticalValue,
      ...answer.comparisons.flatMap(({ power, standardError }) => [power, standardError]),
    ];
    for (const figure of [...figures, answer.disjunctivePower, answer.conjunctivePower]) {
      if (figure !== undefined) expect(values).toContain(figure);
    }
  });

  it('names the correlations, once for arms of one size', () => {
    expect(labelled(explain(request({ adjust: 'dunnett' })), 'Share of the control')).toHaveLength(2);
    expect(labelled(explain(request({ adjust: 'dunnett' }, [1, 1, 1])), 'Share of the control')).toHaveLength(
      1,
    );
    const pairs = request({ adjust: 'bonferroni', against: 'all-pairs' });
    expect(labelled(explain(pairs), 'Share of the control')).toHaveLength(0);
  });

  it('turns a comparison the other way by the sign of its share', () => {
    const [step] = labelled(
      explain(request({ adjust: 'dunnett', effects: [5, -4] }, [1, 1, 1])),
      'Critical value',
    );
    expect(step?.substituted).toContain('(0.707107,\\,-0.707107)');
    const [same] = labelled(
      explain(request({ adjust: 'dunnett', effects: [-5, -4] }, [1, 1, 1])),
      'Critical value',
    );
    expect(same?.substituted).toContain('(0.707107,\\,0.707107)');
  });

  it('has a critical value for every step of Holm’s test, falling to the unadjusted one', () => {
    const steps = labelled(explain(request({ adjust: 'holm' }, [1, 1, 1, 1])), 'Critical value of step');
    expect(steps).toHaveLength(3);
    const values = steps.map(({ value }) => value);
    expect([...values].sort((a, b) => b - a)).toEqual(values);
  });
});
