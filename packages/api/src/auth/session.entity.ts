import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import { Person } from '../people/person.entity.js';

export const Session = defineEntity({
  name: 'Session',
  properties: {
    /** SHA-256 of the token: whoever reads the database cannot sign in with what is in it. */
    id: p.string().primary(),
    person: () => p.manyToOne(Person).deleteRule('cascade'),
    createdAt: p.datetime(),
    lastSeenAt: p.datetime(),
    expiresAt: p.datetime().index(),
  },
});

export type Session = InferEntity<typeof Session>;
