const golden = 0.5 * (Math.sqrt(5) - 1);

/**
 * Where a function with one peak between `lo` and `hi` is highest.
 *
 * *Formula*: golden-section search.
 * *Source*: Kiefer 1953, Proc Am Math Soc 4:502.
 * *Accuracy*: 1e-9 of the interval; about 1e-8 of the place is all that values in double precision can tell.
 */
export function maximum(f: (x: number) => number, lo: number, hi: number): number {
  let from = lo;
  let to = hi;
  let left = to - golden * (to - from);
  let right = from + golden * (to - from);
  let atLeft = f(left);
  let atRight = f(right);
  while (to - from > 1e-9 * (hi - lo)) {
    if (atLeft >= atRight) {
      to = right;
      [right, atRight] = [left, atLeft];
      left = to - golden * (to - from);
      atLeft = f(left);
    } else {
      from = left;
      [left, atLeft] = [right, atRight];
      right = from + golden * (to - from);
      atRight = f(right);
    }
  }
  return 0.5 * (from + to);
}
