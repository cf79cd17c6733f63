import { Query } from '@nestjs/cqrs';
import type { LedgerView } from '../../contract/studies.js';

export class WhichPlanningValues extends Query<LedgerView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
  ) {
    super();
  }
}
