import { gaussLegendre, integrateFromZero } from '../numeric/quadrature.js';

const rule = /* @__PURE__ */ gaussLegendre(32);

/** What lies under exp(−depth) is left out. */
const depth = 40;

/**
 * How far a tail reaches beyond a point, measured in the density there: ∫exp(−fall(u)) du from 0 up, where the
 * density has fallen by exp(−fall(u)) at the distance u. `slope` and `bend` are the first two derivatives of
 * `fall` at 0, which is convex.
 *
 * *Formula*: Gauss–Legendre with 32 nodes up to a distance where `fall` is between 40 and 52.
 */
export function tailIntegral(fall: (u: number) => number, slope: number, bend: number): number {
  let within = 0;
  let length = (2 * depth) / (slope + Math.sqrt(slope * slope + 2 * depth * bend));
  let reached = fall(length);
  while (reached < depth) {
    within = length;
    length *= 1.5;
    reached = fall(length);
  }
  let beyond = length;
  while (!(reached >= depth && reached <= 1.3 * depth)) {
    length = 0.5 * (within + beyond);
    // So far out that no double lies where `fall` is of that height.
    if (!(within < length && length < beyond)) break;
    reached = fall(length);
    if (reached < depth) within = length;
    else beyond = length;
  }
  return integrateFromZero((u) => Math.exp(-fall(u)), length, rule);
}
