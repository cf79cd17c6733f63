import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import { Clock } from '../../common/clock.js';
import type { WelcomeView } from '../../contract/people.js';
import { openWelcomeLink } from '../welcome-links.js';
import { WhoIsWelcome } from './who-is-welcome.query.js';

@QueryHandler(WhoIsWelcome)
export class WhoIsWelcomeHandler implements IQueryHandler<WhoIsWelcome> {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  async execute({ token }: WhoIsWelcome): Promise<WelcomeView> {
    const { person } = await openWelcomeLink(this.em.fork(), token, this.clock.now());
    return { name: person.name, email: person.email };
  }
}
