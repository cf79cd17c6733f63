import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { recordAudit } from '../../audit/record-audit.js';
import { Clock } from '../../common/clock.js';
import { invalid } from '../../common/problem.js';
import { Passwords } from '../../people/passwords.js';
import { Person } from '../../people/person.entity.js';
import { Sessions } from '../sessions.js';
import { ChangePassword } from './change-password.command.js';

@CommandHandler(ChangePassword)
export class ChangePasswordHandler implements ICommandHandler<ChangePassword> {
  constructor(
    private readonly em: EntityManager,
    private readonly passwords: Passwords,
    private readonly sessions: Sessions,
    private readonly clock: Clock,
  ) {}

  async execute({ personId, token, passwords: { current, next } }: ChangePassword): Promise<void> {
    const { passwordHash: former } = await this.em.fork().findOneOrFail(Person, personId);
    if (!(await this.passwords.match(current, former))) {
      throw invalid([{ path: 'current', message: 'This is not your password.' }]);
    }
    const passwordHash = await this.passwords.hash(next);
    const now = this.clock.now();
    await this.em.fork().transactional(async (em) => {
      const person = await em.findOneOrFail(Person, personId);
      em.assign(person, { passwordHash, changedAt: now });
      await this.sessions.endAll(em, personId, token);
      recordAudit(
        em,
        { action: 'changed', what: 'their own password' },
        { at: now, by: person, study: null },
      );
    });
  }
}
