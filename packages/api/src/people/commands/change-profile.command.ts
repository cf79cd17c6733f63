import { Command } from '@nestjs/cqrs';
import type { ChangedProfile, ProfileView } from '../../contract/people.js';

export class ChangeProfile extends Command<ProfileView> {
  constructor(
    readonly personId: string,
    readonly profile: ChangedProfile,
  ) {
    super();
  }
}
