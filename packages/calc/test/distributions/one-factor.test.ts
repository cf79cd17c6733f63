import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { noncentralTUpper } from '../../src/distributions/noncentral-t.js';
import { normalCdf } from '../../src/distributions/normal.js';
import {
  type OneFactorT,
  probabilityAllAbove,
  probabilityAllBelow,
  probabilityAnyAbove,
  probabilityAnyOutside,
} from '../../src/distributions/one-factor.js';
import { stepDown } from '../../src/distributions/one-factor-step-down.js';
import { runs } from '../arbitrary-requests.js';

interface Table<Row> {
  columns: (keyof Row)[];
  rows: unknown[][];
}

function table<Row>(name: string): Row[] {
  const file = new URL(`../reference/multiplicity/${name}.json`, import.meta.url);
  const { columns, rows } = JSON.parse(readFileSync(file, 'utf8')) as Table<Row>;
  return rows.map((row) => Object.fromEntries(row.map((value, index) => [columns[index], value])) as Row);
}

interface Given {
  loadings: number[];
  noncentralities: number[];
  /** null is the normal distribution. */
  df: number | null;
  limits: number[];
}

const statisticsOf = ({ loadings, noncentralities, df }: Given): OneFactorT => ({
  loadings,
  noncentralities,
  df: df ?? Infinity,
});

/** Fails with the worst row where an error is over what its row allows. */
function expectRows<Row>(rows: Row[], error: (row: Row) => number, allowed: (row: Row) => number): void {
  const ratio = (row: Row) => error(row) / allowed(row);
  const worst = rows.reduce((one, other) => (ratio(other) > ratio(one) ? other : one));
  expect(rows.length).toBeGreaterThan(5);
  expect(error(worst), `worst at ${JSON.stringify(worst)}`).toBeLessThanOrEqual(allowed(worst));
}

