import type { Step } from '../appraisal.js';
import { tex } from '../explain/tex.js';
import type { OutcomeModel } from '../outcomes/outcome-model.js';
import type { Contrast } from '../tests/analysis.js';

/** What the working of one comparison is made from. */
export interface Compared {
  contrast: Contrast;
  outcome: OutcomeModel;
  /** Analysed units of the arms compared. */
  n0: number;
  n1: number;
  /** Which comparison, where there are several. */
  of: string;
}

/** The comparisons that differ in the sizes of their arms or in their effect, so that each working stands once. */
export function distinctComparisons(
  contrasts: readonly Contrast[],
  outcomes: readonly OutcomeModel[],
  sizes: readonly number[],
): Compared[] {
  const found: Compared[] = [];
  for (const contrast of contrasts) {
    const outcome = outcomes[contrast.arm - 1] as OutcomeModel;
    const [n0, n1] = [sizes[contrast.versus] as number, sizes[contrast.arm] as number];
    const known = found.some(
      (other) => other.n0 === n0 && other.n1 === n1 && other.outcome.target === outcome.target,
    );
    const of = found.length === 0 ? '' : comparisonName(contrast);
    if (!known) found.push({ contrast, outcome, n0, n1, of });
  }
  return found;
}

function comparisonName({ arm, versus }: Contrast): string {
  return versus === 0 ? `, Active ${arm}` : `, Active ${arm} against Active ${versus}`;
}

/** The effect of a comparison, where it is not the first one's. */
export function ownEffectSteps({ contrast, outcome, of }: Compared, first: OutcomeModel): Step[] {
  if (outcome.target === first.target) return [];
  return [
    {
      label: `Effect${of}`,
      formula: '\\delta',
      substituted: tex(contrast.effect),
      value: contrast.effect,
      source: 'The effect stated for this arm, after dilution',
    },
  ];
}
