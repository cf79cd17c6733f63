import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { AppraisalRequest, FamilyId } from '../src/index.js';
import { requestsFor, runs } from './arbitrary-requests.js';
import { feasible } from './requests.js';

describe('a design without correlation', () => {
  const individual = (request: AppraisalRequest, units: number, allocation?: [number, number]) =>
    feasible({
      ...request,
      design: allocation ? { family: 'parallel', allocation } : { family: 'parallel' },
      aim: { find: 'power', units },
    }).standardError;
  const continuous = (family: FamilyId) =>
    requestsFor({ family, kind: 'continuous', hypothesis: 'superiority' });

  it('has in clusters the standard error of as many individually randomised participants', () => {
    fc.assert(
      fc.property(continuous('cluster'), (request) => {
        const { design } = request;
        if (design.family !== 'cluster' || design.comparisons) return;
        const clustered = feasible({ ...request, design: { ...design, icc: 0, allocation: [1, 1] } });
        expect(clustered.standardError).toBeCloseTo(individual(request, clustered.participants / 2), 12);
      }),
      runs(300),
    );
  });

  it('has so in three levels', () => {
    fc.assert(
      fc.property(continuous('three-level-cluster'), (request) => {
        const design = { ...request.design, iccCluster: 0, iccSubcluster: 0, allocation: [1, 1] };
        const clustered = feasible({ ...request, design } as AppraisalRequest);
        expect(clustered.standardError).toBeCloseTo(individual(request, clustered.participants / 2), 12);
      }),
      runs(300),
    );
  });

  it('has so in treatment groups', () => {
    fc.assert(
      fc.property(continuous('partially-nested'), (request) => {
        const nested = feasible({ ...request, design: { ...request.design, icc: 0 } } as AppraisalRequest);
        const [control, active] = nested.groups.map(({ participants }) => participants) as [number, number];
        if (Math.max(control / active, active / control) > 1000) return;
        expect(nested.standardError).toBeCloseTo(individual(request, control, [control, active]), 12);
      }),
      runs(300),
    );
  });

  it('has so in a cluster crossover of new participants, who are measured once each', () => {
    fc.assert(
      fc.property(continuous('cluster-crossover'), (request) => {
        const { iac: _, ...design } = request.design as { iac?: number };
        const crossed = feasible({
          ...request,
          design: { ...design, icc: 0, allocation: [1, 1] },
        } as AppraisalRequest);
        expect(crossed.standardError / individual(request, crossed.measurements / 2)).toBeCloseTo(1, 9);
      }),
      runs(300),
    );
  });

  it('gains nothing from a baseline of other participants', () => {
    fc.assert(
      fc.property(continuous('cluster-baseline'), (request) => {
        const { iac: _, ...design } = request.design as { iac?: number };
        const twice = feasible({
          ...request,
          design: { ...design, icc: 0, allocation: [1, 1] },
        } as AppraisalRequest);
        expect(twice.standardError / individual(request, twice.measurements / 4)).toBeCloseTo(1, 9);
      }),
      runs(300),
    );
  });
});
