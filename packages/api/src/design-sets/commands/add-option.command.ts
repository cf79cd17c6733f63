import { Command } from '@nestjs/cqrs';
import type { OptionView } from '../../contract/design-sets.js';
import type { NewOption } from '../../contract/options.js';

/** Adds a candidate design behind those that are there. */
export class AddOption extends Command<OptionView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly option: NewOption,
  ) {
    super();
  }
}
