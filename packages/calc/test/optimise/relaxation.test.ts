import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type AppraisalRequest,
  type Feasible,
  type Limits,
  type WeighInput,
  weigh,
} from '../../src/index.js';
import { runs } from '../arbitrary-requests.js';
import { everyDesign, range } from './enumeration.js';

const studies = fc.record({
  difference: fc.double({ min: 0.75, max: 1.4, noNaN: true }),
  icc: fc.double({ min: 0.01, max: 0.2, noNaN: true }),
  lost: fc.constantFrom(0, 0.1, 0.25),
  own: fc.integer({ min: 1, max: 12 }),
  clusters: fc.integer({ min: 4, max: 24 }),
  perCluster: fc.integer({ min: 1, max: 10 }),
  money: fc.integer({ min: 5000, max: 20_000 }),
  months: fc.double({ min: 4, max: 12, noNaN: true }),
  limited: fc.subarray(['clusters', 'participantsPerCluster', 'money', 'months'] as const, { minLength: 1 }),
});

function studyOf(
  s: typeof studies extends fc.Arbitrary<infer S> ? S : never,
): WeighInput & { limits: Limits } {
  const all: Required<Limits> = {
    clusters: s.clusters,
    participantsPerCluster: s.perCluster,
    money: s.money,
    months: s.months,
  };
  const limits: Limits = Object.fromEntries(s.limited.map((limit) => [limit, all[limit]]));
  return {
    question: {
      outcome: { kind: 'continuous', difference: s.difference },
      test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
    },
    ledger: [
      { key: 'sd', family: null, value: 1 },
      { key: 'icc', family: null, value: s.icc },
      { key: 'clusterSizeCv', family: null, value: 0.3 },
      { key: 'attrition', family: null, value: s.lost },
    ],
    costs: {
      costs: { currency: 'EUR', fixed: 2000, perCluster: 400, perRecruited: 25, perMonth: 100 },
      timeline: { startUp: 1, accrualPerClusterPerMonth: 4, followUp: 2, closeOut: 1 },
    },
    hold: { kind: 'power', power: 0.8 },
    limits,
    options: [
      {
        id: '1',
        name: 'Clusters',
        plan: { family: 'cluster', treatments: [0, 1], structure: {}, overrides: {}, clusterSize: s.own },
      },
    ],
  };
}

/** What a design breaks of the limits: how many, and the largest by its share. */
function broken(limits: Limits, lost: number, appraisal: Feasible): [number, number] {
  const taken = {
    clusters: appraisal.recruitedClusters as number,
    participantsPerCluster: Math.ceil((appraisal.clusterSize as number) / (1 - lost) - 1e-9),
    money: appraisal.costs?.total as number,
    months: appraisal.timeline?.months as number,
  };
  const shares = Object.entries(limits)
    .map(([limit, allowed]) => (taken[limit as keyof Limits] - allowed) / allowed)
    .filter((share) => share > 1e-9);
  return [shares.length, Math.max(0, ...shares)];
}

describe('the smallest relaxation, and the most power within the limits', { timeout: 60_000 }, () => {
  it('are those of the enumeration of every cluster size and number of clusters', () => {
    fc.assert(
      fc.property(studies, (s) => {
        const study = studyOf(s);
        const [weighed] = weigh(study);
        const { request, standing } = weighed as {
          request: AppraisalRequest;
          standing: NonNullable<unknown>;
        } & NonNullable<typeof weighed>;
        if (!standing || standing.fits) return;
        const { limits } = study;
        const largest = limits.participantsPerCluster === undefined ? s.own : 40;
        const all = everyDesign(request, {
          clusterSizes: range(1, largest),
          units: range(2, 60),
          design: (_, __, clusterSize) => ({ ...request.design, clusterSize }) as AppraisalRequest['design'],
        });

        const [count, share] = all
          .filter(({ power }) => power >= 0.8)
          .map((each) => broken(limits, s.lost, each))
          .sort((a, b) => a[0] - b[0] || a[1] - b[1])[0] as [number, number];
        const { relaxation, within } = standing;
        if (!relaxation) throw new Error('expected a relaxation');
        if ((relaxation.clusterSize ?? s.own) > largest) {
          // Beyond the sizes gone through here: it must be as small as any of theirs.
          expect(relaxation.changes.length).toBeLessThanOrEqual(count);
          return;
        }
        expect(relaxation.changes).toHaveLength(count);
        const shares = relaxation.changes.map(({ from, to }) => (to - from) / from);
        expect(Math.max(0, ...shares)).toBeCloseTo(share, 9);

        if (standing.breaches.length === 0 || (limits.clusters ?? limits.money) === undefined) return;
        const fitting = all.filter((each) => broken(limits, s.lost, each)[0] === 0);
        expect(within?.power ?? 0).toBe(Math.max(0, ...fitting.map(({ power }) => power)));
      }),
      runs(200),
    );
  });
});
