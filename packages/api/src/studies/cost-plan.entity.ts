import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import type { CostPlan as Costs, TimelinePlan } from '@steelyard/calc';
import { aggregateProperties } from '../common/base.entity.js';
import { Person } from '../people/person.entity.js';
import { Study } from './study.entity.js';

/** Money and months of a study. */
export const CostPlan = defineEntity({
  name: 'CostPlan',
  properties: {
    ...aggregateProperties,
    study: () => p.oneToOne(Study),
    costs: p.json<Costs>(),
    timeline: p.json<TimelinePlan>(),
    /** Where the figures come from; null where nobody has said. */
    source: p.text().nullable(),
    setBy: () => p.manyToOne(Person),
  },
});

export type CostPlan = InferEntity<typeof CostPlan>;
