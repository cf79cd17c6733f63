import { EntityManager } from '@mikro-orm/sqlite';
import { Inject } from '@nestjs/common';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { AccessView, DemoAccount } from '../../contract/access.js';
import { demoPassword, demoPeople } from '../../demo/people.js';
import { Person } from '../../people/person.entity.js';
import { appSettings, type Settings } from '../../settings/settings.js';
import { HowToEnter } from './how-to-enter.query.js';

@QueryHandler(HowToEnter)
export class HowToEnterHandler implements IQueryHandler<HowToEnter> {
  constructor(
    private readonly em: EntityManager,
    @Inject(appSettings.KEY) private readonly settings: Settings,
  ) {}

  async execute(): Promise<AccessView> {
    const accounts = this.settings.demo ? await this.demoAccounts() : [];
    return {
      firstVisit: (await this.em.fork().count(Person)) === 0,
      demo: accounts.length > 0 ? { password: demoPassword, accounts } : null,
    };
  }

  /** Those of the demo's people whom this database knows: it may have been started without the demo. */
  private async demoAccounts(): Promise<DemoAccount[]> {
    const people = Object.values(demoPeople);
    const known = await this.em.fork().find(Person, { email: { $in: people.map(({ email }) => email) } });
    const emails = new Set(known.map(({ email }) => email));
    return people
      .filter(({ email }) => emails.has(email))
      .map(({ name, email, part }) => ({ name, email, part }));
  }
}
