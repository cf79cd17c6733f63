import type { EntityManager } from '@mikro-orm/sqlite';
import type { StudyView } from '../contract/studies.js';
import { lastChanges } from './last-changes.js';
import { Membership } from './membership.entity.js';
import { studyView } from './study.view.js';

/** A study as one of its members sees it. */
export async function readStudy(em: EntityManager, membership: Membership): Promise<StudyView> {
  const { study } = membership;
  const memberships = await em.find(Membership, { study }, { populate: ['person'] });
  const changes = await lastChanges(em, [study.id]);
  return studyView(membership, { memberships, changedAt: changes.get(study.id) ?? study.changedAt });
}
