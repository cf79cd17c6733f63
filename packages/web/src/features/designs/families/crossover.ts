import type { OptionPlan } from '@steelyard/calc';
import { capitalised, counted, list } from '../../../shared/format/lists';
import { groupSizes } from './arms';
import { comparedAnew, eachByItself, stance, withComparisons } from './comparisons';
import { armOf, lettersOf, presetsFor } from './crossover-sequences';
import type { FamilyUi } from './family-ui';

/** Each participant receives several treatments one after another, in the order of a sequence. */
export const crossover: FamilyUi = {
  name: 'Crossover',
  describes:
    'Each participant receives the treatments one after the other; for lasting, stable conditions and effects that wear off.',
  suits: { randomises: 'individuals', reversible: true },
  refusal: () => undefined,
  start: () => ({ treatments: [0, 1], structure: { sequences: ['AB', 'BA'] }, overrides: {} }),
  arms: ({ plan: { outcome } }) => ({ fewest: 2, most: outcome.kind === 'continuous' ? 10 : 2 }),
  whole: (plan) =>
    withComparisons({
      ...plan,
      structure: { sequences: usual(plan.treatments.length), ...plan.structure },
    }),
  treated(plan, treatments) {
    const same = treatments.length === plan.treatments.length;
    const sequences = same ? plan.structure.sequences : usual(treatments.length);
    return comparedAnew(plan, { ...plan, treatments, structure: { ...plan.structure, sequences } });
  },
  fault(plan) {
    const given = new Set(sequencesOf(plan).join(''));
    const letters = lettersOf(plan.treatments.length);
    const unknown = [...given].filter((letter) => !letters.includes(letter));
    const missing = letters.filter((letter) => !given.has(letter));
    const message =
      unknown.length > 0
        ? `The treatments compared are ${list(letters)}; ${list(unknown.sort())} is none of them.`
        : `No sequence gives ${list(missing)}.`;
    return unknown.length + missing.length > 0 ? { path: ['structure', 'sequences'], message } : undefined;
  },
  summary(plan, size, { participants }) {
    const sequences = sequencesOf(plan);
    const periods = counted(longest(sequences), 'period', 'periods');
    const sizes = size
      ? `${groupSizes(size.groups.map((group) => group.participants))} ${participants.many}`
      : counted(sequences.length, 'sequence', 'sequences');
    return [sizes, periods, stance(plan)].filter((part) => part !== undefined).join(', ');
  },
  sizeNoun: (_, { participants }) => `${capitalised(participants.many)} in each sequence`,
  schematic(plan) {
    const sequences = sequencesOf(plan);
    const periods = Array.from({ length: longest(sequences) }, (_, period) => `Period ${period + 1}`);
    return {
      periods,
      sequences: sequences.map((sequence) => ({
        name: `Sequence ${sequence}`,
        // A sequence that is being typed may be shorter than the others.
        cells: periods.map((_, period) => (sequence[period] ? armOf(sequence[period]) : 'unmeasured')),
      })),
    };
  },
  structure: (plan, { plan: { outcome } }) => [
    ...(outcome.kind === 'continuous'
      ? [
          { part: 'sequences' } as const,
          {
            part: 'switch',
            key: 'carryover',
            label: 'Allow for carryover',
            says: 'The analysis then estimates what a treatment leaves behind in the next period; sequences that cannot tell it apart, such as AB and BA, cannot be computed.',
          } as const,
        ]
      : [
          {
            part: 'told',
            says: 'AB and BA, half in each: a yes-or-no outcome is computed for these two sequences.',
          } as const,
        ]),
    { part: 'picture' },
    ...(plan.treatments.length > 2 ? [{ part: 'comparisons', offers: eachByItself } as const] : []),
  ],
};

const usual = (treatments: number): string[] => [...(presetsFor(treatments)[0]?.sequences ?? [])];

export function sequencesOf({ structure }: Pick<OptionPlan, 'structure'>): string[] {
  return Array.isArray(structure.sequences) ? structure.sequences.map(String) : [];
}

const longest = (sequences: readonly string[]): number =>
  Math.max(0, ...sequences.map((sequence) => sequence.length));
