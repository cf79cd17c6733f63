import type { Hold } from '@steelyard/calc';
import { money } from '../../../shared/format/money';
import { percent } from '../../../shared/format/numbers';

/** A kind of hold, with its value where it is the one in force: “Power 80 %”. */
export function holdInWords(kind: Hold['kind'], hold: Hold, currency: string): string {
  if (kind === 'power') return hold.kind === 'power' ? `Power ${percent(hold.power)}` : 'Power';
  if (kind === 'budget') return hold.kind === 'budget' ? `Budget ${money(hold.budget, currency)}` : 'Budget';
  return 'Sizes';
}

export const holdMeanings: Record<Hold['kind'], string> = {
  power: 'Power: each option takes the fewest units that reach it.',
  budget: 'Budget: each option takes the most units within it.',
  sizes: 'Sizes: each option keeps the size entered for it.',
};
