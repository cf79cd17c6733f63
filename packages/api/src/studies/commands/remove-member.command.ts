import { Command } from '@nestjs/cqrs';
import type { MembersView } from '../../contract/members.js';

export class RemoveMember extends Command<MembersView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly memberId: string,
  ) {
    super();
  }
}