describe('comparisons with one control', () => {
  const exact = table<Given & Record<'allBelow' | 'anyAbove' | 'allAbove' | 'anyOutside', number>>(
    'one-factor',
  );
  const byMvtnorm = table<
    Given & Record<'allBelow' | 'allAbove' | 'error', number> & { allInside: number | null }
  >('mvtnorm');

  it('have joint probabilities within 1e-11 of independent quadrature', () => {
    const budget = () => 1e-11;
    for (const [found, field] of [
      [probabilityAllBelow, 'allBelow'],
      [probabilityAnyAbove, 'anyAbove'],
      [probabilityAllAbove, 'allAbove'],
    ] as const) {
      expectRows(exact, (row) => Math.abs(found(statisticsOf(row), row.limits) - row[field]), budget);
    }
    // Two-sided, noncentral and nearly the same takes seconds a row, and no strategy needs it.
    const bearable = exact.filter(
      ({ loadings, noncentralities }) =>
        noncentralities.every((centre) => centre === 0) || Math.max(...loadings.map(Math.abs)) < 0.99,
    );
    expectRows(
      bearable,
      (row) => Math.abs(probabilityAnyOutside(statisticsOf(row), row.limits) - row.anyOutside),
      budget,
    );
  });

  it('have central tails within a relative 1e-9 down to 1e-6', () => {
    const central = exact.filter(
      ({ noncentralities, anyAbove }) => noncentralities.every((centre) => centre === 0) && anyAbove > 1e-6,
    );
    const relative = (found: number, value: number) => Math.abs(found / value - 1);
    const budget = () => 1e-9;
    expectRows(
      central,
      (row) => relative(probabilityAnyAbove(statisticsOf(row), row.limits), row.anyAbove),
      budget,
    );
    expectRows(
      central,
      (row) => relative(probabilityAnyOutside(statisticsOf(row), row.limits), row.anyOutside),
      budget,
    );
  });

  it('have the probabilities of mvtnorm, within its own error', () => {
    const error = (row: { error: number }) => row.error + 1e-11;
    expectRows(
      byMvtnorm,
      (row) => Math.abs(probabilityAllBelow(statisticsOf(row), row.limits) - row.allBelow),
      error,
    );
    expectRows(
      byMvtnorm,
      (row) => Math.abs(probabilityAllAbove(statisticsOf(row), row.limits) - row.allAbove),
      error,
    );
    expectRows(
      byMvtnorm.filter(({ allInside }) => allInside !== null),
      (row) => Math.abs(1 - probabilityAnyOutside(statisticsOf(row), row.limits) - (row.allInside as number)),
      error,
    );
  });

  const one = fc.record({
    loading: fc.double({ min: -0.95, max: 0.95, noNaN: true }),
    centre: fc.double({ min: -1, max: 6, noNaN: true }),
    limit: fc.double({ min: 0.5, max: 6, noNaN: true }),
  });
  const degrees = fc.oneof(
    fc.double({ min: 0.5, max: 4, noNaN: true }).map((power) => 10 ** power),
    fc.constant(Infinity),
  );

  it('are a noncentral t where there is one', () => {
    fc.assert(
      fc.property(one, degrees, ({ loading, centre, limit }, df) => {
        const statistics = { loadings: [loading], noncentralities: [centre], df };
        const alone = noncentralTUpper(limit, df, centre);
        expect(Math.abs(probabilityAllAbove(statistics, [limit]) - alone)).toBeLessThan(1e-11);
        expect(Math.abs(probabilityAnyAbove(statistics, [limit]) - alone)).toBeLessThan(1e-11);
      }),
      runs(1000),
    );
  });

  it('add up: any of two is each of them less both, and what none exceeds is the rest', () => {
    fc.assert(
      fc.property(fc.tuple(one, one), degrees, (pair, df) => {
        const statistics = {
          loadings: pair.map(({ loading }) => loading),
          noncentralities: pair.map(({ centre }) => centre),
          df,
        };
        const limits = pair.map(({ limit }) => limit);
        const each = pair.reduce((sum, { limit, centre }) => sum + noncentralTUpper(limit, df, centre), 0);
        const any = probabilityAnyAbove(statistics, limits);
        expect(Math.abs(any - (each - probabilityAllAbove(statistics, limits)))).toBeLessThan(2e-11);
        expect(Math.abs(any + probabilityAllBelow(statistics, limits) - 1)).toBeLessThan(2e-11);
      }),
      runs(1000),
    );
  });

  it('are independent normal values without loadings and with known scale', () => {
    const statistics = { loadings: [0, 0, 0], noncentralities: [1, 2, 3], df: Infinity };
    const product = normalCdf(1) * normalCdf(0) * normalCdf(-1);
    expect(probabilityAllBelow(statistics, [2, 2, 2])).toBeCloseTo(product, 12);
  });

  it('are certain where a noncentrality is infinite', () => {
    const statistics = { loadings: [0.5, 0.5], noncentralities: [Infinity, Infinity], df: 4 };
    expect(probabilityAllAbove(statistics, [3, 3])).toBeCloseTo(1, 12);
    expect(probabilityAnyAbove(statistics, [3, 3])).toBeCloseTo(1, 12);
  });

  it('give NaN for what is no distribution', () => {
    for (const statistics of [
      { loadings: [1, 0.5], df: 5 },
      { loadings: [0.5, 0.5], df: 0 },
      { loadings: [0.5, Number.NaN], df: 5 },
      { loadings: [0.5, 0.5], noncentralities: [0, Number.NaN], df: 5 },
    ]) {
      expect(probabilityAnyAbove(statistics, [2, 2])).toBeNaN();
      expect(stepDown(statistics, [2, 1]).all).toBeNaN();
    }
    expect(probabilityAllBelow({ loadings: [0.5, 0.5], df: 5 }, [2, Number.NaN])).toBeNaN();
  });
});

describe('a step-down test', () => {
  const exact = table<Given & { each: number[]; all: number }>('step-down');

  it('rejects each and all with probabilities within 1e-10 of an enumeration of every order', () => {
    const found = (row: Given) => stepDown(statisticsOf(row), row.limits);
    expectRows(
      exact,
      (row) => Math.abs(found(row).all - row.all),
      () => 1e-10,
    );
    expectRows(
      exact,
      (row) =>
        Math.max(...found(row).each.map((power, index) => Math.abs(power - (row.each[index] as number)))),
      () => 1e-10,
    );
  });

  it('rejects alike statistics alike, however they are grouped', () => {
    const loadings = [0.7, 0.7, 0.7, 0.7];
    const limits = [2.5, 2.4, 2.2, 1.9];
    const alike = stepDown({ loadings, noncentralities: [3, 3, 3, 3], df: 40 }, limits);
    const nearly = stepDown(
      { loadings, noncentralities: [3, 3 + 1e-12, 3 + 2e-12, 3 + 3e-12], df: 40 },
      limits,
    );
    expect(nearly.all).toBeCloseTo(alike.all, 10);
    const differences = nearly.each.map((power, index) => Math.abs(power - (alike.each[index] as number)));
    expect(Math.max(...differences)).toBeLessThan(1e-10);
  });
});
