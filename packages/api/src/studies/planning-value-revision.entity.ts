import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import { Person } from '../people/person.entity.js';
import { PlanningValue } from './planning-value.entity.js';

/** A planning value as it stood at one version. */
export const PlanningValueRevision = defineEntity({
  name: 'PlanningValueRevision',
  properties: {
    id: p.integer().primary().autoincrement(),
    planningValue: () => p.manyToOne(PlanningValue).deleteRule('cascade'),
    version: p.integer(),
    value: p.float(),
    low: p.float().nullable(),
    high: p.float().nullable(),
    source: p.text(),
    setBy: () => p.manyToOne(Person),
    setAt: p.datetime(),
  },
});

export type PlanningValueRevision = InferEntity<typeof PlanningValueRevision>;
