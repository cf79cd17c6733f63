import { EntityManager } from '@mikro-orm/sqlite';
import { type IQueryHandler, QueryHandler } from '@nestjs/cqrs';
import type { AuditView } from '../../contract/audit.js';
import { auditPage } from '../audit-page.js';
import { WhatHappenedOnSite } from './what-happened-on-site.query.js';

@QueryHandler(WhatHappenedOnSite)
export class WhatHappenedOnSiteHandler implements IQueryHandler<WhatHappenedOnSite> {
  constructor(private readonly em: EntityManager) {}

  execute({ page }: WhatHappenedOnSite): Promise<AuditView> {
    return auditPage(this.em.fork(), null, page);
  }
}
