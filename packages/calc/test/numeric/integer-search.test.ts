import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { smallestInteger } from '../../src/numeric/integer-search.js';
import { runs } from '../arbitrary-requests.js';

/** The predicate, and how often it was asked. */
function counted(reaches: (n: number) => boolean) {
  const asked: number[] = [];
  const ask = (n: number) => {
    asked.push(n);
    return reaches(n);
  };
  return { asked, ask };
}

describe('smallestInteger', () => {
  it('finds the threshold from any guess, asking within the bounds only', () => {
    const integer = fc.integer({ min: 2, max: 1_000_000 });
    fc.assert(
      fc.property(integer, integer, (threshold, guess) => {
        const { asked, ask } = counted((n) => n >= threshold);
        expect(smallestInteger(ask, { from: 2, to: 1_000_000, guess })).toBe(threshold);
        expect(Math.min(...asked)).toBeGreaterThanOrEqual(2);
        expect(Math.max(...asked)).toBeLessThanOrEqual(1_000_000);
        expect(asked.length).toBeLessThanOrEqual(2 * Math.log2(Math.abs(threshold - guess) + 2) + 3);
        expect(new Set(asked).size).toBe(asked.length);
      }),
      runs(5000),
    );
  });

  it('asks twice where the guess is right or one short, three times where it is one too large', () => {
    for (const [guess, most] of [
      [100, 2],
      [99, 2],
      [100.4, 2],
      [101, 3],
    ] as const) {
      const { asked, ask } = counted((n) => n >= 100);
      expect(smallestInteger(ask, { from: 1, to: 1e9, guess })).toBe(100);
      expect(asked.length).toBeLessThanOrEqual(most);
    }
  });

  it('answers with the lower bound where that already reaches', () => {
    const { asked, ask } = counted(() => true);
    expect(smallestInteger(ask, { from: 4, to: 1000 })).toBe(4);
    expect(asked).toEqual([4]);
    expect(smallestInteger(() => true, { from: 4, to: 1000, guess: 700 })).toBe(4);
  });

  it('answers undefined where the upper bound does not reach', () => {
    expect(smallestInteger(() => false, { from: 1, to: 1e9 })).toBeUndefined();
    expect(smallestInteger((n) => n >= 11, { from: 1, to: 10, guess: 5 })).toBeUndefined();
    expect(smallestInteger((n) => n >= 10, { from: 1, to: 10, guess: 5 })).toBe(10);
    expect(smallestInteger(() => true, { from: 5, to: 4 })).toBeUndefined();
    expect(smallestInteger(() => true, { from: Number.NaN, to: 4 })).toBeUndefined();
  });

  it('takes a guess that is outside the bounds or NaN as none', () => {
    for (const guess of [Number.NaN, -50, Infinity]) {
      expect(smallestInteger((n) => n >= 7, { from: 1, to: 20, guess })).toBe(7);
    }
  });

  it('looks past dips as far as asked', () => {
    const dipping = (n: number) => n >= 20 && n !== 21 && n !== 22;
    expect(smallestInteger(dipping, { from: 1, to: 100, guess: 23 })).toBe(23);
    expect(smallestInteger(dipping, { from: 1, to: 100, guess: 23, lookBelow: 2 })).toBe(23);
    expect(smallestInteger(dipping, { from: 1, to: 100, guess: 23, lookBelow: 3 })).toBe(20);
  });
});
