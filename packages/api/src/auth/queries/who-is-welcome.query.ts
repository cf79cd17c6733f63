import { Query } from '@nestjs/cqrs';
import type { WelcomeView } from '../../contract/people.js';

/** Whom a one-time link lets in. */
export class WhoIsWelcome extends Query<WelcomeView> {
  constructor(readonly token: string) {
    super();
  }
}
