import { Command } from '@nestjs/cqrs';
import type { OptionView } from '../../contract/design-sets.js';
import type { NewRuling } from '../../contract/options.js';

export class RuleOnOption extends Command<OptionView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly optionId: string,
    readonly ruling: NewRuling,
  ) {
    super();
  }
}
