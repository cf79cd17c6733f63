import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import { verdict, weigh } from '@steelyard/calc';
import type { WeighView } from '../../contract/design-sets.js';
import { CostPlan } from '../../studies/cost-plan.entity.js';
import { openStudy } from '../../studies/open-study.js';
import { PlanningValue } from '../../studies/planning-value.entity.js';
import { ledgerEntryOf } from '../../studies/planning-value.view.js';
import { loadDesignSet } from '../load-design-set.js';
import { weighView } from '../weigh.view.js';
import { HowDoOptionsWeigh } from './how-do-options-weigh.query.js';

@QueryHandler(HowDoOptionsWeigh)
export class HowDoOptionsWeighHandler implements IQueryHandler<HowDoOptionsWeigh> {
  constructor(private readonly em: EntityManager) {}

  async execute(query: HowDoOptionsWeigh): Promise<WeighView> {
    const em = this.em.fork();
    const { study } = await openStudy(em, query);
    const { designSet, options } = await loadDesignSet(em, study);
    const ledger = await em.find(PlanningValue, { study });
    const costPlan = await em.findOne(CostPlan, { study });
    const { hold } = designSet;
    const weighed = weigh({
      question: study.plan,
      ledger: ledger.map(ledgerEntryOf),
      costs: costPlan && { costs: costPlan.costs, timeline: costPlan.timeline },
      hold,
      options,
    });
    const currency = costPlan?.costs.currency ?? '';
    const { participants, clusters = null } = study;
    return weighView(verdict(weighed, { hold, currency, participants, clusters }), weighed);
  }
}
