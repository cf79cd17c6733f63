import { polynomial } from './polynomial.js';

/** 1/3, 1/5, 1/7, …, enough for |v| < 0.1 and for |v| < 0.3. */
const oddReciprocals = [1 / 3, 1 / 5, 1 / 7, 1 / 9, 1 / 11, 1 / 13, 1 / 15, 1 / 17];
const moreOddReciprocals = [...oddReciprocals, 1 / 19, 1 / 21, 1 / 23, 1 / 25, 1 / 27, 1 / 29, 1 / 31];

/**
 * e^u − 1 − u, without the loss of digits near 0.
 *
 * *Formula*: u²/2! + u³/3! + … + u¹⁰/10! for |u| < 0.1, the definition elsewhere.
 * *Accuracy*: relative 2e-15 (remainders.json).
 */
export function exponentialRemainder(u: number): number {
  if (!(Math.abs(u) < 0.1)) return Math.expm1(u) - u;
  return (
    u *
    u *
    (0.5 +
      u *
        (0.16666666666666666 +
          u *
            (0.041666666666666664 +
              u *
                (0.008333333333333333 +
                  u *
                    (0.001388888888888889 +
                      u *
                        (0.0001984126984126984 +
                          u *
                            (2.48015873015873e-5 +
                              u * (2.7557319223985893e-6 + u * 2.755731922398589e-7))))))))
  );
}

/**
 * log(1 + u) − u, without the loss of digits near 0.
 *
 * *Formula*: with v = u/(2 + u), log(1 + u) = 2·(v + v³/3 + v⁵/5 + …) for |u| < 0.2, the definition elsewhere.
 * *Accuracy*: relative 2e-15 (remainders.json).
 */
export function logarithmRemainder(u: number): number {
  if (!(Math.abs(u) < 0.2)) return Math.log1p(u) - u;
  const v = u / (2 + u);
  return v * (2 * v * v * polynomial(v * v, oddReciprocals) - u);
}

/**
 * k·log(k/m) + m − k: how far m is from k on the scale of a log-likelihood, exact where they nearly agree.
 * `difference` is k − m, which the caller often knows to more digits than the subtraction would leave.
 *
 * *Formula*: with v = (k − m)/(k + m), (k − m)·v + 2k·(v³/3 + v⁵/5 + …) for |v| < 0.3.
 * *Source*: Loader 2000, Fast and accurate computation of binomial probabilities, section 3.
 * *Accuracy*: relative 2e-15 (deviance.json).
 */
export function deviance(k: number, m: number, difference = k - m): number {
  const v = difference / (k + m);
  if (!(Math.abs(v) < 0.3)) return k * Math.log(k / m) + m - k;
  return v * (difference + 2 * k * v * v * polynomial(v * v, moreOddReciprocals));
}

/**
 * a·b − c·d as if each product were exact.
 *
 * *Source*: Dekker 1971, Numerische Mathematik 18:224 (error of a product from halves of the factors).
 * *Accuracy*: relative 1e-15 unless the difference is under 1e-30 of the products; factors up to 1e150.
 */
export function differenceOfProducts(a: number, b: number, c: number, d: number): number {
  const ab = a * b;
  const cd = c * d;
  return ab - cd + (productError(a, b, ab) - productError(c, d, cd));
}

function productError(a: number, b: number, product: number): number {
  const aHigh = highHalf(a);
  const bHigh = highHalf(b);
  const aLow = a - aHigh;
  const bLow = b - bHigh;
  return aHigh * bHigh - product + aHigh * bLow + aLow * bHigh + aLow * bLow;
}

function highHalf(x: number): number {
  const shifted = 134217729 * x;
  return shifted - (shifted - x);
}
