import { Command } from '@nestjs/cqrs';
import type { StartedSession } from '../sessions.js';

/** Sets the password of whoever the one-time link is for, and signs them in. */
export class EnterByLink extends Command<StartedSession> {
  constructor(
    readonly token: string,
    readonly password: string,
  ) {
    super();
  }
}
