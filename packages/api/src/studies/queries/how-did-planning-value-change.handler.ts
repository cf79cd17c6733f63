import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { PlanningValueHistoryView } from '../../contract/planning-values.js';
import { findPlanningValue } from '../find-planning-value.js';
import { openStudy } from '../open-study.js';
import { planningValueRevisionView } from '../planning-value.view.js';
import { PlanningValueRevision } from '../planning-value-revision.entity.js';
import { HowDidPlanningValueChange } from './how-did-planning-value-change.query.js';

@QueryHandler(HowDidPlanningValueChange)
export class HowDidPlanningValueChangeHandler implements IQueryHandler<HowDidPlanningValueChange> {
  constructor(private readonly em: EntityManager) {}

  async execute(query: HowDidPlanningValueChange): Promise<PlanningValueHistoryView> {
    const em = this.em.fork();
    const { study } = await openStudy(em, query);
    const planningValue = await findPlanningValue(em, study, query.planningValueId);
    const revisions = await em.find(
      PlanningValueRevision,
      { planningValue },
      { populate: ['setBy'], orderBy: { version: 'desc' } },
    );
    return { entries: revisions.map(planningValueRevisionView) };
  }
}
