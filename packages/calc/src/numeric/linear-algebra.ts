/** A square matrix, its entries row by row. */
export interface SquareMatrix {
  order: number;
  entries: Float64Array;
}

export function zeroMatrix(order: number): SquareMatrix {
  return { order, entries: new Float64Array(order * order) };
}

export function squareMatrix(order: number, entry: (row: number, column: number) => number): SquareMatrix {
  const matrix = zeroMatrix(order);
  for (let i = 0; i < order; i += 1) {
    for (let j = 0; j < order; j += 1) matrix.entries[i * order + j] = entry(i, j);
  }
  return matrix;
}

export function product(left: SquareMatrix, right: SquareMatrix): SquareMatrix {
  const { order } = left;
  const result = zeroMatrix(order);
  for (let i = 0; i < order; i += 1) {
    for (let k = 0; k < order; k += 1) {
      const factor = left.entries[i * order + k] as number;
      for (let j = 0; j < order; j += 1) {
        const at = i * order + j;
        result.entries[at] =
          (result.entries[at] as number) + factor * (right.entries[k * order + j] as number);
      }
    }
  }
  return result;
}

/** A pivot this small a part of what stood there before is rounding, not information. */
const aliased = 1e-10;

/**
 * What a positive semidefinite matrix leaves of its last rows once the first `eliminated` are solved for.
 *
 * *Formula*: C − B′A⁻B for the blocks A, B, B′, C, by symmetric elimination; a row that depends on those before
 * it, with a pivot not above `smallestPivot` of its diagonal, is passed over, as in a generalised inverse.
 * *Source*: Golub & Van Loan 2013, Matrix Computations, 4th ed., section 4.2.
 * *Accuracy*: relative 1e-13 times the condition of A (linear-algebra.test.ts).
 */
export function schurComplement(
  { order, entries }: SquareMatrix,
  eliminated: number,
  smallestPivot = aliased,
): SquareMatrix {
  const a = entries.slice();
  for (let k = 0; k < eliminated; k += 1) {
    const pivot = a[k * order + k] as number;
    if (!(pivot > smallestPivot * (entries[k * order + k] as number))) continue;
    for (let i = k + 1; i < order; i += 1) {
      const share = (a[k * order + i] as number) / pivot;
      if (share === 0) continue;
      for (let j = i; j < order; j += 1) {
        a[i * order + j] = (a[i * order + j] as number) - share * (a[k * order + j] as number);
      }
    }
  }
  const left = zeroMatrix(order - eliminated);
  for (let i = 0; i < left.order; i += 1) {
    for (let j = i; j < left.order; j += 1) {
      const entry = a[(i + eliminated) * order + j + eliminated] as number;
      left.entries[i * left.order + j] = entry;
      left.entries[j * left.order + i] = entry;
    }
  }
  return left;
}

/**
 * The inverse of a positive definite matrix, or the first row that depends on those before it.
 * `scale` holds what each diagonal entry is measured against; the matrix's own diagonal if left out.
 *
 * *Formula*: Cholesky's LL′, then L⁻¹′L⁻¹.
 * *Source*: Golub & Van Loan 2013, Matrix Computations, 4th ed., section 4.2.
 * *Accuracy*: relative 1e-14 times the condition (linear-algebra.test.ts).
 */
export function positiveDefiniteInverse(
  { order, entries }: SquareMatrix,
  scale?: readonly number[],
): { inverse: SquareMatrix } | { dependent: number } {
  // Gauss–Jordan without exchanges is Cholesky's elimination and the solution in one sweep.
  const a = entries.slice();
  for (let k = 0; k < order; k += 1) {
    const pivot = a[k * order + k] as number;
    const against = scale?.[k] ?? (entries[k * order + k] as number);
    if (!(pivot > aliased * against)) return { dependent: k };
    a[k * order + k] = 1;
    for (let j = 0; j < order; j += 1) a[k * order + j] = (a[k * order + j] as number) / pivot;
    for (let i = 0; i < order; i += 1) {
      if (i === k) continue;
      const share = a[i * order + k] as number;
      a[i * order + k] = 0;
      for (let j = 0; j < order; j += 1) {
        a[i * order + j] = (a[i * order + j] as number) - share * (a[k * order + j] as number);
      }
    }
  }
  return { inverse: { order, entries: a } };
}

/** Sweeps of rotations after which any matrix of doubles is diagonal. */
const mostSweeps = 30;

/**
 * Eigenvalues and orthonormal eigenvectors of a symmetric matrix; vector k is column k.
 *
 * *Formula*: cyclic Jacobi rotations.
 * *Source*: Golub & Van Loan 2013, Matrix Computations, 4th ed., section 8.5.
 * *Accuracy*: absolute 1e-15 times the largest eigenvalue and the order (linear-algebra.test.ts).
 */
export function symmetricEigen({ order, entries }: SquareMatrix): {
  values: number[];
  vectors: SquareMatrix;
} {
  const a = entries.slice();
  const vectors = zeroMatrix(order);
  const v = vectors.entries;
  for (let i = 0; i < order; i += 1) v[i * order + i] = 1;
  const size = entries.reduce((sum, entry) => sum + entry * entry, 0);
  for (let sweep = 0; sweep < mostSweeps && offDiagonal(a, order) > 1e-34 * size; sweep += 1) {
    for (let p = 0; p < order; p += 1) {
      for (let q = p + 1; q < order; q += 1) rotate(a, v, order, p, q);
    }
  }
  return { values: Array.from({ length: order }, (_, k) => a[k * order + k] as number), vectors };
}

function offDiagonal(a: Float64Array, order: number): number {
  let sum = 0;
  for (let p = 0; p < order; p += 1) {
    for (let q = p + 1; q < order; q += 1) sum += (a[p * order + q] as number) ** 2;
  }
  return sum;
}

/** Turns rows and columns p and q so that their common entry becomes 0. */
function rotate(a: Float64Array, v: Float64Array, order: number, p: number, q: number): void {
  const common = a[p * order + q] as number;
  if (common === 0) return;
  const theta = ((a[q * order + q] as number) - (a[p * order + p] as number)) / (2 * common);
  const tangent = (theta < 0 ? -1 : 1) / (Math.abs(theta) + Math.hypot(theta, 1));
  const cosine = 1 / Math.hypot(tangent, 1);
  const sine = tangent * cosine;
  const turn = (matrix: Float64Array, one: number, other: number) => {
    const x = matrix[one] as number;
    const y = matrix[other] as number;
    matrix[one] = cosine * x - sine * y;
    matrix[other] = sine * x + cosine * y;
  };
  for (let k = 0; k < order; k += 1) turn(a, k * order + p, k * order + q);
  for (let k = 0; k < order; k += 1) {
    turn(a, p * order + k, q * order + k);
    turn(v, k * order + p, k * order + q);
  }
  a[p * order + q] = 0;
  a[q * order + p] = 0;
}
