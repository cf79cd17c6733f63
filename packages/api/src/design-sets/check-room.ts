import { invalid } from '../common/problem.js';

/** Each has a letter. */
const most = 26;

export function checkRoom(options: number): void {
  if (options < most) return;
  throw invalid([{ path: '', message: `A study compares ${most} options or fewer: remove one first.` }]);
}
