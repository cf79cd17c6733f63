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

/** "Control", "Active" or "Active 1", "Active 2"… */
export function armLabels(count: number): string[] {
  return Array.from({ length: count }, (_, arm) => {
    if (arm === 0) return 'Control';
    return count === 2 ? 'Active' : `Active ${arm}`;
  });
}
