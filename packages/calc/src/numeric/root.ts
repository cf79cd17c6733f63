export interface RootOptions {
  /** Half-width of the final bracket relative to max(|root|, 1e-6). Default 1e-12. */
  tolerance?: number;
  /** Default 100. */
  maxIterations?: number;
  /** f(lo), where already known. */
  atLo?: number;
  /** f(hi), where already known. */
  atHi?: number;
}

export interface Root {
  root: number;
  converged: boolean;
  iterations: number;
}

const notFound = (root: number, iterations: number): Root => ({ root, converged: false, iterations });

/**
 * The point between `lo` and `hi` where a continuous function changes its sign.
 *
 * *Formula*: inverse quadratic interpolation where the last three points allow it, bisection elsewhere.
 * *Source*: Chandrupatla 1997, Advances in Engineering Software 28:145.
 * *Accuracy*: within 2·`tolerance`·max(|root|, 1e-6), for a tolerance down to 1e-15.
 * *Fails* with `converged: false`: no sign change (root NaN), a NaN on the way, or too many iterations (the
 * best point so far).
 */
export function findRoot(f: (x: number) => number, lo: number, hi: number, options: RootOptions = {}): Root {
  const { tolerance = 1e-12, maxIterations = 100 } = options;
  // a is the newest point, b the other end of the bracket, c the point before.
  let a = hi;
  let b = lo;
  let fa = options.atHi ?? f(hi);
  let fb = options.atLo ?? f(lo);
  if (fb === 0) return { root: lo, converged: true, iterations: 0 };
  if (fa === 0) return { root: hi, converged: true, iterations: 0 };
  if (!(fa > 0 ? fb < 0 : fa < 0 && fb > 0)) return notFound(Number.NaN, 0);

  let share = 0.5;
  for (let iterations = 1; iterations <= maxIterations; iterations++) {
    const next = a + share * (b - a);
    const value = f(next);
    if (Number.isNaN(value)) return notFound(next, iterations);
    let c = a;
    let fc = fa;
    if (value > 0 !== fa > 0) {
      c = b;
      fc = fb;
      b = a;
      fb = fa;
    }
    a = next;
    fa = value;

    const best = Math.abs(fa) < Math.abs(fb) ? a : b;
    const allowed = (tolerance * Math.max(Math.abs(best), 1e-6)) / Math.abs(b - a);
    if (fa === 0 || allowed > 0.5) return { root: best, converged: true, iterations };

    const xi = (a - b) / (c - b);
    const phi = (fa - fb) / (fc - fb);
    const interpolates = phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi;
    share = interpolates
      ? (fa / (fb - fa)) * (fc / (fb - fc)) + ((c - a) / (b - a)) * (fa / (fc - fa)) * (fb / (fc - fb))
      : 0.5;
    share = Math.min(1 - allowed, Math.max(allowed, share));
  }
  return notFound(Math.abs(fa) < Math.abs(fb) ? a : b, maxIterations);
}
