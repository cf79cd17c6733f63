import { Command } from '@nestjs/cqrs';
import type { InvitationView } from '../../contract/people.js';

/** Makes another one-time link for somebody who has an account; the one before opens nothing any more. */
export class RenewLink extends Command<InvitationView> {
  constructor(
    readonly personId: string,
    readonly accountId: string,
  ) {
    super();
  }
}
