import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, cheapest, type Limits, mostPower, type SearchPlan } from '../../src/index.js';
import { runs } from '../arbitrary-requests.js';
import { cost, everyDesign, type Grid, keepsTo, range } from './enumeration.js';

const rate = fc.double({ min: 0, max: 100, noNaN: true }).map((x) => Math.round(x));
const figures = fc.record({
  difference: fc.double({ min: 0.9, max: 2, noNaN: true }),
  power: fc.double({ min: 0.5, max: 0.9, noNaN: true }),
  sides: fc.constantFrom(1 as const, 2 as const),
  lost: fc.constantFrom(0, 0.1, 0.3),
  recruited: rate,
  cluster: fc.double({ min: 20, max: 800, noNaN: true }),
  exposures: fc.tuple(rate, rate),
  month: rate,
  share: fc.constantFrom(0.6, 0.8, 0.95),
});
type Figures = typeof figures extends fc.Arbitrary<infer F> ? F : never;

function request(f: Figures, design: AppraisalRequest['design'], arms = 2): AppraisalRequest {
  return {
    outcome: { kind: 'continuous', difference: f.difference, sd: 1 },
    test: { hypothesis: 'superiority', alpha: 0.05, sides: f.sides },
    design,
    aim: { find: 'size', power: f.power },
    attrition: { participants: f.lost },
    costs: {
      currency: 'EUR',
      fixed: 1000,
      perRecruited: 1 + f.recruited,
      perCluster: f.cluster,
      perExposure: Array.from({ length: arms }, (_, arm) => f.exposures[arm % 2] as number),
      perMonth: f.month,
    },
    timeline: { startUp: 1, accrualPerMonth: 10, followUp: 3, closeOut: 1 },
  };
}

interface Problem {
  name: string;
  request(figures: Figures): AppraisalRequest;
  search: SearchPlan;
  grid: Grid;
}

const opposite = (units: number) =>
  range(Math.max(2, Math.ceil(units / 2 - 1e-9)), Math.floor(2.5 * units + 1e-9));
