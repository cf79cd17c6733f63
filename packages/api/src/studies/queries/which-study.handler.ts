import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { StudyView } from '../../contract/studies.js';
import { lastChanges } from '../last-changes.js';
import { Membership } from '../membership.entity.js';
import { openStudy } from '../open-study.js';
import { studyView } from '../study.view.js';
import { WhichStudy } from './which-study.query.js';

@QueryHandler(WhichStudy)
export class WhichStudyHandler implements IQueryHandler<WhichStudy> {
  constructor(private readonly em: EntityManager) {}

  async execute(query: WhichStudy): Promise<StudyView> {
    const em = this.em.fork();
    const membership = await openStudy(em, query);
    const { study } = membership;
    const memberships = await em.find(Membership, { study }, { populate: ['person'] });
    const changes = await lastChanges(em, [study.id]);
    return studyView(membership, { memberships, changedAt: changes.get(study.id) ?? study.changedAt });
  }
}
