import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Box, isBetter, leastInBox, type Score } from '../../src/numeric/branch-and-bound.js';
import { runs } from '../arbitrary-requests.js';

/** x·a + y·b + z·c over x·y·z ≥ least: rising in each, so that its corners bound it. */
function cheapestProduct(prices: readonly number[], least: number, high: number) {
  const score = (at: readonly number[]): Score => [
    at.reduce((sum, x, side) => sum + x * (prices[side] as number), 0),
  ];
  const reaches = (at: readonly number[]) => at.reduce((product, x) => product * x, 1) >= least;
  let looked = 0;
  const look = ({ low, high: top }: Box) => {
    looked += 1;
    return reaches(top) ? { bound: score(low), found: { score: score(top), at: top } } : undefined;
  };
  const box = { low: prices.map(() => 1), high: prices.map(() => high) };
  return { ...leastInBox(box, look), looked: () => looked, score, reaches };
}

describe('branch and bound over whole numbers', () => {
  it('finds what enumeration finds', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 1, max: 30 }), { minLength: 1, maxLength: 3 }),
        fc.integer({ min: 1, max: 12 }),
        fc.integer({ min: 1, max: 2000 }),
        (prices, high, least) => {
          const { found, proven, score, reaches } = cheapestProduct(prices, least, high);
          const points = prices.reduce<number[][]>(
            (all) => all.flatMap((point) => Array.from({ length: high }, (_, x) => [...point, x + 1])),
            [[]],
          );
          const [best] = points
            .filter(reaches)
            .map(score)
            .sort((a, b) => (a[0] as number) - (b[0] as number));
          expect(found?.score).toEqual(best);
          expect(proven).toBe(true);
        },
      ),
      runs(500),
    );
  });

  it('looks at few of the points of a large box', () => {
    const { found, proven, looked } = cheapestProduct([3, 7], 1_000_000, 1e9);
    expect(proven).toBe(true);
    // √(7/3 × 10⁶) = 1527.5 by the square-root rule; 1528 × 655 is the first product beyond a million near it.
    expect(found?.score[0]).toBeLessThanOrEqual(3 * 1528 + 7 * 655);
    expect(looked()).toBeLessThan(3000);
  });

  it('says so when it gives up', () => {
    const look = ({ low, high }: Box) => ({
      bound: [0],
      found: { score: [1 + (high[0] as number) - (low[0] as number)], at: 0 },
    });
    expect(leastInBox({ low: [1], high: [1e9] }, look, { most: 100 })).toMatchObject({ proven: false });
  });

  it('keeps an incumbent that nothing is better than', () => {
    const incumbent = { score: [1, 0], at: 'mine' };
    const look = () => ({ bound: [1, 1], found: { score: [1, 1], at: 'theirs' } });
    expect(leastInBox<string>({ low: [1], high: [9] }, look, { incumbent }).found).toBe(incumbent);
  });

  it('takes the empty box for its one point, and a box where nothing will do for none', () => {
    expect(
      leastInBox({ low: [], high: [] }, () => ({ bound: [2], found: { score: [2], at: 'it' } })).found?.at,
    ).toBe('it');
    expect(leastInBox({ low: [1], high: [9] }, () => undefined)).toEqual({ found: undefined, proven: true });
  });

  it('compares scores part by part', () => {
    expect(isBetter([1, 9], [2, 0])).toBe(true);
    expect(isBetter([1, 9], [1, 8])).toBe(false);
    expect(isBetter([1, 8], [1, 8])).toBe(false);
  });
});
