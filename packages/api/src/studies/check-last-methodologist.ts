import type { EntityManager } from '@mikro-orm/sqlite';
import { invalid } from '../common/problem.js';
import { Membership } from './membership.entity.js';

/** Refuses what would leave a study without a methodologist. */
export async function checkLastMethodologist(em: EntityManager, membership: Membership): Promise<void> {
  if (membership.role !== 'methodologist') return;
  const { study } = membership;
  if ((await em.count(Membership, { study, role: 'methodologist' })) > 1) return;
  const message = 'A study has a methodologist: give somebody else this role first.';
  throw invalid([{ path: 'role', message }]);
}
