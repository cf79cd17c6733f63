import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { ProfileView } from '../../contract/people.js';
import { Person } from '../person.entity.js';
import { profileView } from '../person.view.js';
import { WhichProfile } from './which-profile.query.js';

@QueryHandler(WhichProfile)
export class WhichProfileHandler implements IQueryHandler<WhichProfile> {
  constructor(private readonly em: EntityManager) {}

  async execute({ personId }: WhichProfile): Promise<ProfileView> {
    return profileView(await this.em.fork().findOneOrFail(Person, personId));
  }
}
