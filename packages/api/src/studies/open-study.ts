import type { EntityManager } from '@mikro-orm/sqlite';
import { forbidden, notFound } from '../common/problem.js';
import { Membership } from './membership.entity.js';
import { may, type StudyAction } from './permissions.js';

/** A study as one of its members, for one action. Whoever may not see it is told that there is none. */
export async function openStudy(
  em: EntityManager,
  { studyId, personId }: { studyId: string; personId: string },
  action: StudyAction = 'see the draft',
) {
  const membership = await em.findOne(
    Membership,
    { study: studyId, person: personId },
    { populate: ['study', 'person'] },
  );
  if (!membership || !may(membership.role, 'see the draft')) throw notFound('There is no such study.');
  if (!may(membership.role, action)) throw forbidden(`A ${membership.role} may not ${action} here.`);
  return membership;
}
