import { Command } from '@nestjs/cqrs';
import type { OptionView } from '../../contract/design-sets.js';
import type { ChangedOption } from '../../contract/options.js';

export class ChangeOption extends Command<OptionView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly optionId: string,
    readonly option: ChangedOption,
  ) {
    super();
  }
}
