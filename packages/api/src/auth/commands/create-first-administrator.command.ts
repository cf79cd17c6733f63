import { Command } from '@nestjs/cqrs';
import type { FirstVisit } from '../../contract/access.js';
import type { StartedSession } from '../sessions.js';

/** Makes whoever knows the printed code the administrator of an installation without people, and signs them in. */
export class CreateFirstAdministrator extends Command<StartedSession> {
  constructor(readonly visit: FirstVisit) {
    super();
  }
}
