import type { EntityManager } from '@mikro-orm/sqlite';
import { forbidden, notFound } from '../common/problem.js';
import type { StudyRole } from '../contract/studies.js';
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
  refuseUnlessMay(membership.role, action);
  return membership;
}

export function refuseUnlessMay(role: StudyRole, action: StudyAction): void {
  if (!may(role, action)) throw forbidden(`A ${role} may not ${action} here.`);
}
