import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import type { FamilyId, PlanningValueKey } from '@steelyard/calc';
import { aggregateProperties } from '../common/base.entity.js';
import { Person } from '../people/person.entity.js';
import { Study } from './study.entity.js';

/** What a planning value speaks for. A word for all: NULLs are never equal, so unique they would not be. */
export type PlanningValueScope = FamilyId | 'every-family';

export const PlanningValue = defineEntity({
  name: 'PlanningValue',
  uniques: [{ properties: ['study', 'key', 'scope'] }],
  properties: {
    ...aggregateProperties,
    study: () => p.manyToOne(Study),
    key: p.string().$type<PlanningValueKey>(),
    scope: p.string().$type<PlanningValueScope>(),
    value: p.float(),
    low: p.float().nullable(),
    high: p.float().nullable(),
    source: p.text(),
    setBy: () => p.manyToOne(Person),
  },
});

export type PlanningValue = InferEntity<typeof PlanningValue>;
