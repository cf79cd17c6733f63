import { Command } from '@nestjs/cqrs';
import type { NewCostPlan } from '../../contract/costs.js';
import type { CostPlanView } from '../../contract/studies.js';

export class SetCostPlan extends Command<CostPlanView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly costPlan: NewCostPlan,
  ) {
    super();
  }
}
