import { noncentralityNeeded, powerBeyond } from './one-bound.js';
import type { SingleTest } from './single-test.js';

/**
 * A difference in the direction of the target, against none.
 *
 * *Source*: Julious 2004, Stat Med 23:1921. A two-sided test that rejects the wrong way is no success.
 */
export const superiority: SingleTest = {
  distance: Math.abs,
  power: (contrast, critical, df) => powerBeyond(Math.abs(contrast.effect), contrast, critical, df),
  noncentralityNeeded,
};
