import { ledgerEntrySchema, questionPlanSchema, studyCostsSchema } from '@steelyard/calc';
import { z } from 'zod';
import { personSchema } from './access.js';
import { nounSchema, treatmentSchema } from './nouns.js';
import { basisSchema, estimandSchema } from './question.js';

export const studyRoles = ['methodologist', 'investigator', 'funder', 'reader'] as const;
export type StudyRole = (typeof studyRoles)[number];

export const studySummarySchema = z.object({
  id: z.uuid(),
  name: z.string(),
  organisation: z.string(),
  question: z.string(),
  fictional: z.boolean(),
  role: z.enum(studyRoles),
  /** Funders see submitted editions only; while there is none they cannot open the study. */
  mayOpen: z.boolean(),
  options: z.number().int(),
  /** The option settled on, once there is one. */
  choice: z.object({ letter: z.string(), name: z.string() }).nullable(),
  changedAt: z.iso.datetime(),
});

export const studiesSchema = z.object({ studies: z.array(studySummarySchema) });

export const memberSchema = z.object({
  person: personSchema.pick({ id: true, name: true }),
  role: z.enum(studyRoles),
});

export const studySchema = z.object({
  id: z.uuid(),
  version: z.number().int(),
  name: z.string(),
  organisation: z.string(),
  fictional: z.boolean(),
  question: z.string(),
  outcomeLabel: z.string(),
  /** The outcome's unit as shown behind a number, such as “g/L”; empty where it has none. */
  outcomeUnit: z.string(),
  plan: questionPlanSchema,
  /** Null until the team has said it. */
  basis: basisSchema.nullable(),
  estimand: estimandSchema.nullable(),
  treatments: z.array(treatmentSchema),
  participants: nounSchema,
  clusters: nounSchema.nullable(),
  role: z.enum(studyRoles),
  members: z.array(memberSchema),
  changedAt: z.iso.datetime(),
});

export const planningValueSchema = ledgerEntrySchema.extend({
  id: z.uuid(),
  version: z.number().int(),
  low: z.number().nullable(),
  high: z.number().nullable(),
  source: z.string(),
  setBy: z.string(),
  setAt: z.iso.datetime(),
});

export const ledgerSchema = z.object({ values: z.array(planningValueSchema) });

export const costPlanViewSchema = studyCostsSchema.extend({
  version: z.number().int(),
  /** Where the figures come from; null where nobody has said. */
  source: z.string().nullable(),
});

export type { Noun, Treatment } from './nouns.js';
export type StudiesView = z.infer<typeof studiesSchema>;
export type StudySummary = z.infer<typeof studySummarySchema>;
export type StudyView = z.infer<typeof studySchema>;
export type PlanningValueView = z.infer<typeof planningValueSchema>;
export type LedgerView = z.infer<typeof ledgerSchema>;
export type CostPlanView = z.infer<typeof costPlanViewSchema>;
