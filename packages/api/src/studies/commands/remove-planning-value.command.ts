import { Command } from '@nestjs/cqrs';

/** Takes a family’s own value out of the ledger, so that the one for every family holds there too. */
export class RemovePlanningValue extends Command<void> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly planningValueId: string,
    readonly version: number,
  ) {
    super();
  }
}
