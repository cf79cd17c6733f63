import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import type { Hold } from '@steelyard/calc';
import { aggregateProperties } from '../common/base.entity.js';
import type { Choice } from '../contract/design-sets.js';
import { Person } from '../people/person.entity.js';
import { Study } from '../studies/study.entity.js';

/** Options side by side, and what is held equal between them. */
export const DesignSet = defineEntity({
  name: 'DesignSet',
  properties: {
    ...aggregateProperties,
    study: () => p.oneToOne(Study),
    hold: p.json<Hold>(),
    /** In the order that gives them their letters; those removed keep their place, in case they come back. */
    optionIds: p.json<string[]>(),
    choice: p.json<Choice>().nullable(),
    chosenBy: () => p.manyToOne(Person).nullable(),
  },
});

export type DesignSet = InferEntity<typeof DesignSet>;
