import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { recordAudit } from '../../audit/record-audit.js';
import { Clock } from '../../common/clock.js';
import { expectVersion } from '../../common/expect-version.js';
import { validated } from '../../common/validation.js';
import { changedProfileSchema, type ProfileView } from '../../contract/people.js';
import { Person } from '../person.entity.js';
import { accountName, profileView } from '../person.view.js';
import { ChangeProfile } from './change-profile.command.js';

@CommandHandler(ChangeProfile)
export class ChangeProfileHandler implements ICommandHandler<ChangeProfile> {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  async execute({ personId, profile }: ChangeProfile): Promise<ProfileView> {
    const { version, name } = validated(changedProfileSchema, profile);
    const now = this.clock.now();
    return this.em.fork().transactional(async (em) => {
      const person = await em.findOneOrFail(Person, personId);
      expectVersion(person, version, profileView);
      const deed = { action: 'changed', what: accountName(person), before: { name: person.name } } as const;
      recordAudit(em, { ...deed, after: { name } }, { at: now, by: person, study: null });
      em.assign(person, { name, changedAt: now });
      await em.flush();
      return profileView(person);
    });
  }
}
