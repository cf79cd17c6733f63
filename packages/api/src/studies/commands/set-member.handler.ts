import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { invalid } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import { type MembersView, newMemberSchema } from '../../contract/members.js';
import { Person } from '../../people/person.entity.js';
import { checkLastMethodologist } from '../check-last-methodologist.js';
import { Membership } from '../membership.entity.js';
import { readMembers } from '../read-members.js';
import { StudyChanges } from '../study-changes.js';
import { SetMember } from './set-member.command.js';

@CommandHandler(SetMember)
export class SetMemberHandler implements ICommandHandler<SetMember> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: SetMember): Promise<MembersView> {
    const { email, role } = validated(newMemberSchema, command.member);
    return this.changes.make(command, 'change the members', async ({ em, study, record }) => {
      const person = await em.findOne(Person, { email });
      if (!person) {
        const message = 'Nobody has an account with this address: an administrator can add them.';
        throw invalid([{ path: 'email', message }]);
      }
      const what = `member ${person.name}`;
      const current = await em.findOne(Membership, { study, person });
      if (current) {
        if (role !== 'methodologist') await checkLastMethodologist(em, current);
        record({ action: 'changed', what, before: { role: current.role }, after: { role } });
        em.assign(current, { role });
      } else {
        record({ action: 'added', what, after: { role } });
        em.create(Membership, { study, person, role });
      }
      await em.flush();
      return readMembers(em, study);
    });
  }
}
