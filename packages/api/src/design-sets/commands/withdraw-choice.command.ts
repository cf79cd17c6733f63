import { Command } from '@nestjs/cqrs';
import type { DesignSetView } from '../../contract/design-sets.js';

export class WithdrawChoice extends Command<DesignSetView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly version: number,
  ) {
    super();
  }
}
