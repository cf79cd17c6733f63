import { randomUUID } from 'node:crypto';
import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { recordAudit } from '../../audit/record-audit.js';
import { renewWelcomeLink } from '../../auth/welcome-links.js';
import { newAggregate } from '../../common/base.entity.js';
import { Clock } from '../../common/clock.js';
import { invalid } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import { type InvitationView, newAccountSchema } from '../../contract/people.js';
import { Passwords } from '../passwords.js';
import { Person } from '../person.entity.js';
import { accountName, accountView } from '../person.view.js';
import { InvitePerson } from './invite-person.command.js';

@CommandHandler(InvitePerson)
export class InvitePersonHandler implements ICommandHandler<InvitePerson> {
  constructor(
    private readonly em: EntityManager,
    private readonly passwords: Passwords,
    private readonly clock: Clock,
  ) {}

  async execute({ personId, account }: InvitePerson): Promise<InvitationView> {
    const given = validated(newAccountSchema, account);
    const now = this.clock.now();
    // A password that nobody knows, until the person sets their own.
    const passwordHash = await this.passwords.hash(randomUUID());
    return this.em.fork().transactional(async (em) => {
      if ((await em.count(Person, { email: given.email })) > 0) {
        throw invalid([{ path: 'email', message: 'Somebody has this e-mail address already.' }]);
      }
      const person = em.create(Person, { ...newAggregate(now), ...given, passwordHash });
      const { link, expiresAt } = await renewWelcomeLink(em, person, now);
      const by = em.getReference(Person, personId);
      const deed = { action: 'added', what: accountName(person), after: given } as const;
      recordAudit(em, deed, { at: now, by, study: null });
      return { person: accountView(person, expiresAt), link };
    });
  }
}
