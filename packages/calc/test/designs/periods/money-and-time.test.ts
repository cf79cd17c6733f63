import { describe, expect, it } from 'vitest';
import type { AppraisalRequest } from '../../../src/index.js';
import { expectClose } from '../../expect-close.js';
import costs from '../../reference/contract/costs.json' with { type: 'json' };
import { feasible, twoMeans } from '../../requests.js';

interface CostCase {
  id: string;
  request: AppraisalRequest;
  expected: { total: number; months: number; arms: Record<string, number>[] } & Record<string, unknown>;
}

const ofWedges = (costs as unknown as CostCase[]).filter(
  ({ request }) => request.design.family === 'stepped-wedge',
);

describe('money, months and recruitment over periods', () => {
  it.each(ofWedges.map((each) => [each.id, each] as const))(
    'reproduce the reference values of %s',
    (_, { request, expected }) => {
      const appraisal = feasible(request);
      const { total, months, arms, ...counts } = expected;
      expectClose(appraisal.costs?.total, total, 1e-6, 'total');
      expectClose(appraisal.timeline?.months, months, 1e-6, 'months');
      arms.forEach((arm, index) => {
        const answer = appraisal.costs?.arms[index] as unknown as Record<string, number>;
        for (const [field, value] of Object.entries(arm)) expectClose(answer[field], value, 1e-6, field);
      });
      for (const [field, value] of Object.entries(counts)) {
        expect((appraisal as unknown as Record<string, unknown>)[field], field).toBe(value);
      }
    },
  );

  const perPeriod = (design: AppraisalRequest['design'], units: number) => {
    const { costs: sheet, ...rest } = feasible({
      ...twoMeans,
      design,
      aim: { find: 'power', units },
      costs: { currency: 'EUR', perClusterPeriod: [1, 1000] },
    });
    return { ...rest, spent: sheet?.arms.map((arm) => arm.direct) };
  };

  it('count a transition period as active, and measure nobody in it', () => {
    // Three sequences of two clusters over five periods: 1 + 2 + 3 in control, 4 + 3 + 2 active with the transition.
    const found = perPeriod(
      {
        family: 'stepped-wedge',
        steps: 3,
        transitionPeriods: 1,
        icc: 0.05,
        cac: 0.8,
        clusterSize: 10,
      },
      2,
    );
    expect(found.spent).toEqual([12, 18_000]);
    expect(found.arms.map((arm) => arm.measurements)).toEqual([120, 120]);
    expect(found.participants).toBe(240);
  });

  it('count another unmeasured cell as nothing', () => {
    const found = perPeriod(
      {
        family: 'cluster-schedule',
        schedule: [
          [0, null, 1],
          [null, 0, 1],
          [0, 1, null],
        ],
        icc: 0.05,
        cac: 0.8,
        clusterSize: 10,
      },
      2,
    );
    expect(found.spent).toEqual([6, 6000]);
    expect(found.groups.map(({ participants }) => participants)).toEqual([40, 40, 40]);
  });

  it('recruit a cohort once, and count its members in every period as exposed', () => {
    const found = perPeriod(
      { family: 'cluster-crossover', icc: 0.05, cac: 0.8, iac: 0.5, clusterSize: 10 },
      4,
    );
    expect([found.participants, found.recruited, found.measurements]).toEqual([80, 80, 160]);
    expect(found.arms.map((arm) => arm.exposures)).toEqual([80, 80]);
  });

  it('pass in periods alone, with no recruitment before and no washout between', () => {
    const { timeline } = feasible({
      ...twoMeans,
      design: { family: 'cluster-baseline', icc: 0.05, cac: 0.8, clusterSize: 10 },
      aim: { find: 'power', units: 6 },
      timeline: { startUp: 2, accrualPerMonth: 1, period: 4, washout: 3, closeOut: 1 },
    });
    expect(timeline).toEqual({
      months: 11,
      phases: [
        { label: 'Start-up', from: 0, to: 2 },
        { label: 'Period 1', from: 2, to: 6 },
        { label: 'Period 2', from: 6, to: 10 },
        { label: 'Close-out', from: 10, to: 11 },
      ],
    });
  });

  it('of a crossover follow the sequences: exposures by treatment, periods and washouts between them', () => {
    const { arms, timeline } = feasible({
      ...twoMeans,
      design: { family: 'crossover', sequences: ['ABB', 'BAA', 'AAB'], correlation: 0.5 },
      aim: { find: 'power', units: 9 },
      attrition: { participants: 0.1 },
      timeline: { startUp: 1, accrualPerMonth: 10, period: 2, washout: 0.5, closeOut: 1 },
    });
    expect(arms).toEqual([
      { label: 'Control', exposures: 50, measurements: 50 },
      { label: 'Active', exposures: 40, measurements: 40 },
    ]);
    expect(timeline?.months).toBe(1 + 3 + 6 + 1 + 1);
  });
});
