import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { recordAudit } from '../../audit/record-audit.js';
import { Clock } from '../../common/clock.js';
import { Passwords } from '../../people/passwords.js';
import { accountName } from '../../people/person.view.js';
import { Sessions, type StartedSession } from '../sessions.js';
import { openWelcomeLink } from '../welcome-links.js';
import { EnterByLink } from './enter-by-link.command.js';

@CommandHandler(EnterByLink)
export class EnterByLinkHandler implements ICommandHandler<EnterByLink> {
  constructor(
    private readonly em: EntityManager,
    private readonly passwords: Passwords,
    private readonly sessions: Sessions,
    private readonly clock: Clock,
  ) {}

  async execute({ token, password }: EnterByLink): Promise<StartedSession> {
    const now = this.clock.now();
    await openWelcomeLink(this.em.fork(), token, now);
    const passwordHash = await this.passwords.hash(password);
    return this.em.fork().transactional(async (em) => {
      const link = await openWelcomeLink(em, token, now);
      const { person } = link;
      em.assign(person, { passwordHash, changedAt: now });
      em.remove(link);
      await this.sessions.endAll(em, person.id);
      recordAudit(
        em,
        { action: 'welcomed', what: accountName(person) },
        { at: now, by: person, study: null },
      );
      return this.sessions.start(em, person);
    });
  }
}
