import type { Noun } from '@steelyard/api/contract/studies';
import type { Feasible, OptionPlan } from '@steelyard/calc';

/** How the study calls its participants and clusters, and the arms an option compares, control first. */
export interface StudyWords {
  participants: Noun;
  clusters: Noun;
  arms: readonly string[];
}

/** What happens in one period of a sequence: the arm given, by its index, or a measurement before any. */
export type Cell = number | 'before';

/** Sequences × periods. */
export interface Schematic {
  periods: readonly string[];
  sequences: readonly { name: string; cells: readonly Cell[] }[];
}

/** The face of one design family. */
export interface FamilyUi {
  /** One line below the option's name; without a size, the structure alone. */
  summary(plan: OptionPlan, size: Feasible | null, words: StudyWords): string;
  /** What the size counts, as a label: “Participants in each arm”. */
  sizeNoun(plan: OptionPlan, words: StudyWords): string;
  schematic(plan: OptionPlan, words: StudyWords): Schematic;
}
