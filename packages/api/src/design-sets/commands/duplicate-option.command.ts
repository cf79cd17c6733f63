import { Command } from '@nestjs/cqrs';
import type { OptionView } from '../../contract/design-sets.js';

/** Puts a copy of an option, without its ruling, right behind it. */
export class DuplicateOption extends Command<OptionView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly optionId: string,
  ) {
    super();
  }
}
