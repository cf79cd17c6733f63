import { Command } from '@nestjs/cqrs';
import type { LimitsView, NewLimits } from '../../contract/limits.js';

export class SetLimits extends Command<LimitsView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly limits: NewLimits,
  ) {
    super();
  }
}
