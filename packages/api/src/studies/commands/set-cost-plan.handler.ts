import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import type { CostPlan as Costs } from '@steelyard/calc';
import { newAggregate } from '../../common/base.entity.js';
import { Clock } from '../../common/clock.js';
import { expectVersion } from '../../common/expect-version.js';
import { invalid } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import { Person } from '../../people/person.entity.js';
import { CostPlan } from '../cost-plan.entity.js';
import { openStudy } from '../open-study.js';
import { newCostPlanSchema, SetCostPlan } from './set-cost-plan.command.js';

@CommandHandler(SetCostPlan)
export class SetCostPlanHandler implements ICommandHandler<SetCostPlan> {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  async execute(command: SetCostPlan): Promise<string> {
    const { costs, timeline, version } = validated(newCostPlanSchema, command.costPlan);
    const em = this.em.fork();
    const { study } = await openStudy(em, command, 'set costs');
    checkTreatments(costs, study.treatments.length);
    const current = await em.findOne(CostPlan, { study });
    expectVersion(current, version);
    const now = this.clock.now();
    const changes = { costs, timeline, setBy: em.getReference(Person, command.personId), changedAt: now };
    const costPlan = current
      ? em.assign(current, changes)
      : em.create(CostPlan, { ...newAggregate(now), study, ...changes });
    await em.flush();
    return costPlan.id;
  }
}

function checkTreatments(costs: Costs, treatments: number): void {
  const wrong = (['perExposure', 'perClusterPeriod'] as const).filter(
    (line) => costs[line] !== undefined && costs[line].length !== treatments,
  );
  if (wrong.length > 0) {
    const message = `State one figure for each of the study’s ${treatments} treatments.`;
    throw invalid(wrong.map((line) => ({ path: `costs.${line}`, message })));
  }
}
