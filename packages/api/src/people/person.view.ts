import type { PersonView } from '../contract/access.js';
import type { AccountView, ProfileView } from '../contract/people.js';
import type { Person } from './person.entity.js';

export const personView = ({ id, name, email, administrator }: Person): PersonView => ({
  id,
  name,
  email,
  administrator,
});

export const profileView = (person: Person): ProfileView => ({
  ...personView(person),
  version: person.version,
});

export const accountView = (person: Person, linkExpiresAt: Date | undefined): AccountView => ({
  ...personView(person),
  linkExpiresAt: linkExpiresAt?.toISOString() ?? null,
});

export const accountName = ({ name, email }: Person) => `account of ${name} <${email}>`;
