/** A distance to the margin that is 0 but for rounding, as of 0.75 − 0.85 + 0.1, is 0: the effect lies at the margin. */
export const withoutNoise = (distance: number, margin: number): number =>
  Math.abs(distance) < 1e-12 * margin ? 0 : distance;
