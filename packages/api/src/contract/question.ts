import { questionPlanSchema } from '@steelyard/calc';
import { z } from 'zod';
import { nounSchema, treatmentSchema } from './nouns.js';
import { versionSchema } from './versions.js';

const line = (what: string) => z.string().trim().min(1, what).max(200);
const text = z.string().trim().max(2000);

/** Why the target difference is what it is. */
export const basisSchema = z.strictObject({
  kind: z.enum(['important', 'realistic', 'both']),
  toWhom: text,
  why: text,
});

export const intercurrentEventStrategies = [
  'treatment-policy',
  'hypothetical',
  'composite',
  'while-on-treatment',
  'principal-stratum',
] as const;

/** The attributes of ICH E9(R1); each may stay empty while a team is still at it. */
export const estimandSchema = z.strictObject({
  population: text,
  treatment: text,
  variable: text,
  intercurrentEvents: z
    .array(
      z.strictObject({
        event: line('Name the intercurrent event.'),
        strategy: z.enum(intercurrentEventStrategies),
      }),
    )
    .max(20, 'Name 20 intercurrent events or fewer.'),
  summary: text,
});

export const studyNameSchema = line('Name the study.');
export const organisationSchema = line('Name the organisation.');
export const questionTextSchema = z.string().trim().min(1, 'Ask the question in words.').max(1000);
export const outcomeLabelSchema = line('Name the outcome.');
export const outcomeUnitSchema = z.string().trim().max(40);
export const treatmentsSchema = z
  .array(treatmentSchema)
  .min(2, 'Name two treatments or more, control first.')
  .max(11, 'Name 11 treatments or fewer.');

export const newQuestionSchema = z.strictObject({
  version: versionSchema,
  name: studyNameSchema,
  organisation: organisationSchema,
  question: questionTextSchema,
  outcomeLabel: outcomeLabelSchema,
  outcomeUnit: outcomeUnitSchema,
  plan: questionPlanSchema,
  basis: basisSchema.nullable(),
  estimand: estimandSchema.nullable(),
  participants: nounSchema,
  clusters: nounSchema.nullable(),
  treatments: treatmentsSchema,
});

export type Basis = z.infer<typeof basisSchema>;
export type Estimand = z.infer<typeof estimandSchema>;
export type NewQuestion = z.input<typeof newQuestionSchema>;
