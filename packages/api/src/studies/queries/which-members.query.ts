import { Query } from '@nestjs/cqrs';
import type { MembersView } from '../../contract/members.js';

export class WhichMembers extends Query<MembersView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
  ) {
    super();
  }
}
