import { Command } from '@nestjs/cqrs';
import type { OptionView } from '../../contract/design-sets.js';

/** Takes an option out of the comparison; it can be restored. */
export class RemoveOption extends Command<OptionView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly optionId: string,
    readonly version: number,
  ) {
    super();
  }
}
