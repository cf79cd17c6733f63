import type { EntityManager } from '@mikro-orm/sqlite';
import type { MembersView } from '../contract/members.js';
import { studyRoles } from '../contract/studies.js';
import { Membership } from './membership.entity.js';
import type { Study } from './study.entity.js';

type Member = MembersView['members'][number];

export async function readMembers(em: EntityManager, study: Study): Promise<MembersView> {
  const memberships = await em.find(Membership, { study }, { populate: ['person'] });
  return { members: memberships.map(memberView).toSorted(byRole) };
}

const memberView = ({ person: { id, name, email }, role }: Membership): Member => ({
  person: { id, name, email },
  role,
});

const byRole = (a: Member, b: Member) =>
  studyRoles.indexOf(a.role) - studyRoles.indexOf(b.role) || a.person.name.localeCompare(b.person.name, 'en');
