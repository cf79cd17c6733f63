import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { StudyView } from '../../contract/studies.js';
import { openStudy } from '../open-study.js';
import { readStudy } from '../read-study.js';
import { WhichStudy } from './which-study.query.js';

@QueryHandler(WhichStudy)
export class WhichStudyHandler implements IQueryHandler<WhichStudy> {
  constructor(private readonly em: EntityManager) {}

  async execute(query: WhichStudy): Promise<StudyView> {
    const em = this.em.fork();
    return readStudy(em, await openStudy(em, query));
  }
}
