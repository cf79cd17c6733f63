import { Query } from '@nestjs/cqrs';
import type { LimitsView } from '../../contract/limits.js';

export class WhichLimits extends Query<LimitsView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
  ) {
    super();
  }
}
