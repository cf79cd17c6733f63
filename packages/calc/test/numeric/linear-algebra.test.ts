import { describe, expect, it } from 'vitest';
import {
  positiveDefiniteInverse,
  product,
  type SquareMatrix,
  schurComplement,
  squareMatrix,
  symmetricEigen,
} from '../../src/numeric/linear-algebra.js';
import cases from '../reference/periods/linear-algebra.json' with { type: 'json' };

const from = (rows: readonly (readonly number[])[]): SquareMatrix =>
  squareMatrix(rows.length, (i, j) => rows[i]?.[j] as number);

function expectNear(actual: SquareMatrix, expected: SquareMatrix, relative: number): void {
  const size = Math.max(...expected.entries.map(Math.abs));
  actual.entries.forEach((entry, at) => {
    expect(Math.abs(entry - (expected.entries[at] as number))).toBeLessThanOrEqual(relative * size);
  });
}

describe('matrices as base R computes them', () => {
  for (const { id, matrix, inverse, eliminated, complement, values, condition } of cases) {
    const a = from(matrix);

    it(`have the inverse of ${id}`, () => {
      const found = positiveDefiniteInverse(a);
      if (!('inverse' in found)) throw new Error('no inverse');
      expectNear(found.inverse, from(inverse), 1e-14 * condition * a.order);
    });

    it(`have the Schur complement of ${id}`, () => {
      expectNear(schurComplement(a, eliminated), from(complement), 1e-14 * condition * a.order);
    });

    it(`have the eigenvalues of ${id}, and vectors that belong to them`, () => {
      const found = symmetricEigen(a);
      const size = values.at(-1) as number;
      const sorted = [...found.values].sort((x, y) => x - y);
      sorted.forEach((value, k) => {
        expect(Math.abs(value - (values[k] as number))).toBeLessThanOrEqual(1e-14 * size);
      });
      const { order, entries: v } = found.vectors;
      const scaled = squareMatrix(
        order,
        (i, k) => (v[i * order + k] as number) * (found.values[k] as number),
      );
      expectNear(product(a, found.vectors), scaled, 1e-13);
    });
  }
});

describe('matrices with a row that depends on others', () => {
  const twice = from([
    [1, 2, 3],
    [2, 4, 6],
    [3, 6, 10],
  ]);

  it('have no inverse, and say which row it is', () => {
    expect(positiveDefiniteInverse(twice)).toEqual({ dependent: 1 });
  });

  it('pass it over in a Schur complement', () => {
    expect([...schurComplement(twice, 2).entries]).toEqual([1]);
  });
});
