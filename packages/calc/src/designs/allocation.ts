import type { Reallocation } from './family.js';

/** Smallest whole number not below x, forgiving 1e-9 so that 3 × (1/3) × 60 stays 60. */
export function ceilForgiving(x: number): number {
  return Math.ceil(x - 1e-9);
}

/** Analysed units of each group when the base group, the first, has `units`. */
export function groupSizes(units: number, allocation: readonly number[]): number[] {
  const base = allocation[0] ?? 1;
  return allocation.map((share) => ceilForgiving(units * (share / base)));
}

/** Fewest base units at which every group has `least`. */
export function minimumBaseUnits(allocation: readonly number[], least = 2): number {
  const base = allocation[0] ?? 1;
  let units = Math.max(least, Math.floor(((least - 1) * base) / Math.min(...allocation)));
  while (groupSizes(units, allocation).some((size) => size < least)) units += 1;
  return units;
}

/** Control against the active arms, whose shares among each other stay as they are. */
export function armsReallocated<D extends { allocation?: number[] | undefined }>(
  design: D,
  [, first = 1, ...others]: readonly number[] = [1, 1],
): Reallocation<D> {
  const shares = [1, ...others.map((share) => share / first)];
  return {
    base: 'control',
    perUnit: 1,
    fewestOpposite: minimumBaseUnits(shares),
    at: (units, opposite) => ({ ...design, allocation: [units, ...shares.map((share) => share * opposite)] }),
  };
}

/**
 * How far below a bisection's answer a smaller size may still reach the aim: rounding lifts a group by up to
 * one unit, worth 1/ratio units of the base group. None where every ratio is whole, since nothing is rounded.
 */
export function roundingReach(allocation: readonly number[]): number {
  const base = allocation[0] ?? 1;
  const ratios = allocation.map((share) => share / base);
  if (ratios.every((ratio) => Math.abs(ratio - Math.round(ratio)) < 1e-12 && ratio >= 1)) return 0;
  return 2 * Math.ceil(1 / Math.min(1, ...ratios)) + 2;
}

/** Recruited so that `analysed` remain after a share of them is lost. */
export function recruitedFor(analysed: number, lost: number | undefined): number {
  return ceilForgiving(analysed / (1 - (lost ?? 0)));
}

const twoArms: readonly string[] = ['Control', 'Active'];

/** "Control", "Active" or "Active 1", "Active 2"… */
export function armLabels(count: number): readonly string[] {
  if (count === 2) return twoArms;
  return Array.from({ length: count }, (_, arm) => (arm === 0 ? 'Control' : `Active ${arm}`));
}
