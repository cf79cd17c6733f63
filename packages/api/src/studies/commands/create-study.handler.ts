import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { recordAudit } from '../../audit/record-audit.js';
import { newAggregate } from '../../common/base.entity.js';
import { Clock } from '../../common/clock.js';
import { invalid } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import { Person } from '../../people/person.entity.js';
import { Membership } from '../membership.entity.js';
import { Study } from '../study.entity.js';
import { CreateStudy, newStudySchema } from './create-study.command.js';

@CommandHandler(CreateStudy)
export class CreateStudyHandler implements ICommandHandler<CreateStudy> {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  async execute({ personId, study: given }: CreateStudy): Promise<string> {
    const { members, ...properties } = validated(newStudySchema, given);
    const em = this.em.fork();
    const parts = [{ personId, role: 'methodologist' as const }, ...members];
    const ids = new Set(parts.map((part) => part.personId));
    if (ids.size < parts.length) {
      throw invalid([{ path: 'members', message: 'A person has one role in a study.' }]);
    }
    if ((await em.count(Person, { id: { $in: [...ids] } })) < ids.size) {
      throw invalid([{ path: 'members', message: 'A member is a person who has an account.' }]);
    }
    const now = this.clock.now();
    const study = em.create(Study, { ...newAggregate(now), ...properties });
    for (const part of parts) em.create(Membership, { study, person: part.personId, role: part.role });
    const by = em.getReference(Person, personId);
    recordAudit(em, { action: 'created', what: 'the study', after: properties }, { at: now, by, study });
    await em.flush();
    return study.id;
  }
}
