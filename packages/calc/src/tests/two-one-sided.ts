import { chiSquaredCdf } from '../distributions/chi-squared.js';
import { normalCdf, normalUpper } from '../distributions/normal.js';
import { stirlingError } from '../distributions/stirling.js';
import { gaussLegendre } from '../numeric/quadrature.js';
import { logarithmRemainder } from '../numeric/remainders.js';

const rule = /* @__PURE__ */ gaussLegendre(64);

/** Beyond this many standard errors a normal tail is under 1e-17. */
const reach = 8.5;
/** What the scale's distribution holds beyond its ends: exp(−37) = 1e-16. */
const depth = 37;

/**
 * Chance that both one-sided tests reject, so that the effect is shown to lie within ± `margin`.
 *
 * *Formula*: ∫ [Φ((Δ − δ)/SE − c·s) − Φ((−Δ − δ)/SE + c·s)]₊ f(s) ds with ν·s² ~ χ²(ν); s = 1 where `df` is null.
 * Up to the s at which the nearer bound begins to matter the integral is the χ² distribution's; from there
 * Gauss–Legendre with 64 nodes in s^¼, in which the density is smooth for any ν and nearly normal.
 * *Source*: Schuirmann 1987, J Pharmacokinet Biopharm 15:657; Owen 1965, Biometrika 52:437.
 * *Units*: effect, standard error and margin on one scale.
 * *Accuracy*: absolute 1e-13 for df from 1 (two-one-sided.json). NaN, or a standard error below 0, gives NaN.
 */
export function twoOneSidedPower(
  effect: number,
  standardError: number,
  df: number | null,
  critical: number,
  margin: number,
): number {
  if (!(standardError >= 0) || Number.isNaN(effect + critical + margin)) return Number.NaN;
  const off = Math.abs(effect);
  if (standardError === 0) return off < margin ? 1 : 0;
  const nearer = (margin - off) / standardError;
  const farther = (margin + off) / standardError;
  const within = (scale: number) =>
    normalCdf(nearer - critical * scale) - normalUpper(farther - critical * scale);
  if (df === null || critical === 0) return Math.max(0, within(1));
  if (!(df > 0)) return Number.NaN;
  const [lowest, highest] = scaleRange(df);
  const matters = Math.max(0, (nearer - reach) / critical);
  const from = Math.max(lowest, matters);
  const to = Math.min(highest, (nearer + reach) / critical, (nearer + farther) / (2 * critical));
  const before = matters > lowest ? chiSquaredCdf(df * matters * matters, df) : 0;
  return to > from ? before + integrateScale(within, df, from, to) : before;
}

/**
 * Where the scale s of a χ² estimate with `df` lies but for 1e-16 at either end.
 *
 * *Source*: Laurent & Massart 2000, Ann Stat 28:1302, lemma 1; the Chernoff bound for the lower end of few df.
 */
function scaleRange(df: number): [lowest: number, highest: number] {
  const spread = 2 * Math.sqrt(depth / df);
  const lowest = Math.max(Math.exp(-1 - (2 * depth) / df), 1 - spread);
  return [Math.sqrt(lowest), Math.sqrt(1 + spread + (2 * depth) / df)];
}

/** ∫ g(s) f(s) ds over s = u⁴, f the density of the scale: √(ν/π)·exp(−error − ν/2·(s² − 1 − log s²))/s. */
function integrateScale(g: (scale: number) => number, df: number, from: number, to: number): number {
  const low = from ** 0.25;
  const half = 0.5 * (to ** 0.25 - low);
  let sum = 0;
  for (let i = 0; i < rule.nodes.length; i += 1) {
    const u = low + half * (1 + (rule.nodes[i] as number));
    const scale = (u * u) ** 2;
    const square = scale * scale;
    // Each form where it keeps its digits.
    const drop = square < 0.5 ? Math.log(square) - square + 1 : logarithmRemainder((scale - 1) * (scale + 1));
    sum += ((rule.weights[i] as number) * g(scale) * Math.exp(0.5 * df * drop)) / u;
  }
  // ds/s = 4 du/u
  return 4 * half * sum * Math.sqrt(df / Math.PI) * Math.exp(-stirlingError(0.5 * df));
}