const allocation = { from: 0.5, to: 2.5 };
const clustered = (clusterSize: number) => ({
  family: 'cluster' as const,
  icc: 0.08,
  clusterSize,
  clusterSizeCv: 0.4,
});
const dunnett = { against: 'control', adjust: 'dunnett', powerGoal: 'per-comparison' } as const;
const problems: Problem[] = [
  {
    name: 'a parallel design at its allocation',
    request: (f) => request(f, { family: 'parallel', allocation: [2, 3] }),
    search: {},
    grid: { units: range(2, 40), design: () => ({ family: 'parallel', allocation: [2, 3] }) },
  },
  {
    name: 'the allocation of a parallel design',
    request: (f) => request(f, { family: 'parallel' }),
    search: { allocation },
    grid: {
      units: range(2, 40),
      opposite,
      design: (units, other) => ({ family: 'parallel', allocation: [units, other as number] }),
    },
  },
  {
    name: 'the allocation of arms with unequal SDs',
    request: (f) => {
      const asked = request(f, { family: 'parallel' });
      return { ...asked, outcome: { kind: 'continuous', difference: f.difference, sd: 1, sdActive: 0.5 } };
    },
    search: { allocation },
    grid: {
      units: range(2, 40),
      opposite,
      design: (units, other) => ({ family: 'parallel', allocation: [units, other as number] }),
    },
  },
  {
    name: 'control against three active arms',
    request: (f) =>
      request(
        { ...f, difference: 0.7 + f.difference },
        {
          family: 'multi-arm',
          allocation: [1, 1, 1, 1],
          comparisons: { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' },
        },
        4,
      ),
    search: { allocation },
    grid: {
      units: range(2, 22),
      opposite,
      design: (units, other) => ({
        family: 'multi-arm',
        allocation: [units, other as number, other as number, other as number],
        comparisons: { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' },
      }),
    },
  },
  {
    name: 'control against two active arms, after Dunnett',
    request: (f) =>
      request(
        { ...f, difference: 1 + f.difference },
        { family: 'multi-arm', allocation: [1, 1, 1], comparisons: dunnett },
        3,
      ),
    search: { allocation },
    grid: {
      units: range(2, 14),
      opposite,
      design: (units, other) => ({
        family: 'multi-arm',
        allocation: [units, other as number, other as number],
        comparisons: dunnett,
      }),
    },
  },
  {
    name: 'the cluster size',
    request: (f) => request(f, clustered(7)),
    search: { clusterSize: { from: 1, to: 30 } },
    grid: { clusterSizes: range(1, 30), units: range(2, 40), design: (_, __, m) => clustered(m as number) },
  },
  {
    name: 'the cluster size and the allocation',
    request: (f) => request(f, clustered(7)),
    search: { clusterSize: { from: 2, to: 12 }, allocation },
    grid: {
      clusterSizes: range(2, 12),
      units: range(2, 24),
      opposite,
      design: (units, other, m) => ({ ...clustered(m as number), allocation: [units, other as number] }),
    },
  },
  {
    name: 'treatment groups against control participants',
    request: (f) => request(f, { family: 'partially-nested', icc: 0.1, groupSize: 4 }),
    search: { allocation },
    grid: {
      units: range(2, 14),
      opposite: (groups) =>
        range(Math.max(2, Math.ceil((4 * groups) / 2.5 - 1e-9)), Math.floor(8 * groups + 1e-9)),
      design: (groups, controls) => ({
        family: 'partially-nested',
        icc: 0.1,
        groupSize: 4,
        allocation: [controls as number, 4 * groups],
      }),
    },
  },
];

describe('against the enumeration of every whole-numbered design', { timeout: 120_000 }, () => {
  for (const { name, request: ask, search, grid } of problems) {
    it(`nothing that reaches the power is cheaper: ${name}`, () => {
      fc.assert(
        fc.property(figures, (f) => {
          const asked = ask(f);
          const reaching = everyDesign(asked, grid).filter(({ power }) => power >= f.power);
          const least = Math.min(...reaching.map(cost));
          const best = cheapest(asked, search);
          if (!best.found) throw new Error(best.message);
          expect(best.proven).toBe(true);
          expect(best.appraisal.power).toBeGreaterThanOrEqual(f.power);
          expect(cost(best.appraisal)).toBeLessThanOrEqual(least * (1 + 1e-12));
          expect(cost(best.appraisal)).toBeGreaterThanOrEqual(least * (1 - 1e-12));
          const recruits = reaching
            .filter((each) => cost(each) === cost(best.appraisal))
            .map((each) => each.recruited);
          expect(best.appraisal.recruited).toBe(Math.min(...recruits));
        }),
        runs(60),
      );
    });

    it(`nothing within the limits has more power: ${name}`, () => {
      fc.assert(
        fc.property(figures, (f) => {
          const asked = ask(f);
          const all = everyDesign(asked, grid);
          const enough = Math.min(...all.filter(({ power }) => power >= f.power).map(cost));
          const limits: Limits = {
            money: Math.round(1000 + f.share * (enough - 1000)),
            ...(f.lost === 0 ? { months: 9 } : {}),
            ...(f.sides === 1 ? { clusters: 12 } : {}),
          };
          const allowed = all.filter((each) => keepsTo(limits, each));
          const best = mostPower(asked, { ...search, within: limits });
          if (!best.found) {
            expect(allowed).toEqual([]);
            return;
          }
          expect(best.proven).toBe(true);
          expect(keepsTo(limits, best.appraisal)).toBe(true);
          const most = Math.max(...allowed.map(({ power }) => power));
          expect(best.appraisal.power).toBe(most);
          const tied = allowed.filter(({ power }) => power === most).map(cost);
          expect(cost(best.appraisal)).toBeCloseTo(Math.min(...tied), 8);
        }),
        runs(60),
      );
    });
  }
});
