import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import type { CostPlan as Costs } from '@steelyard/calc';
import { newAggregate } from '../../common/base.entity.js';
import { expectVersion } from '../../common/expect-version.js';
import { invalid } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import { newCostPlanSchema } from '../../contract/costs.js';
import type { CostPlanView } from '../../contract/studies.js';
import { CostPlan } from '../cost-plan.entity.js';
import { costPlanView } from '../cost-plan.view.js';
import { StudyChanges } from '../study-changes.js';
import { SetCostPlan } from './set-cost-plan.command.js';

@CommandHandler(SetCostPlan)
export class SetCostPlanHandler implements ICommandHandler<SetCostPlan> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: SetCostPlan): Promise<CostPlanView> {
    const { version, ...figures } = validated(newCostPlanSchema, command.costPlan);
    return this.changes.make(command, 'set costs', async ({ em, study, by, now, record }) => {
      checkTreatments(figures.costs, study.treatments.length);
      const current = await em.findOne(CostPlan, { study });
      expectVersion(current, version, costPlanView);
      record({
        action: current ? 'changed' : 'added',
        what: 'costs and accrual',
        ...(current && { before: costPlanFacts(current) }),
        after: figures,
      });
      const changes = { ...figures, setBy: by, changedAt: now };
      const costPlan = current
        ? em.assign(current, changes)
        : em.create(CostPlan, { ...newAggregate(now), study, ...changes });
      await em.flush();
      return costPlanView(costPlan);
    });
  }
}

const costPlanFacts = ({ costs, timeline, source }: CostPlan) => ({
  costs,
  timeline,
  source: source ?? null,
});

function checkTreatments(costs: Costs, treatments: number): void {
  const wrong = (['perExposure', 'perClusterPeriod'] as const).filter(
    (line) => costs[line] !== undefined && costs[line].length !== treatments,
  );
  if (wrong.length > 0) {
    const message = `State one figure for each of the study’s ${treatments} treatments.`;
    throw invalid(wrong.map((line) => ({ path: `costs.${line}`, message })));
  }
}
