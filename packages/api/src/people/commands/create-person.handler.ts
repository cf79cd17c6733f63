import { EntityManager, UniqueConstraintViolationException } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { recordAudit } from '../../audit/record-audit.js';
import { newAggregate } from '../../common/base.entity.js';
import { Clock } from '../../common/clock.js';
import { invalid } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import { Passwords } from '../passwords.js';
import { Person } from '../person.entity.js';
import { accountName } from '../person.view.js';
import { CreatePerson, newPersonSchema } from './create-person.command.js';

@CommandHandler(CreatePerson)
export class CreatePersonHandler implements ICommandHandler<CreatePerson> {
  constructor(
    private readonly em: EntityManager,
    private readonly passwords: Passwords,
    private readonly clock: Clock,
  ) {}

  async execute(command: CreatePerson): Promise<string> {
    const { password, ...given } = validated(newPersonSchema, command.person);
    const em = this.em.fork();
    const passwordHash = await this.passwords.hash(password);
    const now = this.clock.now();
    const person = em.create(Person, { ...newAggregate(now), ...given, passwordHash });
    const deed = { action: 'added', what: accountName(person), after: given } as const;
    recordAudit(em, deed, { at: now, by: null, study: null });
    try {
      await em.flush();
    } catch (error) {
      if (!(error instanceof UniqueConstraintViolationException)) throw error;
      throw invalid([{ path: 'email', message: 'Somebody has this e-mail address already.' }]);
    }
    return person.id;
  }
}
