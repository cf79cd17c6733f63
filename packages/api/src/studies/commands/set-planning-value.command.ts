import { Command } from '@nestjs/cqrs';
import type { NewPlanningValue } from '../../contract/planning-values.js';
import type { PlanningValueView } from '../../contract/studies.js';

export class SetPlanningValue extends Command<PlanningValueView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly planningValue: NewPlanningValue,
  ) {
    super();
  }
}
