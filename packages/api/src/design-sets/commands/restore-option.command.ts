import { Command } from '@nestjs/cqrs';
import type { OptionView } from '../../contract/design-sets.js';

/** Brings a removed option back to its place. */
export class RestoreOption extends Command<OptionView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly optionId: string,
    readonly version: number,
  ) {
    super();
  }
}
