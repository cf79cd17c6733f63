import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { MembersView } from '../../contract/members.js';
import { openStudy } from '../open-study.js';
import { readMembers } from '../read-members.js';
import { WhichMembers } from './which-members.query.js';

@QueryHandler(WhichMembers)
export class WhichMembersHandler implements IQueryHandler<WhichMembers> {
  constructor(private readonly em: EntityManager) {}

  async execute(query: WhichMembers): Promise<MembersView> {
    const em = this.em.fork();
    const { study } = await openStudy(em, query);
    return readMembers(em, study);
  }
}
