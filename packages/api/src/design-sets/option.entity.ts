import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import type { OptionPlan, Ruling } from '@steelyard/calc';
import { aggregateProperties } from '../common/base.entity.js';
import { Person } from '../people/person.entity.js';
import { DesignSet } from './design-set.entity.js';

/** One candidate design. */
export const Option = defineEntity({
  name: 'Option',
  properties: {
    ...aggregateProperties,
    designSet: () => p.manyToOne(DesignSet),
    name: p.string(),
    plan: p.json<OptionPlan>(),
    ruling: p.json<Ruling>().nullable(),
    ruledBy: () => p.manyToOne(Person).nullable(),
    ruledAt: p.datetime().nullable(),
    removedAt: p.datetime().nullable(),
  },
});

export type Option = InferEntity<typeof Option>;
