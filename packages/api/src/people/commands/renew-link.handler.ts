import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { recordAudit } from '../../audit/record-audit.js';
import { renewWelcomeLink } from '../../auth/welcome-links.js';
import { Clock } from '../../common/clock.js';
import { notFound } from '../../common/problem.js';
import type { InvitationView } from '../../contract/people.js';
import { Person } from '../person.entity.js';
import { accountName, accountView } from '../person.view.js';
import { RenewLink } from './renew-link.command.js';

@CommandHandler(RenewLink)
export class RenewLinkHandler implements ICommandHandler<RenewLink> {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  execute({ personId, accountId }: RenewLink): Promise<InvitationView> {
    const now = this.clock.now();
    return this.em.fork().transactional(async (em) => {
      const person = await em.findOne(Person, accountId);
      if (!person) throw notFound('There is no such person.');
      const { link, expiresAt } = await renewWelcomeLink(em, person, now);
      const by = em.getReference(Person, personId);
      recordAudit(em, { action: 'invited', what: accountName(person) }, { at: now, by, study: null });
      return { person: accountView(person, expiresAt), link };
    });
  }
}
