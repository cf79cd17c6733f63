import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CalcError, paretoFront, type Weighed } from '../../src/index.js';
import { runs } from '../arbitrary-requests.js';

const item = (participants: number, cost: number, months: number, power: number) => ({
  participants,
  cost,
  months,
  power,
});

describe('the Pareto front', () => {
  it('drops what another item is as good as on every measure and better on one', () => {
    const best = item(100, 5, 12, 0.8);
    expect(paretoFront([best, item(101, 5, 12, 0.8)])).toEqual([best]);
    expect(paretoFront([best, item(100, 6, 12, 0.8)])).toEqual([best]);
    expect(paretoFront([best, item(100, 5, 13, 0.8)])).toEqual([best]);
    expect(paretoFront([item(100, 5, 12, 0.79), best])).toEqual([best]);
  });

  it('keeps items that lead on one measure each, in their order', () => {
    const items = [item(100, 9, 9, 0.7), item(900, 1, 9, 0.7), item(900, 9, 1, 0.7), item(900, 9, 9, 0.9)];
    expect(paretoFront(items)).toEqual(items);
  });

  it('keeps ties', () => {
    const twins = [item(10, 1, 1, 0.8), item(10, 1, 1, 0.8)];
    expect(paretoFront([...twins, item(11, 1, 1, 0.8)])).toEqual(twins);
  });

  it('holds something better or equal for everything it leaves out, and nothing it could leave out', () => {
    const measure = fc.integer({ min: 1, max: 5 });
    const items = fc.array(
      fc.record({
        participants: measure,
        cost: measure,
        months: measure,
        power: fc.constantFrom(0.7, 0.8, 0.9),
      }),
      { maxLength: 20 },
    );
    const better = (a: Weighed, b: Weighed) =>
      a.participants <= b.participants &&
      a.cost <= b.cost &&
      a.months <= b.months &&
      a.power >= b.power &&
      JSON.stringify(a) !== JSON.stringify(b);
    fc.assert(
      fc.property(items, (all) => {
        const front = paretoFront(all);
        for (const each of all) {
          expect(front.includes(each)).toBe(!all.some((other) => better(other, each)));
          if (!front.includes(each)) expect(front.some((other) => better(other, each))).toBe(true);
        }
      }),
      runs(1000),
    );
  });

  it('refuses items without a measure, at its path', () => {
    const broken = [item(1, 1, 1, 0.8), { participants: 1, cost: 1, power: 0.8 }] as Weighed[];
    expect(() => paretoFront(broken)).toThrowError(
      expect.objectContaining({ name: 'CalcError', code: 'schema', path: 'items.1.months' }),
    );
    expect(() => paretoFront([item(1, Number.NaN, 1, 0.8)])).toThrowError(CalcError);
  });
});
