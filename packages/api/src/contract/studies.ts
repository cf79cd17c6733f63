import { ledgerEntrySchema, questionPlanSchema, studyCostsSchema } from '@steelyard/calc';
import { z } from 'zod';
import { personSchema } from './access.js';

export const studyRoles = ['methodologist', 'investigator', 'funder', 'reader'] as const;
export type StudyRole = (typeof studyRoles)[number];

const word = z.string().trim().min(1, 'Enter a word.').max(100);

export const nounSchema = z.object({ one: word, many: word });

export const treatmentSchema = z.object({ name: z.string().trim().min(1, 'Name the treatment.').max(200) });

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

export const costPlanViewSchema = studyCostsSchema.extend({ version: z.number().int() });

export type Noun = z.infer<typeof nounSchema>;
export type Treatment = z.infer<typeof treatmentSchema>;
export type StudiesView = z.infer<typeof studiesSchema>;
export type StudySummary = z.infer<typeof studySummarySchema>;
export type StudyView = z.infer<typeof studySchema>;
export type PlanningValueView = z.infer<typeof planningValueSchema>;
export type LedgerView = z.infer<typeof ledgerSchema>;
export type CostPlanView = z.infer<typeof costPlanViewSchema>;
