import type { StudyView } from '@steelyard/api/contract/studies';
import { figure, percent, withUnit } from '../../../shared/format/numbers';
import { isRatio } from './outcome-values';

/** The margin as one reads it, in the outcome's own terms; undefined where there is none. */
export function marginInWords({
  plan: { outcome, test },
  outcomeUnit,
}: Pick<StudyView, 'plan' | 'outcomeUnit'>): string | undefined {
  if (test.margin === undefined) return undefined;
  if (outcome.kind === 'binary') return points(test.margin);
  return isRatio(outcome.kind) ? figure(test.margin) : withUnit(figure(test.margin), outcomeUnit);
}

/** 0.08 as “8 percentage points”. */
export const points = (share: number): string => percent(share, 3).replace('%', 'percentage points');
