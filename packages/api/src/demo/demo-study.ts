import type { Hold, Limits, Ruling, StudyCosts } from '@steelyard/calc';
import type { z } from 'zod';
import type { newOptionSchema } from '../contract/options.js';
import type { newPlanningValueSchema } from '../contract/planning-values.js';
import type { StudyRole } from '../contract/studies.js';
import type { newStudySchema } from '../studies/commands/create-study.command.js';
import type { DemoPersonKey } from './people.js';

/** Something that was done some days before the seeding. */
type Dated<T> = T & { daysAgo: number };

/** A fictional study as its team entered it, step by step. */
export interface DemoStudy {
  study: Dated<Omit<z.input<typeof newStudySchema>, 'members' | 'fictional'>>;
  team: Record<StudyRole, DemoPersonKey>;
  planningValues: Dated<Omit<z.input<typeof newPlanningValueSchema>, 'version'>>[];
  costPlan: Dated<StudyCosts>;
  hold: Hold;
  limits?: Dated<{ limits: Limits }>;
  /** Those ruled on, by the methodologist. */
  options: Dated<Omit<z.input<typeof newOptionSchema>, 'ruling'> & { ruling?: Dated<Ruling> }>[];
}
