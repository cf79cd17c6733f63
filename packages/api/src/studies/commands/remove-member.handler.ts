import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { notFound } from '../../common/problem.js';
import type { MembersView } from '../../contract/members.js';
import { checkLastMethodologist } from '../check-last-methodologist.js';
import { Membership } from '../membership.entity.js';
import { readMembers } from '../read-members.js';
import { StudyChanges } from '../study-changes.js';
import { RemoveMember } from './remove-member.command.js';

@CommandHandler(RemoveMember)
export class RemoveMemberHandler implements ICommandHandler<RemoveMember> {
  constructor(private readonly changes: StudyChanges) {}

  execute(command: RemoveMember): Promise<MembersView> {
    return this.changes.make(command, 'change the members', async ({ em, study, record }) => {
      const membership = await em.findOne(
        Membership,
        { study, person: command.memberId },
        { populate: ['person'] },
      );
      if (!membership) throw notFound('This person is no member of the study.');
      await checkLastMethodologist(em, membership);
      const { person, role } = membership;
      record({ action: 'removed', what: `member ${person.name}`, before: { role } });
      await em.remove(membership).flush();
      return readMembers(em, study);
    });
  }
}
