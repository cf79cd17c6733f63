import { Command } from '@nestjs/cqrs';
import type { SignIn as Credentials } from '../../contract/access.js';
import type { StartedSession } from '../sessions.js';

export class SignIn extends Command<StartedSession> {
  constructor(readonly credentials: Credentials) {
    super();
  }
}
