import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { LimitsView } from '../../contract/limits.js';
import { Limits } from '../limits.entity.js';
import { limitsView } from '../limits.view.js';
import { openStudy } from '../open-study.js';
import { WhichLimits } from './which-limits.query.js';

@QueryHandler(WhichLimits)
export class WhichLimitsHandler implements IQueryHandler<WhichLimits> {
  constructor(private readonly em: EntityManager) {}

  async execute(query: WhichLimits): Promise<LimitsView> {
    const em = this.em.fork();
    const { study } = await openStudy(em, query);
    return limitsView(await em.findOne(Limits, { study }));
  }
}
