/** A structure's figure as it may be drawn: one that is being typed, or is out of bounds, gives way to the nearest. */
export function numberAt(value: unknown, fewest: number, most = 1e9): number {
  if (typeof value !== 'number' || !Number.isFinite(value)) return fewest;
  return Math.min(most, Math.max(fewest, Math.round(value)));
}
