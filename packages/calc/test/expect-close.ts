import { expect } from 'vitest';

/** Whole numbers, flags and nulls must be equal; reals within `tolerance`, relative above 1. */
export function expectClose(actual: unknown, expected: unknown, tolerance: number, name: string): void {
  if (Array.isArray(expected)) {
    expect(Array.isArray(actual), name).toBe(true);
    expect((actual as unknown[]).length, name).toBe(expected.length);
    expected.forEach((value, index) => {
      expectClose((actual as unknown[])[index], value, tolerance, `${name}.${index}`);
    });
    return;
  }
  if (typeof expected !== 'number' || Number.isInteger(expected)) {
    if (typeof actual === 'number' && !Number.isInteger(actual) && typeof expected === 'number') {
      expect(Math.abs(actual - expected), `${name}: ${actual} against ${expected}`).toBeLessThanOrEqual(
        tolerance,
      );
      return;
    }
    expect(actual, name).toBe(expected);
    return;
  }
  const error = Math.abs((actual as number) - expected) / Math.max(1, Math.abs(expected));
  expect(error, `${name}: ${actual} against ${expected}`).toBeLessThanOrEqual(tolerance);
}
