import { randomUUID } from 'node:crypto';
import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import type { StudyRole } from '../contract/studies.js';
import { Person } from '../people/person.entity.js';
import { Study } from './study.entity.js';

/** One person's part in one study; it changes with the study. */
export const Membership = defineEntity({
  name: 'Membership',
  uniques: [{ properties: ['study', 'person'] }],
  properties: {
    id: p
      .uuid()
      .primary()
      .onCreate(() => randomUUID()),
    study: () => p.manyToOne(Study),
    person: () => p.manyToOne(Person),
    role: p.string().$type<StudyRole>(),
  },
});

export type Membership = InferEntity<typeof Membership>;
