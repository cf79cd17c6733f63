import { Query } from '@nestjs/cqrs';
import type { CostPlanView } from '../../contract/studies.js';

export class WhichCosts extends Query<CostPlanView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
  ) {
    super();
  }
}
