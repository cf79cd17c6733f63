import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import type { QuestionPlan } from '@steelyard/calc';
import { aggregateProperties } from '../common/base.entity.js';
import type { Noun, Treatment } from '../contract/nouns.js';
import type { Basis, Estimand } from '../contract/question.js';

export const Study = defineEntity({
  name: 'Study',
  properties: {
    ...aggregateProperties,
    name: p.string(),
    organisation: p.string(),
    fictional: p.boolean(),
    question: p.text(),
    outcomeLabel: p.string(),
    outcomeUnit: p.string(),
    plan: p.json<QuestionPlan>(),
    /** Control first; costs and options name treatments by their place in this list. */
    treatments: p.json<Treatment[]>(),
    participants: p.json<Noun>(),
    clusters: p.json<Noun>().nullable(),
    basis: p.json<Basis>().nullable(),
    estimand: p.json<Estimand>().nullable(),
  },
});

export type Study = InferEntity<typeof Study>;
