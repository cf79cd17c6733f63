import type { OptionPlan } from '@steelyard/calc';
import { capitalised, counted } from '../../../shared/format/lists';
import { groupSizes } from './arms';
import type { FamilyUi } from './family-ui';

/** Each participant receives the treatments one after another, in the order of a sequence. */
export const crossover: FamilyUi = {
  summary(plan, size, { participants }) {
    const sequences = sequencesOf(plan);
    const periods = counted(sequences[0]?.length ?? 0, 'period', 'periods');
    return size
      ? `${groupSizes(size.groups.map((group) => group.participants))} ${participants.many}, ${periods}`
      : `${counted(sequences.length, 'sequence', 'sequences')}, ${periods}`;
  },
  sizeNoun: (_, { participants }) => `${capitalised(participants.many)} in each sequence`,
  schematic(plan) {
    const sequences = sequencesOf(plan);
    return {
      periods: [...(sequences[0] ?? '')].map((_, period) => `Period ${period + 1}`),
      sequences: sequences.map((sequence) => ({
        name: `Sequence ${sequence}`,
        cells: [...sequence].map((letter) => letter.charCodeAt(0) - 'A'.charCodeAt(0)),
      })),
    };
  },
};

function sequencesOf({ structure }: OptionPlan): string[] {
  return Array.isArray(structure.sequences) ? structure.sequences.map(String) : [];
}
