import { Command } from '@nestjs/cqrs';
import type { DesignSetView } from '../../contract/design-sets.js';
import type { NewChoice } from '../../contract/options.js';

export class RecordChoice extends Command<DesignSetView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly choice: NewChoice,
  ) {
    super();
  }
}
