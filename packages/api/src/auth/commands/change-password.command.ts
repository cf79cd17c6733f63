import { Command } from '@nestjs/cqrs';
import type { ChangedPassword } from '../../contract/people.js';

/** Ends every session of the person but the one that asks. */
export class ChangePassword extends Command<void> {
  constructor(
    readonly personId: string,
    readonly token: string,
    readonly passwords: ChangedPassword,
  ) {
    super();
  }
}
