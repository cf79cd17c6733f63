import { EntityManager } from '@mikro-orm/sqlite';
import { Injectable } from '@nestjs/common';
import { type Deed, recordAudit } from '../audit/record-audit.js';
import { Clock } from '../common/clock.js';
import type { Person } from '../people/person.entity.js';
import type { Membership } from './membership.entity.js';
import { openStudy } from './open-study.js';
import type { StudyAction } from './permissions.js';
import type { Study } from './study.entity.js';

export interface StudyChange {
  em: EntityManager;
  study: Study;
  membership: Membership;
  by: Person;
  now: Date;
  record(deed: Deed): void;
}

/** How every command changes a study: as a member who may, in one transaction, with the entry that tells of it. */
@Injectable()
export class StudyChanges {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  make<T>(
    command: { studyId: string; personId: string },
    action: StudyAction,
    work: (change: StudyChange) => Promise<T>,
  ): Promise<T> {
    const now = this.clock.now();
    // The database has one connection: no other change comes between what this one reads and what it writes.
    return this.em.fork().transactional(async (em) => {
      const membership = await openStudy(em, command, action);
      const { study, person: by } = membership;
      const record = (deed: Deed) => recordAudit(em, deed, { at: now, by, study });
      return work({ em, study, membership, by, now, record });
    });
  }
}
