import { Command } from '@nestjs/cqrs';
import type { DesignSetView } from '../../contract/design-sets.js';
import type { ChangedDesignSet } from '../../contract/options.js';

/** Changes what is held equal and the order of the options. */
export class ChangeDesignSet extends Command<DesignSetView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly designSet: ChangedDesignSet,
  ) {
    super();
  }
}
