import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import { WelcomeLink } from '../../auth/welcome-link.entity.js';
import { Clock } from '../../common/clock.js';
import type { PeopleView } from '../../contract/people.js';
import { Person } from '../person.entity.js';
import { accountView } from '../person.view.js';
import { WhichPeople } from './which-people.query.js';

@QueryHandler(WhichPeople)
export class WhichPeopleHandler implements IQueryHandler<WhichPeople> {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  async execute(): Promise<PeopleView> {
    const em = this.em.fork();
    const people = await em.findAll(Person);
    const links = await em.find(WelcomeLink, { expiresAt: { $gt: this.clock.now() } });
    const expiries = new Map(links.map(({ person, expiresAt }) => [person.id, expiresAt]));
    const accounts = people.map((person) => accountView(person, expiries.get(person.id)));
    return { people: accounts.toSorted((a, b) => a.name.localeCompare(b.name, 'en')) };
  }
}
