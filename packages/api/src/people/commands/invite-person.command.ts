import { Command } from '@nestjs/cqrs';
import type { InvitationView, NewAccount } from '../../contract/people.js';

/** Gives somebody an account, which the link that is answered opens once. */
export class InvitePerson extends Command<InvitationView> {
  constructor(
    readonly personId: string,
    readonly account: NewAccount,
  ) {
    super();
  }
}
