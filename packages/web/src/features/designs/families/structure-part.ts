import type { Comparisons } from '@steelyard/calc';

/** Which stances on several comparisons a design has. */
export interface ComparisonOffers {
  adjustments: readonly Comparisons['adjust'][];
  goals: readonly Comparisons['powerGoal'][];
  /** May every pair of arms be compared, or active arms with control only? */
  allPairs: boolean;
  /** May the arms' effects be stated one by one? */
  effects: boolean;
}

/** One part of an option's structure as its form asks for it: plain data, drawn by the form. */
export type StructurePart =
  /** A sentence. */
  | { part: 'told'; says: string }
  | { part: 'whole'; key: string; label: string; hint?: string }
  | { part: 'switch'; key: string; label: string; says: string }
  | { part: 'choice'; key: string; label: string; choices: readonly { value: string; label: string }[] }
  /** One share for each; `unequal` asks first whether they differ at all. */
  | { part: 'shares'; legend: string; says: string; of: readonly string[]; unequal?: string }
  | { part: 'measurements' }
  | { part: 'comparisons'; offers: ComparisonOffers }
  /** A crossover's sequences, named by letters. */
  | { part: 'sequences' }
  /** Control, active or not measured, cell by cell. */
  | { part: 'schedule' }
  /** New participants in each period, or the same. */
  | { part: 'cohort' }
  /** The schedule that all this comes to. */
  | { part: 'picture' };

export type PartOf<Kind extends StructurePart['part']> = Extract<StructurePart, { part: Kind }>;
