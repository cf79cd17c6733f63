import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { AuditView } from '../../contract/audit.js';
import { openStudy } from '../../studies/open-study.js';
import { auditPage } from '../audit-page.js';
import { WhatHappenedInStudy } from './what-happened-in-study.query.js';

@QueryHandler(WhatHappenedInStudy)
export class WhatHappenedInStudyHandler implements IQueryHandler<WhatHappenedInStudy> {
  constructor(private readonly em: EntityManager) {}

  async execute(query: WhatHappenedInStudy): Promise<AuditView> {
    const em = this.em.fork();
    const { study } = await openStudy(em, query);
    return auditPage(em, study.id, query.page);
  }
}
