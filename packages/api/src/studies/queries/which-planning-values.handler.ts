import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { LedgerView } from '../../contract/studies.js';
import { openStudy } from '../open-study.js';
import { PlanningValue } from '../planning-value.entity.js';
import { ledgerView } from '../planning-value.view.js';
import { WhichPlanningValues } from './which-planning-values.query.js';

@QueryHandler(WhichPlanningValues)
export class WhichPlanningValuesHandler implements IQueryHandler<WhichPlanningValues> {
  constructor(private readonly em: EntityManager) {}

  async execute(query: WhichPlanningValues): Promise<LedgerView> {
    const em = this.em.fork();
    const { study } = await openStudy(em, query);
    return ledgerView(await em.find(PlanningValue, { study }, { populate: ['setBy'] }));
  }
}
