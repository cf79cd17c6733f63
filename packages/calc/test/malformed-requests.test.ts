import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type AppraisalRequest,
  appraise,
  CalcError,
  cheapest,
  curve,
  explain,
  mostPower,
} from '../src/index.js';
import { malformed } from './arbitrary-malformed.js';
import { runs } from './arbitrary-requests.js';

/** Where an answer holds something that is no finite number. */
function holes(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path];
  if (value === undefined) return [path];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => holes(inner, `${path}.${key}`));
}

/** Milliseconds that tell an answer from a hang; its working and its curve are several answers. */
const slow = 3000;

/** Milliseconds of processor time that the work takes; where that is long, the least of three runs. */
function millisecondsOf(work: () => unknown, allowed: number): number {
  const once = () => {
    const start = process.cpuUsage();
    work();
    const { user, system } = process.cpuUsage(start);
    return (user + system) / 1000;
  };
  const first = once();
  return first < allowed ? first : Math.min(first, once(), once());
}

function answers(work: () => unknown, allowed = slow): void {
  let answer: unknown;
  const spent = millisecondsOf(() => {
    try {
      answer = work();
    } catch (error) {
      if (!(error instanceof CalcError)) throw error;
      answer = error.toJSON();
      expect(error.message).not.toMatch(/NaN|undefined|\[object/);
    }
  }, allowed);
  expect(holes(answer)).toEqual([]);
  expect(spent).toBeLessThan(allowed);
}

const rate = fc.constantFrom(0, 1, 100, 5000, 1e6, 1e12);

describe('a malformed request', { timeout: 900_000 }, () => {
  it('is refused with a CalcError, or answered at once and without a hole', () => {
    fc.assert(
      fc.property(malformed, (request) => {
        answers(() => appraise(request));
      }),
      runs(100_000),
    );
  });

  it('is so by the working and the curve too', () => {
    fc.assert(
      fc.property(malformed, fc.constantFrom('units' as const, 'clusterSize' as const), (request, over) => {
        answers(() => explain(request), 2 * slow);
        answers(() => curve(request, { over, from: 2, to: 300, points: 5 }), 2 * slow);
      }),
      runs(10_000),
    );
  });

  it('is so by the searches for the best design', () => {
    const range = fc.record({ from: fc.constantFrom(0, 0.5, 1, 2), to: fc.constantFrom(0.5, 1, 3, 60, 1e9) });
    const search = fc.record(
      {
        clusterSize: range,
        allocation: range,
        within: fc.record({ money: rate, clusters: rate, months: rate }, { requiredKeys: [] }),
      },
      { requiredKeys: [] },
    );
    fc.assert(
      fc.property(malformed, search, (request, search) => {
        answers(() => cheapest(request, search), 5 * slow);
        answers(() => mostPower(request, search), 5 * slow);
      }),
      runs(1000),
    );
  });

  it('is refused when it is no request at all', () => {
    fc.assert(
      fc.property(fc.anything(), (junk) => {
        expect(() => appraise(junk as AppraisalRequest)).toThrowError(CalcError);
      }),
      runs(2000),
    );
  });
});
