import { Command } from '@nestjs/cqrs';
import type { NewDesignSet } from '../../contract/options.js';

/** Answers with the design set's id. */
export class CreateDesignSet extends Command<string> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly designSet: NewDesignSet,
  ) {
    super();
  }
}
