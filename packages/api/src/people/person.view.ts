import type { PersonView } from '../contract/access.js';
import type { Person } from './person.entity.js';

export const personView = ({ id, name, email, administrator }: Person): PersonView => ({
  id,
  name,
  email,
  administrator,
});
