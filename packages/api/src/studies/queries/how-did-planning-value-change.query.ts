import { Query } from '@nestjs/cqrs';
import type { PlanningValueHistoryView } from '../../contract/planning-values.js';

export class HowDidPlanningValueChange extends Query<PlanningValueHistoryView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly planningValueId: string,
  ) {
    super();
  }
}
