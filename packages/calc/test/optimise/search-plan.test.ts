import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, CalcError, cheapest, mostPower, type SearchPlan } from '../../src/index.js';
import { abba, clusters, twoMeans, twoProportions } from '../requests.js';

const priced = (request: AppraisalRequest): AppraisalRequest => ({
  ...request,
  costs: { currency: 'EUR', fixed: 1000, perRecruited: 100, perCluster: 500 },
});

function errorOf(work: () => unknown): CalcError {
  try {
    work();
  } catch (error) {
    if (error instanceof CalcError) return error;
    throw error;
  }
  throw new Error('no error was raised');
}

describe('a search that cannot be made', () => {
  const refused: [AppraisalRequest, unknown, string, string][] = [
    [priced(twoMeans), { clusterSize: { from: 1, to: 9 } }, 'unsupported', 'search.clusterSize'],
    [priced(abba), { allocation: { from: 1, to: 2 } }, 'unsupported', 'search.allocation'],
    [priced(clusters), { clusterSize: { from: 9, to: 1 } }, 'schema', 'search.clusterSize.to'],
    [priced(clusters), { clusterSize: { from: 0, to: 1 } }, 'schema', 'search.clusterSize.from'],
    [priced(twoMeans), { allocation: { from: 2, to: 1 } }, 'schema', 'search.allocation.to'],
    [priced(twoMeans), { allocation: { from: 0, to: 1 } }, 'schema', 'search.allocation.from'],
    [priced(twoMeans), { within: { money: -1 } }, 'schema', 'search.within.money'],
    [priced(twoMeans), { budget: 3 }, 'schema', 'search'],
    [priced(twoMeans), 7, 'schema', 'search'],
    [twoMeans, {}, 'schema', 'costs'],
    [{ ...priced(twoMeans), aim: { find: 'power', units: 9 } }, {}, 'schema', 'aim.power'],
    [
      { ...priced(twoMeans), outcome: { kind: 'continuous', difference: 0, sd: 1 } },
      {},
      'no-effect',
      'outcome.difference',
    ],
  ];
  it.each(refused)('is refused at its field, fault %#', (request, search, code, path) => {
    const error = errorOf(() => cheapest(request, search as SearchPlan));
    expect([error.code, error.path]).toEqual([code, path]);
    expect(error.message).toMatch(/\S/);
  });

  it('is refused where nothing limits the size', () => {
    const error = errorOf(() => mostPower(twoMeans, { within: { money: 1e6 } }));
    expect([error.code, error.path]).toEqual(['schema', 'search.within']);
    expect(errorOf(() => mostPower(priced(twoMeans), {})).path).toBe('search.within');
  });
});

describe('a search without an answer', () => {
  it('says how much power the limits leave', () => {
    const best = cheapest(priced(twoMeans), { within: { money: 6000 } });
    if (best.found) throw new Error('expected none');
    // (6000 − 1000)/100 = 50: 25 in each arm, power.t.test(25, 5, 10)
    expect(best.limitingPower).toBeCloseTo(0.4099896, 6);
  });

  it('says so where not even the smallest size fits', () => {
    const none = { found: false, message: 'Not even the smallest size keeps to the limits.' };
    expect(cheapest(priced(twoMeans), { within: { money: 1100 } })).toEqual(none);
    expect(mostPower(priced(twoMeans), { within: { money: 1100 } })).toEqual(none);
  });
});

describe('a search where the power may fall as one arm grows', () => {
  it('does not claim to have proven its answer', () => {
    const allocation = { from: 0.5, to: 2 };
    expect(cheapest(priced(twoProportions), { allocation })).toMatchObject({ found: true, proven: false });
    const welch = {
      ...twoMeans,
      outcome: { kind: 'continuous', difference: 5, sd: 10, sdActive: 4 },
    } as const;
    expect(cheapest(priced(welch), { allocation })).toMatchObject({ found: true, proven: true });
    expect(cheapest(priced(twoMeans), { allocation })).toMatchObject({ found: true, proven: true });
  });
});
