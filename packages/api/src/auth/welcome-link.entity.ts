import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import { Person } from '../people/person.entity.js';

/** Lets one person in once, to set a password; a person has one at most. */
export const WelcomeLink = defineEntity({
  name: 'WelcomeLink',
  properties: {
    /** SHA-256 of the token, as with sessions. */
    id: p.string().primary(),
    person: () => p.oneToOne(Person).deleteRule('cascade'),
    createdAt: p.datetime(),
    expiresAt: p.datetime(),
  },
});

export type WelcomeLink = InferEntity<typeof WelcomeLink>;
