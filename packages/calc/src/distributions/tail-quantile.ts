export interface Tail {
  /** The probability below u. */
  tail: number;
  /** The density at u. */
  density: number;
}

/**
 * The u below which a distribution has the probability p, at most ½.
 *
 * *Formula*: Newton's iteration on log(−log(tail)), which is nearly a straight line in u, or the logarithm of
 * one, in all tails here; halving where it leaves what earlier points have shown.
 */
export function tailQuantile(at: (u: number) => Tail, p: number, start: number): number {
  const aim = Math.log(p);
  let u = start;
  let low = -Infinity;
  let high = Infinity;
  for (let iteration = 0; iteration < 200; iteration++) {
    const { tail, density } = at(u);
    const logTail = Math.log(tail);
    const step = (Math.log(aim / logTail) * logTail * tail) / density;
    if (Math.abs(step) < 1e-8) return u + step;
    if (tail < p) low = u;
    else high = u;
    const next = u + step;
    if (next > low && next < high) u = next;
    else if (low === -Infinity) u = high - 1;
    else if (high === Infinity) u = low + 1;
    else u = 0.5 * (low + high);
  }
  return u;
}
