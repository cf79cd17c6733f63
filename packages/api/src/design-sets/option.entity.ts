import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import type { OptionPlan } from '@steelyard/calc';
import { aggregateProperties } from '../common/base.entity.js';
import { DesignSet } from './design-set.entity.js';

/** One candidate design. */
export const Option = defineEntity({
  name: 'Option',
  properties: {
    ...aggregateProperties,
    designSet: () => p.manyToOne(DesignSet),
    name: p.string(),
    plan: p.json<OptionPlan>(),
  },
});

export type Option = InferEntity<typeof Option>;
