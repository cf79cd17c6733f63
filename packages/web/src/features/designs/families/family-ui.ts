import type { Noun, StudyView } from '@steelyard/api/contract/studies';
import type { Feasible, OptionPlan } from '@steelyard/calc';
import type { ComponentType } from 'react';
import type { Control } from 'react-hook-form';

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

/** What a person may change of an option. */
export interface OptionDraft {
  name: string;
  plan: OptionPlan;
}

export interface StructureFormProps {
  control: Control<OptionDraft>;
  study: StudyView;
  plan: OptionPlan;
}

/** The face of one design family. */
export interface FamilyUi {
  /** What it is, for those choosing among families. */
  name: string;
  describes: string;
  /** Why the study cannot have it; undefined where it can. */
  refusal(study: StudyView): string | undefined;
  /** A plan to start from. */
  start(study: StudyView): OptionPlan;
  /** The plan with every part that the form shows. */
  whole(plan: OptionPlan): OptionPlan;
  /** One line below the option's name; without a size, the structure alone. */
  summary(plan: OptionPlan, size: Feasible | null, words: StudyWords): string;
  /** What the size counts, as a label: “Participants in each arm”. */
  sizeNoun(plan: OptionPlan, words: StudyWords): string;
  schematic(plan: OptionPlan, words: StudyWords): Schematic;
  /** The part of an option's form that is this family's own. */
  Structure: ComponentType<StructureFormProps>;
}
