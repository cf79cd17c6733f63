import { Command } from '@nestjs/cqrs';
import type { MembersView, NewMember } from '../../contract/members.js';

/** Gives a person a role in a study, or another one. */
export class SetMember extends Command<MembersView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly member: NewMember,
  ) {
    super();
  }
}
