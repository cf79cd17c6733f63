import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { recordAudit } from '../../audit/record-audit.js';
import { newAggregate } from '../../common/base.entity.js';
import { Clock } from '../../common/clock.js';
import { invalid, notFound } from '../../common/problem.js';
import { Passwords } from '../../people/passwords.js';
import { Person } from '../../people/person.entity.js';
import { accountName } from '../../people/person.view.js';
import { FirstVisitCode } from '../first-visit-code.js';
import { Sessions, type StartedSession } from '../sessions.js';
import { CreateFirstAdministrator } from './create-first-administrator.command.js';

@CommandHandler(CreateFirstAdministrator)
export class CreateFirstAdministratorHandler implements ICommandHandler<CreateFirstAdministrator> {
  constructor(
    private readonly em: EntityManager,
    private readonly firstVisitCode: FirstVisitCode,
    private readonly passwords: Passwords,
    private readonly sessions: Sessions,
    private readonly clock: Clock,
  ) {}

  async execute({
    visit: { code, name, email, password },
  }: CreateFirstAdministrator): Promise<StartedSession> {
    const em = this.em.fork();
    if ((await em.count(Person)) > 0) throw firstVisitIsOver();
    if (!this.firstVisitCode.matches(code)) {
      throw invalid([{ path: 'code', message: 'This is not the code printed on the server’s console.' }]);
    }
    const passwordHash = await this.passwords.hash(password);
    return em.transactional(async (em) => {
      // Counted again where it is certain: two visits may have come this far together.
      if ((await em.count(Person)) > 0) throw firstVisitIsOver();
      const now = this.clock.now();
      const person = em.create(Person, {
        ...newAggregate(now),
        name,
        email,
        passwordHash,
        administrator: true,
      });
      const deed = { action: 'added', what: accountName(person), after: { administrator: true } } as const;
      recordAudit(em, deed, { at: now, by: person, study: null });
      return this.sessions.start(em, person);
    });
  }
}

const firstVisitIsOver = () => notFound('The first visit is over: somebody has an account. Sign in instead.');
