import type { Noun, StudyView } from '@steelyard/api/contract/studies';
import type { Feasible, OptionPlan } from '@steelyard/calc';
import type { StructurePart } from './structure-part';

/** How the study calls its participants and clusters, and the arms an option compares, control first. */
export interface StudyWords {
  participants: Noun;
  clusters: Noun;
  arms: readonly string[];
}

/**
 * What happens in one period of a sequence: the arm given, by its index, while it is measured; a measurement before
 * any; crossing over, when nothing is measured yet; or nothing.
 */
export type Cell = number | 'before' | 'crossing' | 'unmeasured';

/** Those who are randomised to one arm or sequence, and what becomes of them. */
export interface Sequence {
  name: string;
  /** What the cells do not show: a share, or the groups within. */
  note?: string;
  cells: readonly Cell[];
  /** How large it is beside the others, where they differ. */
  share?: number;
  /** How participants stand within a cell, where not each for themselves. */
  nested?: 'groups' | 'subclusters';
}

/** Sequences × periods. */
export interface Schematic {
  periods: readonly string[];
  sequences: readonly Sequence[];
  /** Four sequences that are two treatments crossed: neither, the first, the second, both. */
  crossed?: boolean;
}

/** What a person may change of an option. */
export interface OptionDraft {
  name: string;
  plan: OptionPlan;
}

/** A plan to start from: the family is the one whose face gives it. */
export type StartPlan = Omit<OptionPlan, 'family'>;

/** What a family needs: who is randomised, and what it takes of the effect, its delivery and its rollout. */
export interface Suitability {
  randomises: 'individuals' | 'clusters';
  /** The condition stays as it is and the effect wears off. */
  reversible?: true;
  /** Treatment is delivered to groups. */
  groups?: true;
  /** Whether everyone is to have the treatment in the end, in stages. */
  staged?: boolean;
}

/** The face of one design family. */
export interface FamilyUi {
  /** What it is, for those choosing among families. */
  name: string;
  describes: string;
  /** What must hold of the question for it to be proposed. */
  suits: Suitability;
  /** Why the study cannot have it, beyond what its outcome and test allow; undefined where it can. */
  refusal(study: StudyView): string | undefined;
  start(study: StudyView): StartPlan;
  /** How many treatments it compares in this study, control among them. */
  arms(study: StudyView): { fewest: number; most: number };
  /** What each treatment is in the design, where they are not simply control and active ones. */
  roles?: readonly string[];
  /** The plan with every part that the form shows. */
  whole(plan: OptionPlan): OptionPlan;
  /** The plan with other treatments, and whatever goes by treatment with them. */
  treated(plan: OptionPlan, treatments: number[]): OptionPlan;
  /** What is wrong with a plan though each of its parts may be right. */
  fault?(plan: OptionPlan): { path: (string | number)[]; message: string } | undefined;
  /** One line below the option's name; without a size, the structure alone. */
  summary(plan: OptionPlan, size: Feasible | null, words: StudyWords): string;
  /** What the size counts, as a label: “Participants in each arm”. */
  sizeNoun(plan: OptionPlan, words: StudyWords): string;
  /** What the cluster size counts, in families that take one: “Girls in each catchment”. */
  clusterSizeNoun?(words: StudyWords): string;
  schematic(plan: OptionPlan, words: StudyWords): Schematic;
  /** The part of an option's form that is this family's own. */
  structure(plan: OptionPlan, study: StudyView, words: StudyWords): readonly StructurePart[];
}
