import { CalcError } from '../errors.js';
import type { Outcome, TestPlan } from '../request.js';
import type { Contrast } from './analysis.js';
import { equivalence } from './equivalence.js';
import { nonInferiority } from './non-inferiority.js';
import { superiority } from './superiority.js';

/** How one comparison is tested: the hypothesis, with its margin on the analysis scale. */
export interface SingleTest {
  /** How far an effect lies beyond what has to be ruled out; at 0 or below nothing can be shown. */
  distance(effect: number): number;
  /** Chance of rejecting in the hypothesised direction. */
  power(contrast: Contrast, critical: number, df: number | null): number;
  /** The distance/SE at which the test has `power`: exact for one bound, close for two. */
  noncentralityNeeded(contrast: Contrast, critical: number, df: number | null, power: number): number;
}

/** Outcomes whose effect is a log ratio, so that their margins are ratios. */
const ratioOutcomes: readonly Outcome['kind'][] = ['time-to-event', 'count', 'ordinal'];

/** The test of a request. Throws CalcError where sides, margin or the better direction do not go with it. */
export function singleTest({ hypothesis, sides, margin }: TestPlan, outcome: Outcome): SingleTest {
  if (hypothesis === 'superiority') {
    if (margin !== undefined) {
      throw new CalcError('unsupported', 'test.margin', 'A superiority test has no margin; leave it out.');
    }
    return superiority;
  }
  if (sides !== 1) {
    throw new CalcError(
      'schema',
      'test.sides',
      `${hypothesis === 'equivalence' ? 'Each of the two tests of equivalence' : 'A non-inferiority test'} has one side: state the type I error of that side.`,
    );
  }
  const allowed = marginOnAnalysisScale(margin, outcome);
  if (hypothesis === 'equivalence') return equivalence(allowed);
  if (outcome.better === undefined) {
    throw new CalcError(
      'schema',
      'outcome.better',
      'Say whether higher or lower is better: non-inferiority has a direction.',
    );
  }
  return nonInferiority(allowed, outcome.better === benefitOfPositive(outcome) ? 1 : -1);
}

/**
 * Which way the outcome is better where a positive effect is a benefit. A positive log odds ratio moves
 * participants to earlier categories.
 */
const benefitOfPositive = ({ kind }: Outcome) => (kind === 'ordinal' ? 'lower' : 'higher');

function marginOnAnalysisScale(margin: number | undefined, outcome: Outcome): number {
  if (margin === undefined) {
    throw new CalcError('schema', 'test.margin', 'State the margin that the difference must stay within.');
  }
  if (!ratioOutcomes.includes(outcome.kind)) return margin;
  if (margin <= 1) {
    throw new CalcError('schema', 'test.margin', 'The margin of a ratio must be above 1.');
  }
  return Math.log(margin);
}
