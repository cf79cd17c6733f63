import { invalid } from '../common/problem.js';
import type { Option } from './option.entity.js';

/** Refuses what would take the choice away from under its reasons. */
export function checkNotChosen({ id, designSet }: Option): void {
  if (designSet.choice?.optionId !== id) return;
  throw invalid([{ path: '', message: 'This option is the choice: withdraw the choice first.' }]);
}
