import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import { verdict, weigh } from '@steelyard/calc';
import type { WeighView } from '../../contract/design-sets.js';
import { CostPlan } from '../../studies/cost-plan.entity.js';
import { ledgerOf } from '../../studies/ledger-of.js';
import { Limits } from '../../studies/limits.entity.js';
import { openStudy } from '../../studies/open-study.js';
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
    const costPlan = await em.findOne(CostPlan, { study });
    const limits = await em.findOne(Limits, { study });
    const { hold } = designSet;
    const weighed = weigh({
      question: study.plan,
      ledger: await ledgerOf(em, study),
      costs: costPlan && { costs: costPlan.costs, timeline: costPlan.timeline },
      hold,
      limits: limits?.limits ?? {},
      options: options.map(({ id, name, plan, ruling = null }) => ({ id, name, plan, ruling })),
    });
    const currency = costPlan?.costs.currency ?? '';
    const { participants, clusters = null } = study;
    return weighView(verdict(weighed, { hold, currency, participants, clusters }), weighed);
  }
}
