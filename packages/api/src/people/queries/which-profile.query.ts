import { Query } from '@nestjs/cqrs';
import type { ProfileView } from '../../contract/people.js';

export class WhichProfile extends Query<ProfileView> {
  constructor(readonly personId: string) {
    super();
  }
}
