import { Query } from '@nestjs/cqrs';
import type { AuditPage, AuditView } from '../../contract/audit.js';

/** What concerns people and their accounts, never a study's content. */
export class WhatHappenedOnSite extends Query<AuditView> {
  constructor(readonly page: AuditPage) {
    super();
  }
}
