/**
 * A root near a close guess of a nearly straight function, by the secant method; `slope` starts it off.
 *
 * *Accuracy*: the error left is below `tolerance` relative to the root. *Returns* undefined where that is not
 * reached within 12 steps, or where the function gives NaN on the way: bracket the root instead.
 */
export function secantRoot(
  f: (x: number) => number,
  start: number,
  slope: number,
  tolerance: number,
): number | undefined {
  let before = start;
  let valueBefore = f(before);
  let x = start - valueBefore / slope;
  for (let round = 0; round < 12; round += 1) {
    const value = f(x);
    if (value === 0) return x;
    const step = (-value * (x - before)) / (value - valueBefore);
    const next = x + step;
    if (!Number.isFinite(next)) return undefined;
    // Steps shrink ever faster, so what is left after this one is below its share of the one before.
    const left = Math.abs(step) * Math.min(1, Math.abs(step / (x - before)));
    if (left <= tolerance * Math.abs(next)) return next;
    before = x;
    valueBefore = value;
    x = next;
  }
  return undefined;
}
