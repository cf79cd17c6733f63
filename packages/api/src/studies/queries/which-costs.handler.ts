import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import { notFound } from '../../common/problem.js';
import type { CostPlanView } from '../../contract/studies.js';
import { CostPlan } from '../cost-plan.entity.js';
import { costPlanView } from '../cost-plan.view.js';
import { openStudy } from '../open-study.js';
import { WhichCosts } from './which-costs.query.js';

@QueryHandler(WhichCosts)
export class WhichCostsHandler implements IQueryHandler<WhichCosts> {
  constructor(private readonly em: EntityManager) {}

  async execute(query: WhichCosts): Promise<CostPlanView> {
    const em = this.em.fork();
    const { study } = await openStudy(em, query);
    const costPlan = await em.findOne(CostPlan, { study });
    if (!costPlan) throw notFound('This study has no costs yet.');
    return costPlanView(costPlan);
  }
}
