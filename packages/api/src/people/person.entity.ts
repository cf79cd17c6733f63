import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import { aggregateProperties } from '../common/base.entity.js';

export const Person = defineEntity({
  name: 'Person',
  properties: {
    ...aggregateProperties,
    name: p.string(),
    /** In lower case, so that one address is one person. */
    email: p.string().unique(),
    passwordHash: p.string(),
    administrator: p.boolean(),
  },
});

export type Person = InferEntity<typeof Person>;
